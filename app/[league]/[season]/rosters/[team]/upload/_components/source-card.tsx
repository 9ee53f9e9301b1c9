'use client';

import { useState } from 'react';
import { Card } from '@/components/ui/card';
import { SelectField } from '@/components/ui/field';
import { encodingChoices, type EncodingLabel } from '@/lib/domain/roster/import/decode-text';
import type { Delimiter } from '@/lib/domain/roster/import/parse-table';
import { sampleFiles } from '@/lib/domain/roster/import/samples';
import { ListSource } from '../../../../_components/list-source';
import { bringFile, bringPaste, bringText, type Brought, type Source } from './source';

/** Where the list comes from: a file dropped or picked, or cells pasted; and how its letters were read. */
export function SourceCard({
  readUrl,
  source,
  onSource,
}: {
  readUrl: string;
  source: Source | null;
  onSource: (source: Source) => void;
}) {
  const [file, setFile] = useState<File | null>(null);
  const [text, setText] = useState('');
  const [refusal, setRefusal] = useState<string>();
  const [busy, setBusy] = useState(false);
  const take = (brought: Brought) => {
    if (brought.ok) onSource(brought.source);
    setRefusal(brought.ok ? undefined : brought.message);
  };
  const pick = async (picked: File | null) => {
    setFile(picked);
    setRefusal(undefined);
    if (!picked) return;
    setBusy(true);
    try {
      take(await bringFile(picked, readUrl));
    } catch {
      setRefusal(
        'The file did not reach the server. It is still chosen: check the connection and pick it again.',
      );
    }
    setBusy(false);
  };
  /** The same bytes in another encoding, or cut at another separator. */
  const readAnew = (change: { encoding?: EncodingLabel | ''; delimiter?: Delimiter }) => {
    if (!source?.text) return;
    const { bytes, chosen } = source.text;
    const encoding = change.encoding ?? chosen.encoding;
    const delimiter = change.delimiter ?? chosen.delimiter;
    take(
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
        busy={busy}
        file={file}
        onFile={(picked) => void pick(picked)}
        text={text}
        onText={setText}
        onReadPaste={() => take(bringPaste(text))}
        refusal={refusal}
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
