'use client';

import { Card } from '@/components/ui/card';
import { SelectField } from '@/components/ui/field';
import { encodingChoices, type EncodingLabel } from '@/lib/domain/roster/import/decode-text';
import type { Delimiter } from '@/lib/domain/roster/import/parse-table';
import { sampleFiles } from '@/lib/domain/roster/import/samples';
import { ListSource } from '../../../../_components/list-source';
import { useListSource } from '../../../../_components/use-list-source';
import { bringFile, bringPaste, bringText, type Source } from './source';

/** Where the list comes from: a file dropped or picked, or cells pasted; and how its letters were read. */
export function SourceCard({
  readUrl,
  source,
  onSource,
}: {
  readUrl: string;
  source: Source | null;
  onSource: (source: Source | null) => void;
}) {
  const { shown, takeAnew } = useListSource<Source>(
    { file: (file) => bringFile(file, readUrl), paste: bringPaste },
    onSource,
  );
  /** The same bytes in another encoding, or cut at another separator. */
  const readAnew = (change: { encoding?: EncodingLabel | ''; delimiter?: Delimiter }) => {
    if (!source?.text) return;
    const { bytes, chosen } = source.text;
    const encoding = change.encoding ?? chosen.encoding;
    const delimiter = change.delimiter ?? chosen.delimiter;
    takeAnew(
      bringText(source.from, bytes, {
        ...(encoding && { encoding }),
        ...(delimiter !== undefined && { delimiter }),
      }),
    );
  };
  return (
    <Card title="The list">
      <ListSource
        accepts={['.csv', '.tsv', '.txt', '.xlsx', '.xls', '.xlsm', '.ods', '.numbers', '.pdf']}
        hint="CSV or XLSX, at most 5 MB and 2,000 rows. Formulas are never worked out."
        {...shown}
      />
      {source?.text && (
        <div className="mt-4 flex flex-wrap items-end gap-4">
          <SelectField
            label="Letters read as"
            className="w-64"
            placeholder={
              source.text.chosen.encoding === undefined ? source.text.encoding : 'As guessed at first'
            }
            options={encodingChoices.map((choice) => ({ value: choice.label, label: choice.name }))}
            value={source.text.chosen.encoding ?? ''}
            onChange={(event) => readAnew({ encoding: event.target.value as EncodingLabel | '' })}
          />
          <SelectField
            label="Cells parted by"
            className="w-40"
            options={separators}
            value={source.text.delimiter}
            onChange={(event) => readAnew({ delimiter: event.target.value as Delimiter })}
          />
          {!source.text.sure && source.text.sample.length > 0 && (
            <p className="text-care type-small pb-2">
              Do these look right? <bdi className="font-mono">{source.text.sample.join(', ')}</bdi>
            </p>
          )}
        </div>
      )}
      <details className="mt-4">
        <summary className="text-damson touch inline-flex cursor-pointer items-center underline underline-offset-3">
          Sample files to try
        </summary>
        <ul className="mt-2 grid gap-1.5">
          {sampleFiles
            .filter((sample) => sample.kind === 'roster')
            .map((sample) => (
              <li key={sample.file}>
                <a
                  href={`/samples/${sample.file}`}
                  download
                  className="text-damson underline underline-offset-3"
                >
                  {sample.title}
                </a>
                <span className="text-dusk">: {sample.says}</span>
              </li>
            ))}
        </ul>
      </details>
    </Card>
  );
}

const separators: { value: Delimiter; label: string }[] = [
  { value: ',', label: 'commas' },
  { value: ';', label: 'semicolons' },
  { value: '\t', label: 'tabs' },
  { value: '|', label: 'bars' },
];
