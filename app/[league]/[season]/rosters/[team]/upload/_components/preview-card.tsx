'use client';

import { useMemo, useState } from 'react';
import { FindingSummary, severityTone } from '@/components/status/finding-mark';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { joinClasses } from '@/components/ui/join-classes';
import { Notice } from '@/components/ui/notice';
import { StatusText, Tag } from '@/components/ui/tag';
import { isSameEntry, readCell } from '@/lib/domain/roster/cells';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import type { ReadLine, RosterReading } from '@/lib/domain/roster/import/read-roster';
import type { MergedRoster } from '@/lib/domain/roster/merge-players';
import type { Garment, Player, RosterLine } from '@/lib/domain/roster/player';
import { listRosterColumns, type RosterColumn } from '@/lib/domain/roster/roster-columns';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import type { Finding } from '@/lib/domain/rules/finding';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { countOf } from '@/lib/domain/text/count-of';
import { gravestOf, groupFindings } from '../../_components/cell-findings';
import { cardCell, cardPlace, cardRow, severityLook } from '../../_components/cell-looks';
import { TodoCell } from '../../_components/todo-cell';

const atFirst = 30;

/** What bringing a line in does. */
type Fate = 'new' | 'changed' | 'as it is' | 'in doubt';

/**
 * Every line that was read with what becomes of it, checked as part of the roster it would make; and every row that was
 * not read, with the reason.
 */
export function PreviewCard({
  reading,
  merged,
  before,
  garments,
  ruleSet,
}: {
  reading: RosterReading;
  merged: MergedRoster;
  before: readonly Player[];
  garments: readonly Garment[];
  ruleSet: RuleSet | null;
}) {
  const [all, setAll] = useState(false);
  const check = useMemo(
    () => (ruleSet ? checkRoster(ruleSet, merged.players, garments) : null),
    [merged, ruleSet, garments],
  );
  const { whole, byRow } = useMemo(() => groupFindings(check?.findings ?? []), [check]);
  const columns = useMemo(
    () => listRosterColumns(ruleSet, garments, merged.players),
    [ruleSet, garments, merged],
  );
  const known = useMemo(() => new Map(before.map((player) => [player.id, player])), [before]);
  const shown = all ? reading.lines : reading.lines.slice(0, atFirst);
  return (
    <Card
      flush
      title="What was read"
      aside={`${countOf(reading.lines.length, 'player')} in ${countOf(reading.counts.rows, 'row')}${reading.counts.blank > 0 ? `, ${reading.counts.blank} blank` : ''}`}
    >
      <div className="flex flex-wrap items-center gap-x-3 gap-y-2 px-4 pb-3">
        {check && <FindingSummary summary={check.summary} />}
        <p className="text-dusk">
          {check
            ? `The roster after the import: ${countOf(merged.players.length, 'player')}. Findings don’t stop the import; they stand beside their cells.`
            : 'No number rules are in force yet, so nothing is checked.'}
        </p>
      </div>
      {reading.refused.length > 0 && (
        <Notice tone="care" flush title={`${countOf(reading.refused.length, 'row')} could not be read`}>
          <ul className="grid gap-1">
            {reading.refused.slice(0, 50).map((row) => (
              <li key={row.rowNumber}>
                Row {row.rowNumber}: {row.reason}{' '}
                <bdi className="type-code break-words">
                  {row.cells.filter(Boolean).join(' | ').slice(0, 200)}
                </bdi>
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
      {whole.map((finding) => (
        <Notice key={finding.code + finding.message} tone={severityTone[finding.severity]} flush>
          {finding.message}
        </Notice>
      ))}
      <div className="sm:overflow-x-auto">
        <table role="table" className="w-full border-separate border-spacing-0 text-left max-sm:block">
          <caption className="sr-only">Players as they were read</caption>
          <thead role="rowgroup" className="max-sm:sr-only">
            <tr role="row">
              {['Row', ...columns.map(({ header }) => header), 'What becomes of it'].map((header) => (
                <th
                  key={header}
                  role="columnheader"
                  scope="col"
                  className={joinClasses(
                    'type-fine text-dusk border-hem border-y px-3 py-2 font-[560] whitespace-nowrap',
                    header === 'No.' && 'text-right',
                  )}
                >
                  {header}
                </th>
              ))}
            </tr>
          </thead>
          <tbody role="rowgroup" className="max-sm:block">
            {shown.map((line, at) => {
              const place = merged.placeOfLine.get(at);
              const player = place === undefined ? undefined : merged.players[place];
              return (
                <PreviewRow
                  key={line.rowNumber}
                  line={line}
                  player={player ?? line.line}
                  fate={judgeFate(player, known)}
                  before={player && known.get(player.id)}
                  columns={columns}
                  findings={(place === undefined ? undefined : byRow.get(place)) ?? []}
                />
              );
            })}
          </tbody>
        </table>
      </div>
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

function judgeFate(player: RosterEntry | undefined, known: ReadonlyMap<string, Player>): Fate {
  if (player === undefined) return 'in doubt';
  const was = known.get(player.id);
  if (was === undefined) return 'new';
  return isSameEntry(was, player) ? 'as it is' : 'changed';
}

function PreviewRow({
  line: { rowNumber, notes, extra },
  player,
  before,
  fate,
  columns,
  findings,
}: {
  line: ReadLine;
  player: RosterLine;
  before: Player | undefined;
  fate: Fate;
  columns: readonly RosterColumn[];
  findings: readonly Finding[];
}) {
  const look = joinClasses('border-hem h-[2.625rem] align-top sm:border-t sm:px-3 sm:py-1.5', cardCell);
  const also = Object.entries(extra);
  return (
    <tr role="row" className={cardRow}>
      <td role="cell" className={joinClasses(look, 'text-dusk w-12 sm:pt-2.5 max-sm:hidden')}>
        {rowNumber}
      </td>
      {columns.map((column) => {
        const value = readCell(player, column.field);
        const was = before === undefined ? value : readCell(before, column.field);
        const severity = gravestOf(findings, column.field);
        return (
          <td
            key={column.field}
            role={column.field === 'name' ? 'rowheader' : 'cell'}
            data-label={column.header}
            className={joinClasses(
              look,
              cardPlace(column.field),
              'sm:pt-2.5',
              column.field === 'number' && 'text-right sm:pt-1.5 max-sm:text-center',
              column.field === 'name' && 'max-sm:text-base max-sm:font-[620]',
              severity !== null && severityLook[severityTone[severity]],
            )}
          >
            <bdi
              className={joinClasses(
                'block break-words max-sm:px-2 max-sm:pb-1.5',
                column.field === 'number' && 'max-sm:py-2',
                column.field === 'name' && 'max-sm:py-2.5',
                column.field === 'nameOnBack' && 'type-code',
                column.field === 'number' && /^[0-9]+$/.test(value) && 'type-jersey text-2xl',
              )}
            >
              {value === '' ? <span className="text-dusk">none</span> : value}
            </bdi>
            {was !== value && (
              <span className="type-fine text-dusk block break-words max-sm:px-2 max-sm:pb-1.5">
                was <bdi>{was === '' ? 'empty' : was}</bdi>
              </span>
            )}
          </td>
        );
      })}
      <td role="cell" className={joinClasses(look, 'w-2/5 sm:pt-2.5 max-sm:order-9 max-sm:basis-full')}>
        <div className="type-small grid gap-0.5">
          <span>
            {fate === 'new' && <StatusText tone="set">new</StatusText>}
            {fate === 'changed' && <StatusText tone="note">changed</StatusText>}
            {fate === 'in doubt' && <StatusText tone="care">in doubt: say above who it is</StatusText>}
            {fate === 'as it is' && <StatusText tone="wait">stays as it is</StatusText>}
            <span className="text-dusk sm:hidden">, row {rowNumber}</span>
          </span>
          <TodoCell id={`line-${rowNumber}`} findings={findings} marks={[]} onUse={null} />
          {notes.map((note) => (
            <p key={note} className="text-dusk break-words">
              {note}
            </p>
          ))}
          {also.length > 0 && (
            <p className="text-dusk flex flex-wrap items-center gap-1.5 break-words">
              Also in the file:
              {also.map(([heading, text]) => (
                <Tag key={heading}>
                  {heading}: <bdi>{text.length > 40 ? `${text.slice(0, 40)}…` : text}</bdi>
                </Tag>
              ))}
            </p>
          )}
        </div>
      </td>
    </tr>
  );
}
