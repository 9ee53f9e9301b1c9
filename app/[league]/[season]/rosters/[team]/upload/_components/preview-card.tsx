'use client';

import { useMemo, useState } from 'react';
import { FindingSummary, severityTone } from '@/components/status/finding-mark';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { joinClasses } from '@/components/ui/join-classes';
import { Notice } from '@/components/ui/notice';
import { StatusMark, toneText } from '@/components/ui/status-mark';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import type { RosterReading } from '@/lib/domain/roster/import/read-roster';
import type { Garment } from '@/lib/domain/roster/player';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { countOf } from '@/lib/domain/text/count-of';

const atFirst = 30;

/** The players as they were read, each with what the division's rules say, and every row that was not. */
export function PreviewCard({
  reading,
  garments,
  ruleSet,
}: {
  reading: RosterReading;
  garments: readonly Garment[];
  ruleSet: RuleSet | null;
}) {
  const [all, setAll] = useState(false);
  const check = useMemo(
    () =>
      ruleSet
        ? checkRoster(
            ruleSet,
            reading.lines.map(({ line }) => line),
            garments,
          )
        : null,
    [reading, ruleSet, garments],
  );
  const shown = all ? reading.lines : reading.lines.slice(0, atFirst);
  return (
    <Card
      flush
      title="What was read"
      aside={`${countOf(reading.lines.length, 'player')} of ${countOf(reading.counts.rows, 'row')}; ${reading.counts.blank} blank`}
    >
      {check && (
        <div className="px-4 pb-3">
          <FindingSummary summary={check.summary} />
          <p className="type-small text-dusk mt-1">
            Findings do not stop the import; they stand beside their cells on the roster.
          </p>
        </div>
      )}
      {reading.refused.length > 0 && (
        <Notice tone="care" flush title={`${countOf(reading.refused.length, 'row')} could not be read`}>
          <ul className="grid gap-1">
            {reading.refused.slice(0, 50).map((row) => (
              <li key={row.rowNumber}>
                Row {row.rowNumber}: {row.reason}{' '}
                <span className="type-code break-words">
                  {row.cells.filter(Boolean).join(' | ').slice(0, 200)}
                </span>
              </li>
            ))}
            {reading.refused.length > 50 && <li>and {reading.refused.length - 50} more</li>}
          </ul>
        </Notice>
      )}
      {reading.notes.length > 0 && (
        <Notice tone="note" flush>
          {reading.notes.join(' ')}
        </Notice>
      )}
      <Table caption="Players as they were read" cards>
        <Thead>
          <Th>Row</Th>
          <Th>Player</Th>
          <Th>Name on back</Th>
          <Th end>No.</Th>
          {garments.map((garment) => (
            <Th key={garment.code}>{garment.name}</Th>
          ))}
          <Th>What to do</Th>
        </Thead>
        <Tbody>
          {shown.map(({ rowNumber, line, notes, extra }, row) => (
            <Tr key={rowNumber}>
              <Td label="Row" className="text-dusk">
                {rowNumber}
              </Td>
              <Td rowHead label="Player" className="break-words">
                <bdi>{line.name || '–'}</bdi>
              </Td>
              <Td label="Name on back">
                <bdi className="type-code break-words">{line.nameOnBack || '–'}</bdi>
              </Td>
              <Td label="No." end>
                <span className="type-jersey text-2xl">{line.number || '–'}</span>
              </Td>
              {garments.map((garment) => (
                <Td key={garment.code} label={garment.name}>
                  {line.sizes[garment.code] || <span className="text-dusk">none</span>}
                </Td>
              ))}
              <Td label="What to do">
                <ul className="type-small grid gap-1">
                  {check?.findings
                    .filter((finding) => finding.row === row)
                    .map((finding) => (
                      <li
                        key={finding.code + finding.message}
                        className={joinClasses('flex gap-1.5', toneText[severityTone[finding.severity]])}
                      >
                        <StatusMark
                          tone={severityTone[finding.severity]}
                          label={finding.severity}
                          className="mt-0.5"
                        />
                        {finding.message}
                      </li>
                    ))}
                  {[
                    ...notes,
                    ...Object.entries(extra).map(([heading, cell]) => `Also in the file: ${heading} ${cell}`),
                  ].map((note) => (
                    <li key={note} className="text-dusk break-words">
                      {note}
                    </li>
                  ))}
                </ul>
              </Td>
            </Tr>
          ))}
        </Tbody>
      </Table>
      {reading.lines.length > shown.length && (
        <div className="border-hem border-t px-4 py-3">
          <Button size="sm" onClick={() => setAll(true)}>
            Show all {reading.lines.length} players
          </Button>
        </div>
      )}
    </Card>
  );
}
