'use client';

import { useMemo, useState } from 'react';
import { Button, ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';
import { severityTone } from '@/components/status/finding-mark';
import { readNumber } from '@/lib/domain/numbers/label';
import { playerAbove } from '@/lib/domain/roster/apply-edits';
import { makeEmptyEntry, readCell, writeCell } from '@/lib/domain/roster/cells';
import {
  cleanCellValue,
  invertEdit,
  playerOfEdit,
  type CellField,
  type RosterEdit,
  type RosterEntry,
} from '@/lib/domain/roster/edit';
import { planPaste } from '@/lib/domain/roster/paste-block';
import { mostPlayersPerRoster } from '@/lib/domain/roster/player';
import { listRosterColumns } from '@/lib/domain/roster/roster-columns';
import { isRosterEditable } from '@/lib/domain/roster/roster-state';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import type { Severity } from '@/lib/domain/rules/finding';
import { countOf } from '@/lib/domain/text/count-of';
import type { RosterPage } from '@/lib/use-cases/rosters/get-roster';
import { paths } from '@/lib/web/paths';
import { groupFindings } from './cell-findings';
import { ConflictPanel } from './conflict-panel';
import type { Sort } from './grid-head';
import { newRow, type Place } from './grid-place';
import { makeId } from './make-id';
import { RailCard, railId } from './rail-card';
import { RosterGrid, type Draft } from './roster-grid';
import { RosterHead, type RosterSteps } from './roster-head';
import { RosterNotices } from './roster-notices';
import { RosterToolbar } from './roster-toolbar';
import { arrange, matchesPlayer, sortRows } from './row-order';
import { RowMenu } from './row-menu';
import { SaveStateLine } from './save-state-line';
import { useRosterSession } from './use-roster-session';

/**
 * The page of one roster: edited in place, checked as it is typed by the code that also checks it on the server, saved
 * by itself, and shared with whoever else has it open.
 */
export function RosterEditor({
  league,
  user,
  today,
  roster,
  steps,
}: {
  league: { slug: string; timeZone: string };
  user: { id: string; name: string };
  today: Date;
  roster: RosterPage;
  steps: RosterSteps;
}) {
  const editable = roster.may.edit && isRosterEditable(roster.state);
  const open = useRosterSession(paths.api.roster(league.slug, roster.id), roster, user, editable);
  const { session, view, document: held } = open;
  const showToast = useToast();
  const [place, setPlace] = useState<Place | null>(null);
  const [draft, setDraft] = useState<Draft | null>(null);
  const [sort, setSort] = useState<Sort | null>(null);
  const [order, setOrder] = useState<readonly string[] | null>(null);
  const [only, setOnly] = useState<{ severity: Severity; ids: ReadonlySet<string> } | null>(null);
  const [find, setFind] = useState('');
  const [findOpen, setFindOpen] = useState(false);

  const { garments, rules } = roster;
  const ruleSet = rules?.ruleSet ?? null;
  const columns = useMemo(() => listRosterColumns(ruleSet, garments, view), [ruleSet, garments, view]);
  const typed = useMemo(
    () =>
      draft === null
        ? view
        : view.map((player) =>
            player.id === draft.row ? writeCell(player, draft.field, draft.text) : player,
          ),
    [view, draft],
  );
  const check = useMemo(
    () => (ruleSet === null ? null : checkRoster(ruleSet, typed, garments)),
    [ruleSet, typed, garments],
  );
  const { whole, byRow } = useMemo(() => groupFindings(check?.findings ?? []), [check]);
  const rowOf = useMemo(() => new Map(view.map(({ id }, row) => [id, row])), [view]);

  const findingsOf = (id: string) => byRow.get(rowOf.get(id) ?? -1) ?? [];
  const marksOf = (id: string) => held.marks.filter(({ playerId }) => playerId === id);
  const has = (id: string, severity: Severity) =>
    findingsOf(id).some((finding) => finding.severity === severity);
  // Who was shown stays in sight while being put right, or the row would go away under the hand.
  const shown = arrange(view, order).filter(
    (player) =>
      (only === null || only.ids.has(player.id) || has(player.id, only.severity)) &&
      (!findOpen || find.trim() === '' || matchesPlayer(player, find)),
  );
  const narrowed = shown.length < view.length || order !== null;
  const active = place === null ? undefined : view.find(({ id }) => id === place.row);
  const worn = active ?? view[0];
  const wornNumber = worn === undefined ? null : readNumber(worn.number);

  const nameOf = (player: RosterEntry): string => player.name || 'the player without a name';
  const set = (player: RosterEntry, field: CellField, value: string) =>
    session.edit([
      {
        kind: 'set',
        playerId: player.id,
        field,
        from: readCell(player, field),
        to: cleanCellValue(field, value),
      },
    ]);
  const add = (field: CellField, value: string): string | null => {
    if (view.length >= mostPlayersPerRoster) {
      showToast({ tone: 'care', title: `A roster holds at most ${mostPlayersPerRoster} players.` });
      return null;
    }
    const player = writeCell(makeEmptyEntry(makeId()), field, cleanCellValue(field, value));
    session.edit([{ kind: 'add', player, after: view.at(-1)?.id ?? null }]);
    return player.id;
  };
  const paste = (anchor: { row: number; column: number }, block: string[][]) => {
    const plan = planPaste({ players: view, shown, columns, anchor, block, newId: makeId });
    session.edit(plan.edits);
    const step = session.getSnapshot().document.done.at(-1);
    const takeBack = () => {
      // While the paste is the latest step it can be done again; later it is taken back like any other edit.
      if (session.getSnapshot().document.done.at(-1) === step) void turn(true);
      else session.edit(plan.edits.toReversed().map(invertEdit));
    };
    const [first] = plan.edits;
    if (first !== undefined) setPlace({ row: playerOfEdit(first), column: anchor.column });
    const added = plan.edits.filter(({ kind }) => kind === 'add').length;
    const cells = plan.edits.length - added;
    const done = [added > 0 && countOf(added, 'player'), cells > 0 && countOf(cells, 'cell')].filter(Boolean);
    showToast({
      tone: plan.problems.length > 0 ? 'care' : 'set',
      title: done.length > 0 ? `Pasted ${done.join(' and ')}` : 'Nothing to paste here',
      body: plan.problems.slice(0, 3).join(' ') || undefined,
      action: plan.edits.length > 0 ? { label: 'Undo', onSelect: takeBack } : undefined,
    });
  };
  const remove = (player: RosterEntry) => {
    const row = rowOf.get(player.id) ?? 0;
    const edit: RosterEdit = { kind: 'remove', was: player, after: playerAbove(view, row) };
    const next = shown[shown.findIndex(({ id }) => id === player.id) + 1] ?? shown.at(-2);
    session.edit([edit]);
    setPlace({ row: next?.id ?? newRow, column: 0 });
    focusCellSoon(next?.id ?? newRow, 0);
    showToast({
      tone: 'note',
      title: `Removed ${nameOf(player)}`,
      action: { label: 'Undo', onSelect: () => session.edit([invertEdit(edit)]) },
    });
  };
  const moveRow = (player: RosterEntry, by: -1 | 1) => {
    const row = rowOf.get(player.id) ?? 0;
    if (narrowed || view[row + by] === undefined) return;
    const after = by === 1 ? (view[row + 1]?.id ?? null) : playerAbove(view, row - 1);
    session.edit([{ kind: 'move', playerId: player.id, after, from: playerAbove(view, row) }]);
  };
  const numberColumn = Math.max(
    0,
    columns.findIndex(({ field }) => field === 'number'),
  );
  /** Leads to the rail, which on a narrow screen stands below the list. */
  const pickNumberFor = (player: RosterEntry) => {
    setPlace({ row: player.id, column: numberColumn });
    // The menu gives the focus back to its button first.
    setTimeout(() => {
      const rail = document.getElementById(railId);
      rail?.scrollIntoView({ block: 'start' });
      rail?.querySelector<HTMLElement>('button[tabindex="0"]')?.focus({ preventScroll: true });
    }, 50);
  };
  const pickNumber = (label: string) => {
    if (!active) return;
    set(active, 'number', label);
    if (!window.matchMedia('(width < 64rem)').matches) return;
    focusCellSoon(active.id, numberColumn);
  };
  const turn = (back: boolean) => {
    const { edits, skipped } = back ? session.undo() : session.redo();
    const [first] = edits;
    if (skipped > 0) {
      showToast({
        tone: 'care',
        title: `${countOf(skipped, 'cell')} stayed as they are`,
        body: 'Somebody else has changed them since.',
      });
    }
    if (first === undefined || first.kind === 'remove') return;
    const column = first.kind === 'set' ? columns.findIndex(({ field }) => field === first.field) : 0;
    setPlace({ row: playerOfEdit(first), column: Math.max(0, column) });
  };
  const sortBy = (field: CellField) => {
    const next: Sort | null =
      sort?.field !== field ? { field, down: false } : sort.down ? null : { field, down: true };
    setSort(next);
    setOrder(next === null ? null : sortRows(view, next));
  };
  const narrowTo = (severity: Severity | null) => {
    if (severity === null) return setOnly(null);
    setOnly({ severity, ids: new Set(view.filter(({ id }) => has(id, severity)).map(({ id }) => id)) });
  };
  /** Everything typed must have arrived before a step is taken on it. */
  const prepare = async (): Promise<number | string> => {
    if (!editable) return held.revision;
    const saved = await session.flush();
    const now = session.getSnapshot();
    if (!saved) {
      return now.save.is === 'refused'
        ? now.save.message
        : 'Your last changes are not saved yet, so nothing was done. Try again in a moment.';
    }
    if (now.document.conflicts.length > 0)
      return 'Two people changed the same cell. Choose which value stays.';
    return now.document.revision;
  };

  const summary = check?.summary ?? null;
  const checkedAgainst =
    rules === null
      ? 'Not checked: no number rules are in force.'
      : `Checked against “${roster.ruleSetName}”, version ${rules.version}${editable ? ', as you type' : ''}.`;

  return (
    <>
      <RosterHead
        league={league.slug}
        timeZone={league.timeZone}
        today={today}
        roster={roster}
        players={view.length}
        number={wornNumber?.ok === true ? wornNumber.label : ''}
        blockers={summary?.blockers ?? 0}
        conflicts={held.conflicts.length}
        steps={steps}
        prepare={prepare}
      />
      <RosterNotices
        league={league.slug}
        timeZone={league.timeZone}
        roster={roster}
        restored={open.restored}
        leftovers={open.leftovers}
        unsaved={open.unsaved}
        onDismiss={() => session.dismissRestored()}
        onDiscard={() => void session.discardLeftovers()}
      />
      <ConflictPanel
        conflicts={held.conflicts}
        nameOf={(id) => view.find((player) => player.id === id)?.name}
        garments={garments}
        onKeepMine={(conflict) => session.keepMine(conflict)}
        onTakeTheirs={(conflict) => session.takeTheirs(conflict)}
      />
      <div className="grid items-start gap-4.5 lg:grid-cols-[minmax(0,1fr)_22rem] print:block">
        <div className="min-w-0">
          <Card flush>
            <RosterToolbar
              summary={summary}
              checkedAgainst={checkedAgainst}
              only={only?.severity ?? null}
              onOnly={narrowTo}
              undo={
                editable
                  ? {
                      back: held.done.length > 0 ? () => turn(true) : null,
                      again: held.undone.length > 0 ? () => turn(false) : null,
                    }
                  : null
              }
              find={find}
              onFind={setFind}
              findOpen={findOpen}
              onFindOpen={setFindOpen}
              saveState={
                editable && (
                  <SaveStateLine
                    save={open.save}
                    unsaved={open.unsaved}
                    today={today}
                    timeZone={league.timeZone}
                    signIn={paths.signIn(paths.account())}
                    onRetry={() => session.retry()}
                  />
                )
              }
            />
            {whole.map((finding, at) => (
              <Notice key={at} tone={severityTone[finding.severity]} flush>
                {finding.message}
              </Notice>
            ))}
            <RosterGrid
              label={`Roster of ${roster.team.name}`}
              rows={shown.map((player) => ({
                player,
                findings: findingsOf(player.id),
                marks: marksOf(player.id),
              }))}
              columns={columns}
              editable={editable}
              sort={sort}
              onSort={sortBy}
              place={place}
              onPlace={setPlace}
              onDraft={setDraft}
              onSet={set}
              onAdd={add}
              onPaste={paste}
              onMoveRow={moveRow}
              onTurn={turn}
              renderMenu={(player, row) => (
                <RowMenu
                  player={player}
                  name={nameOf(player)}
                  editable={editable}
                  canMove={{ up: !narrowed && row > 0, down: !narrowed && row < view.length - 1 }}
                  onPickNumber={ruleSet === null ? null : () => pickNumberFor(player)}
                  onMove={(by) => moveRow(player, by)}
                  onRemove={() => remove(player)}
                />
              )}
              empty={
                view.length > 0 ? (
                  <EmptyState
                    title={
                      find.trim() === ''
                        ? `No player has a ${only?.severity} now`
                        : `No player fits “${find}”`
                    }
                    action={
                      <Button
                        onClick={() => {
                          setFind('');
                          setOnly(null);
                        }}
                      >
                        Show all {view.length}
                      </Button>
                    }
                  />
                ) : (
                  <EmptyState
                    title="No players yet"
                    action={
                      editable && (
                        <ButtonLink
                          look="primary"
                          href={paths.uploadRoster(league.slug, roster.season.slug, roster.team.slug)}
                        >
                          Add from a file
                        </ButtonLink>
                      )
                    }
                  >
                    {editable
                      ? 'Bring in the list you have as a file or from a spreadsheet, or type the first player below.'
                      : 'Nobody has entered a player for this team.'}
                  </EmptyState>
                )
              }
            />
          </Card>
          {editable && (
            <p className="type-small text-dusk mt-2.5 px-1 max-sm:hidden print:hidden" aria-hidden="true">
              Arrow keys move, typing or Enter edits, Tab goes on. Paste cells from a spreadsheet anywhere;
              Ctrl Z takes a step back.
            </p>
          )}
        </div>
        {ruleSet !== null && (
          <RailCard
            rules={ruleSet}
            players={typed}
            player={active}
            onPick={editable ? pickNumber : null}
            onVisit={(row) => {
              const visited = view[row];
              if (!visited) return;
              setPlace({ row: visited.id, column: numberColumn });
            }}
          />
        )}
      </div>
    </>
  );
}

/** Focuses a cell once a menu that has just been used, and may have lost its button, has let the focus go. */
function focusCellSoon(row: string, column: number): void {
  setTimeout(() => {
    document.querySelector<HTMLElement>(`[data-row="${row}"][data-column="${column}"]`)?.focus();
  }, 50);
}
