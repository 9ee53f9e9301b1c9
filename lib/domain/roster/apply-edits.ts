import { isSameEntry, listCells, makeEmptyEntry, readCell, writeCell } from './cells';
import type { RosterEdit, RosterEntry } from './edit';

/** An edit that could not be applied because somebody else got there first, and what they did. */
export type EditConflict = {
  edit: RosterEdit;
  theirs: { is: 'cell'; value: string } | { is: 'removed' } | { is: 'changed player'; player: RosterEntry };
};

/**
 * What became of each edit: applied, or already so (the roster says it without us), or in conflict. A conflict holds
 * both values, so neither is lost.
 */
export type EditOutcome = {
  players: RosterEntry[];
  applied: RosterEdit[];
  already: RosterEdit[];
  conflicts: EditConflict[];
};

/**
 * Applies edits in their order. A cell is set when it still holds what the editor saw, or holds the new value already;
 * a player is removed only as the editor saw them; a player added twice is one player. Who was moved after somebody
 * now gone goes to the end. The list given stays as it was.
 */
export function applyEdits(players: readonly RosterEntry[], edits: readonly RosterEdit[]): EditOutcome {
  const outcome: EditOutcome = { players: [...players], applied: [], already: [], conflicts: [] };
  for (const edit of edits) applyOne(outcome, edit);
  return outcome;
}

function applyOne(outcome: EditOutcome, edit: RosterEdit): void {
  switch (edit.kind) {
    case 'set':
      return applySet(outcome, edit);
    case 'add':
      return applyAdd(outcome, edit);
    case 'remove':
      return applyRemove(outcome, edit);
    case 'move':
      return applyMove(outcome, edit);
  }
}

type Kind<K extends RosterEdit['kind']> = Extract<RosterEdit, { kind: K }>;

function applySet(outcome: EditOutcome, edit: Kind<'set'>): void {
  const at = outcome.players.findIndex(({ id }) => id === edit.playerId);
  const player = outcome.players[at];
  if (player === undefined) {
    outcome.conflicts.push({ edit, theirs: { is: 'removed' } });
    return;
  }
  const value = readCell(player, edit.field);
  if (value === edit.to) outcome.already.push(edit);
  else if (value !== edit.from) outcome.conflicts.push({ edit, theirs: { is: 'cell', value } });
  else {
    outcome.players[at] = writeCell(player, edit.field, edit.to);
    outcome.applied.push(edit);
  }
}

function applyAdd(outcome: EditOutcome, edit: Kind<'add'>): void {
  const present = outcome.players.find(({ id }) => id === edit.player.id);
  if (present === undefined) {
    insertAfter(outcome.players, edit.player, edit.after);
    outcome.applied.push(edit);
    return;
  }
  // Sent twice, and changed by somebody in between: what differs is said cell by cell.
  outcome.already.push(edit);
  for (const field of listCells(edit.player)) {
    const [mine, value] = [readCell(edit.player, field), readCell(present, field)];
    if (mine === value) continue;
    const set = { kind: 'set' as const, playerId: present.id, field, from: '', to: mine };
    outcome.conflicts.push({ edit: set, theirs: { is: 'cell', value } });
  }
}

function applyRemove(outcome: EditOutcome, edit: Kind<'remove'>): void {
  const at = outcome.players.findIndex(({ id }) => id === edit.was.id);
  const player = outcome.players[at];
  if (player === undefined) outcome.already.push(edit);
  else if (!isSameEntry(player, edit.was)) {
    outcome.conflicts.push({ edit, theirs: { is: 'changed player', player } });
  } else {
    outcome.players.splice(at, 1);
    outcome.applied.push(edit);
  }
}

/** A move of a player who is gone has nothing left to do. */
function applyMove(outcome: EditOutcome, edit: Kind<'move'>): void {
  const at = outcome.players.findIndex(({ id }) => id === edit.playerId);
  const player = outcome.players[at];
  if (
    player === undefined ||
    edit.after === edit.playerId ||
    playerAbove(outcome.players, at) === edit.after
  ) {
    outcome.already.push(edit);
    return;
  }
  outcome.players.splice(at, 1);
  insertAfter(outcome.players, player, edit.after);
  outcome.applied.push(edit);
}

function insertAfter(players: RosterEntry[], player: RosterEntry, after: string | null): void {
  const above = after === null ? -1 : players.findIndex(({ id }) => id === after);
  const place = after !== null && above === -1 ? players.length : above + 1;
  players.splice(place, 0, player);
}

/** The id of the player above a row (counted from 0), null at the top. */
export const playerAbove = (players: readonly RosterEntry[], row: number): string | null =>
  players[row - 1]?.id ?? null;

/**
 * The edits that let a conflict end the way its editor wanted. `present` is the player as they stand now; one who was
 * removed comes back below the player `after`, as `lastKnown` (or with nothing but the cell in question).
 */
export function insistOn(
  { edit }: EditConflict,
  present: RosterEntry | undefined,
  lastKnown: RosterEntry | undefined,
  after: string | null,
): RosterEdit[] {
  if (edit.kind === 'set') {
    if (present !== undefined) return [{ ...edit, from: readCell(present, edit.field) }];
    const player = writeCell(lastKnown ?? makeEmptyEntry(edit.playerId), edit.field, edit.to);
    return [{ kind: 'add', player, after }];
  }
  if (edit.kind === 'remove' && present !== undefined) return [{ ...edit, was: present }];
  return [];
}
