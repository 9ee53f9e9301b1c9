'use client';

import { useEffect, useRef } from 'react';
import { NumberRail } from '@/components/number-rail/number-rail';
import { FindingSummary, severityTone } from '@/components/status/finding-mark';
import { Card } from '@/components/ui/card';
import { joinClasses } from '@/components/ui/join-classes';
import { Notice } from '@/components/ui/notice';
import { StatusMark, toneText, toneWash } from '@/components/ui/status-mark';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import type { Finding, FindingField } from '@/lib/domain/rules/finding';
import { countOf } from '@/lib/domain/text/count-of';
import type { Checked } from './checked';

/** What the check found, each finding beside the player it is about; the focus moves here so that it is read out. */
export function CheckResult({ checked }: { checked: Checked }) {
  const heading = useRef<HTMLDivElement>(null);
  useEffect(() => heading.current?.focus(), [checked]);
  const general = checked.findings.filter((finding) => finding.row === null);
  return (
    <div
      ref={heading}
      tabIndex={-1}
      aria-label="What the check found"
      role="region"
      className="mt-5 grid items-start gap-5 outline-none lg:grid-cols-[minmax(0,1fr)_20rem]"
    >
      <Card
        flush
        title={<FindingSummary summary={checked.summary} />}
        aside={`${checked.from}, against ${checked.preset.title}`}
      >
        {general.map((finding) => (
          <Notice key={finding.code} tone={severityTone[finding.severity]} flush>
            {finding.message}
          </Notice>
        ))}
        <Table caption="Players and findings" cards>
          <Thead>
            <Th>Row</Th>
            <Th>Player</Th>
            <Th>Name on back</Th>
            <Th end>No.</Th>
            <Th>What to do</Th>
          </Thead>
          <Tbody>
            {checked.lines.map((line, row) => (
              <ResultRow
                key={checked.rowNumbers[row]}
                rowNumber={checked.rowNumbers[row] ?? row + 1}
                line={line}
                findings={checked.findings.filter((finding) => finding.row === row)}
              />
            ))}
          </Tbody>
        </Table>
      </Card>
      <div className="grid gap-5">
        <Card title="Number rail">
          <NumberRail labels={buildNumberRail(checked.preset.ruleSet, checked.lines)} />
        </Card>
        {checked.refused.length > 0 && (
          <Card title={`${countOf(checked.refused.length, 'row')} could not be read`}>
            <ul className="grid gap-2">
              {checked.refused.map((row) => (
                <li key={row.rowNumber}>
                  <span className="font-[560]">Row {row.rowNumber}:</span> {row.reason}
                  <span className="type-code text-dusk block break-words">
                    {row.cells.filter(Boolean).join(' | ')}
                  </span>
                </li>
              ))}
            </ul>
          </Card>
        )}
        {checked.notes.length > 0 && (
          <Card title="How it was read">
            <ul className="text-dusk type-small grid gap-1">
              {checked.notes.slice(0, 20).map((note) => (
                <li key={note}>{note}</li>
              ))}
              {checked.notes.length > 20 && <li>and {checked.notes.length - 20} more of the same kind</li>}
            </ul>
          </Card>
        )}
        {checked.preset.open.length > 0 && (
          <Card title="Left to the league">
            <ul className="text-dusk type-small grid gap-1">
              {checked.preset.open.map((entry) => (
                <li key={entry}>{entry}</li>
              ))}
            </ul>
          </Card>
        )}
      </div>
    </div>
  );
}

type Line = Checked['lines'][number];

function ResultRow({ rowNumber, line, findings }: { rowNumber: number; line: Line; findings: Finding[] }) {
  const mark = (field: FindingField): string => {
    const finding = findings.find((entry) => entry.field === field);
    if (!finding) return '';
    const tone = severityTone[finding.severity];
    return joinClasses('border-l-3 border-current', toneWash[tone], toneText[tone]);
  };
  return (
    <Tr>
      <Td label="Row" className="text-dusk">
        {rowNumber}
      </Td>
      <Td rowHead label="Player" className={joinClasses('break-words', mark('name'))}>
        <bdi className="text-ink">{line.name || '–'}</bdi>
      </Td>
      <Td label="Name on back" className={mark('nameOnBack')}>
        <bdi className="type-code text-ink break-words">{line.nameOnBack || '–'}</bdi>
      </Td>
      <Td label="No." end className={mark('number')}>
        <span className="type-jersey text-ink text-2xl">{line.number || '–'}</span>
      </Td>
      <Td label="What to do">
        {findings.length === 0 ? (
          <span className="text-dusk">
            <StatusMark tone="set" label="nothing to fix" />
          </span>
        ) : (
          <ul className="grid gap-1">
            {findings.map((finding) => (
              <li
                key={finding.code + finding.message}
                className={joinClasses('flex gap-2', toneText[severityTone[finding.severity]])}
              >
                <StatusMark tone={severityTone[finding.severity]} label={finding.severity} className="mt-1" />
                <span>
                  {finding.message}
                  {finding.suggestions.length > 0 && ` Try ${finding.suggestions.join(', ')}.`}
                </span>
              </li>
            ))}
          </ul>
        )}
      </Td>
    </Tr>
  );
}
