'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Notice } from '@/components/ui/notice';
import { RadioGroup } from '@/components/ui/radio-group';
import { useToast } from '@/components/ui/toast';
import { guessMapping, reuseMapping, type ColumnMapping } from '@/lib/domain/roster/import/column-mapping';
import { findHeadingRow, headingSignature, listHeadings } from '@/lib/domain/roster/import/find-headings';
import { mergeModes, planMerge, type MergeMode } from '@/lib/domain/roster/import/merge-roster';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import { mergePlayers } from '@/lib/domain/roster/merge-players';
import { mostPlayersPerRoster, type Garment, type Player } from '@/lib/domain/roster/player';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { countOf } from '@/lib/domain/text/count-of';
import type { KeptMapping } from '@/lib/use-cases/rosters/list-mappings';
import type { LeagueAction } from '@/lib/web/action-result';
import { ColumnsCard } from './columns-card';
import { DoubtfulLines, type Decision } from './doubtful-lines';
import { PreviewCard } from './preview-card';
import { SourceCard } from './source-card';
import type { Source } from './source';

export type UploadTarget = {
  id: string;
  revision: number;
  players: Player[];
  garments: Garment[];
  ruleSet: RuleSet | null;
};
type Line = {
  line: { name: string; nameOnBack: string; number: string; role: string; sizes: Record<string, string> };
  extra: Record<string, string>;
};
type Sent = {
  rosterId: string;
  revision: number;
  mode: MergeMode;
  lines: Line[];
  decisions: { row: number; decision: Decision }[];
  refused: number;
  remember: { signature: string; mapping: ColumnMapping } | null;
};

const modeWords: Record<MergeMode, { label: string; hint: string }> = {
  add: { label: 'Add new players', hint: 'Players who are there already stay as they are.' },
  'update matching': {
    label: 'Add and bring up to date',
    hint: 'Players with the same name take what the file says; what it leaves empty stays.',
  },
  replace: { label: 'Replace the roster', hint: 'As above, and players the file does not name are removed.' },
};

/** From a file or a paste to players: read, match the columns, see what would happen, then do it in one step. */
export function UploadRoster({
  league,
  path,
  roster,
  kept,
  readUrl,
  onImport,
}: {
  league: string;
  path: string;
  roster: UploadTarget;
  kept: KeptMapping[];
  readUrl: string;
  onImport: LeagueAction<Sent, { added: number; changed: number; removed: number; unchanged: number }>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [source, setSource] = useState<Source | null>(null);
  const [sheet, setSheet] = useState(0);
  const [mapping, setMapping] = useState<ColumnMapping | null>(null);
  const [recalled, setRecalled] = useState(false);
  const [mode, setMode] = useState<MergeMode>(roster.players.length === 0 ? 'add' : 'update matching');
  const [decisions, setDecisions] = useState<ReadonlyMap<number, Decision>>(new Map());

  const takeSheet = (from: Source, index: number) => {
    const rows = from.sheets[index]?.rows ?? [];
    const signature = headingSignature(listHeadings(rows, findHeadingRow(rows)).headings);
    const known = kept.find((entry) => entry.signature === signature);
    const remembered = known ? reuseMapping(known.mapping, rows, roster.garments) : null;
    setSource(from);
    setSheet(index);
    setRecalled(remembered !== null);
    setMapping(remembered ?? guessMapping(rows, roster.garments));
    setDecisions(new Map());
    forget();
  };

  const rows = source?.sheets[sheet]?.rows;
  const reading = useMemo(
    () => (rows && mapping ? readRoster(rows, mapping, roster.garments) : null),
    [rows, mapping, roster.garments],
  );
  const plan = useMemo(
    () => (reading ? planMerge(roster.players, reading.lines, decisions) : null),
    [reading, roster.players, decisions],
  );
  // A line that was decided stays in sight, so that the answer can be changed.
  const doubts = useMemo(() => {
    const open = reading ? planMerge(roster.players, reading.lines).ambiguous : [];
    const still = new Map((plan?.ambiguous ?? []).map((line) => [line.row, line]));
    const asked = open.map((line) => ({ ...line, reason: still.get(line.row)?.reason ?? line.reason }));
    for (const { row } of open) still.delete(row);
    return [...asked, ...still.values()];
  }, [reading, roster.players, plan]);
  const merged = useMemo(() => {
    let added = 0;
    return reading
      ? mergePlayers({
          players: roster.players,
          lines: reading.lines,
          decisions,
          mode,
          newId: () => `line ${(added += 1)}`,
        })
      : null;
  }, [reading, roster.players, decisions, mode]);
  // Also when only new players are added: a line in doubt would be left out without a word.
  const undecided = plan?.ambiguous.length ?? 0;
  const removed = plan && mode === 'replace' ? plan.missing.length : 0;
  const changed = plan && mode !== 'add' ? plan.changed.length : 0;
  const work = (plan?.added.length ?? 0) + changed + removed;

  const { submit, pending, failure, forget } = useSubmit(
    async () => {
      if (!reading || !rows || !mapping) throw new Error('nothing was read yet');
      const signature = headingSignature(listHeadings(rows, mapping.headerRow).headings);
      const answer = await onImport(league, {
        rosterId: roster.id,
        revision: roster.revision,
        mode,
        lines: reading.lines.map(({ line, extra }) => ({ line, extra })),
        decisions: [...decisions].map(([row, decision]) => ({ row, decision })),
        refused: reading.refused.length,
        remember:
          mapping.headerRow === null || signature === ''
            ? null
            : { signature: signature.slice(0, 2000), mapping },
      });
      // Somebody has changed the roster meanwhile: the page is read again, and the plan with it; the list stays.
      if (!answer.ok && answer.error.code === 'conflict') router.refresh();
      return answer;
    },
    (done) => {
      showToast({
        tone: 'set',
        title: `${countOf(done.added, 'player')} added, ${done.changed} changed${done.removed > 0 ? `, ${done.removed} removed` : ''}`,
      });
      router.push(path);
      router.refresh();
      return 'leaving';
    },
  );

  return (
    <div className="grid gap-5">
      <SourceCard
        readUrl={readUrl}
        source={source}
        onSource={(from) => (from === null ? setSource(null) : takeSheet(from, 0))}
      />
      {source && rows && mapping && reading && plan && merged && (
        <>
          <ColumnsCard
            source={source}
            sheet={sheet}
            onSheet={(index) => takeSheet(source, index)}
            rows={rows}
            mapping={mapping}
            recalled={recalled}
            garments={roster.garments}
            onMapping={(next) => {
              setMapping(next);
              setRecalled(false);
              setDecisions(new Map());
            }}
          />
          {roster.players.length > 0 && (
            <Card title="How it meets the roster" aside={countOf(roster.players.length, 'player')}>
              <RadioGroup
                legend="What to do"
                legendHidden
                name="mode"
                value={mode}
                onChange={(value) => setMode(value as MergeMode)}
                options={mergeModes.map((value) => ({ value, ...modeWords[value] }))}
              />
              <DoubtfulLines
                lines={doubts}
                decisions={decisions}
                onDecide={(row, decision) => {
                  const next = new Map(decisions);
                  if (decision === null) next.delete(row);
                  else next.set(row, decision);
                  setDecisions(next);
                }}
              />
              {removed > 0 && (
                <div className="mt-3">
                  <Notice tone="stop" title={`${countOf(removed, 'player')} will be removed`}>
                    {plan.missing.map((player) => player.name || 'a player without a name').join('; ')}
                  </Notice>
                </div>
              )}
            </Card>
          )}
          <PreviewCard
            reading={reading}
            merged={merged}
            before={roster.players}
            garments={roster.garments}
            ruleSet={roster.ruleSet}
          />
          <FormFailure failure={failure} inputs={false} />
          <div className="flex flex-wrap items-center gap-4">
            <Button
              look="primary"
              pending={pending}
              onClick={() => void submit()}
              unavailable={
                reading.lines.length === 0
                  ? 'No player could be read.'
                  : undecided > 0
                    ? `Say first who ${countOf(undecided, 'line')} ${undecided === 1 ? 'is' : 'are'}.`
                    : merged.players.length > Math.max(mostPlayersPerRoster, roster.players.length)
                      ? `A roster holds at most ${mostPlayersPerRoster} players, and this would make ${merged.players.length}. Keep the rows of one team.`
                      : work === 0
                        ? 'The roster holds all of this already.'
                        : undefined
              }
            >
              Import {countOf(reading.lines.length, 'player')}
            </Button>
            <p className="text-dusk">
              {plan.added.length} new, {changed} changed, {plan.unchanged.length} as they are
              {removed > 0 && `, ${removed} removed`}
              {reading.refused.length > 0 && `; ${countOf(reading.refused.length, 'row')} not read`}.
            </p>
          </div>
        </>
      )}
    </div>
  );
}
