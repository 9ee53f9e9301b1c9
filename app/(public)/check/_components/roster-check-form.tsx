'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Field } from '@/components/ui/field';
import { FileDrop } from '@/components/ui/file-drop';
import { Notice } from '@/components/ui/notice';
import { Select } from '@/components/ui/select';
import { Textarea } from '@/components/ui/textarea';
import { guessMapping } from '@/lib/domain/roster/import/column-mapping';
import { fileLimits } from '@/lib/domain/roster/import/limits';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import type { CheckSummary, Finding } from '@/lib/domain/rules/finding';
import { countOf } from '@/lib/domain/text/count-of';
import { sayHowKnown, writeCitation } from '@/lib/domain/rules/write-citation';
import { capitalise } from '@/lib/domain/text/sentence';
import { CheckResult } from './check-result';
import type { Checked, CheckPreset } from './checked';
import { readFile, readPaste, type Reading, type ReadWorkbook } from './read-file';

const sample = `Player\tNumber\tName on back
Adisa, Wren\t4\tADISA
Brookhollow, Tam\tNo. 10\tBROOKHOLLOW
Calloway, Ines\t14\tCALLOWAY
Dunmore, Pip\t14.0\tDUNMORE
Ellery, Jonah\t26\tELLERY
Farrow, Lumi\t0\tFARROW
Grantley, Osei\t#33\tGRANTLEY
Hollin, Mara\t00\tHOLLIN`;

/** Takes a list and a code, asks the public API what it finds, and shows it beside each player. */
export function RosterCheckForm({
  presets,
  checkUrl,
  onReadWorkbook,
}: {
  presets: CheckPreset[];
  checkUrl: string;
  onReadWorkbook: ReadWorkbook;
}) {
  const [presetId, setPresetId] = useState(
    presets.find((preset) => preset.id === 'basketball-nfhs')?.id ?? presets[0]?.id ?? '',
  );
  const [text, setText] = useState('');
  const [file, setFile] = useState<File | null>(null);
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<string>();
  const [checked, setChecked] = useState<Checked>();
  const preset = presets.find((entry) => entry.id === presetId);

  const check = async (list: string, picked: File | null) => {
    if (!preset) return;
    setPending(true);
    setFailure(undefined);
    try {
      const outcome = await checkList(
        checkUrl,
        preset,
        picked ? await readFile(picked, onReadWorkbook) : readPaste(list),
      );
      if ('failure' in outcome) setFailure(outcome.failure);
      else setChecked(outcome);
    } catch {
      setFailure('The check did not reach the server. Your list is still here; try again.');
    }
    setPending(false);
  };

  return (
    <>
      <form
        className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_20rem]"
        onSubmit={(event) => {
          event.preventDefault();
          void check(text, file);
        }}
      >
        <Card title="The list" aside="CSV, XLSX, or cells from a spreadsheet">
          <div className="grid gap-4">
            <Field
              label="Paste it here"
              hint="A heading line such as Player, Number helps, but is not needed."
            >
              {(wiring) => (
                <Textarea
                  {...wiring}
                  rows={7}
                  spellCheck={false}
                  className="font-mono"
                  value={text}
                  onChange={(event) => {
                    setText(event.target.value);
                    // The list is one or the other: what was brought last.
                    setFile(null);
                  }}
                />
              )}
            </Field>
            <FileDrop
              label="Or drop a file here, or pick one"
              accepts={['.csv', '.tsv', '.txt', '.xlsx']}
              maxBytes={fileLimits.bytes}
              hint="At most 5 MB and 2,000 rows. A workbook is read on our server and forgotten; anything else in your browser."
              file={file}
              onFile={setFile}
            />
          </div>
        </Card>
        <Card title="The code">
          <div className="grid gap-4">
            <Field label="Numbering code">
              {(wiring) => (
                <Select
                  {...wiring}
                  value={presetId}
                  options={presets.map((entry) => ({
                    value: entry.id,
                    label: `${capitalise(entry.sport)}: ${entry.title}`,
                  }))}
                  onChange={(event) => setPresetId(event.target.value)}
                />
              )}
            </Field>
            {preset && (
              <div className="type-small text-dusk grid gap-2">
                {preset.citations.slice(0, 3).map((citation) => (
                  <p key={`${citation.document} ${citation.rule}`}>
                    {writeCitation(citation)} ({sayHowKnown(citation.known)})
                  </p>
                ))}
                <p>{preset.checkYourBook}</p>
              </div>
            )}
            {failure !== undefined && (
              <Notice tone="stop" live="assertive">
                {failure}
              </Notice>
            )}
            <Button
              type="submit"
              look="primary"
              wide
              pending={pending}
              unavailable={
                text.trim() === '' && file === null ? 'Paste a list or pick a file first.' : undefined
              }
            >
              Check this list
            </Button>
            <Button
              look="quiet"
              wide
              pending={pending}
              onClick={() => {
                setFile(null);
                setText(sample);
                void check(sample, null);
              }}
            >
              Try it with an invented list
            </Button>
            <p className="type-fine text-dusk">
              Lists of players often hold children’s names. They are checked and forgotten: not stored, not
              logged. Still, send only what is needed; numbers alone can be checked too.
            </p>
          </div>
        </Card>
      </form>
      {checked && <CheckResult key={checked.from + checked.preset.id} checked={checked} />}
    </>
  );
}

async function checkList(
  url: string,
  preset: CheckPreset,
  reading: Reading,
): Promise<Checked | { failure: string }> {
  if (!reading.ok) return { failure: reading.message };
  const roster = readRoster(reading.rows, guessMapping(reading.rows, []), []);
  if (roster.lines.length === 0) {
    const [first] = roster.refused;
    return {
      failure: first
        ? `No row could be read. Row ${first.rowNumber}: ${first.reason}`
        : 'There are headings, but no players below them.',
    };
  }
  const lines = roster.lines.map(({ line }) => line);
  const response = await fetch(url, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ ruleSet: { preset: preset.id }, players: lines }),
  });
  const answer: unknown = await response.json();
  if (!response.ok)
    return { failure: (answer as { detail?: string }).detail ?? 'The check failed. Try again.' };
  const { findings, summary } = answer as { findings: Finding[]; summary: CheckSummary };
  return {
    preset,
    from: `${countOf(lines.length, 'player')} from ${reading.from}`,
    lines,
    rowNumbers: roster.lines.map((line) => line.rowNumber),
    notes: [
      ...roster.notes,
      ...roster.lines.flatMap((line) => line.notes.map((note) => `Row ${line.rowNumber}: ${note}`)),
    ],
    refused: roster.refused,
    findings,
    summary,
  };
}
