import { listDifferentCells, readCell, sameExtra, writeCell } from './cells';
import { playerOfEdit, type RosterEdit } from './edit';

type Kind<K extends RosterEdit['kind']> = Extract<RosterEdit, { kind: K }>;

/**
 * The same edits in fewer: settings of one cell become one, settings of a player go into their adding before or their
 * removal after, a removal taken back becomes the settings that differ, and what ends as it began is dropped. Applied
 * to the roster they were made on, they give the same roster; sent twice, they do nothing the second time.
 */
export function foldEdits(edits: readonly RosterEdit[]): RosterEdit[] {
  const folded: RosterEdit[] = [];
  for (const edit of edits) {
    if (edit.kind === 'set') foldSet(folded, edit);
    else if (edit.kind === 'remove') foldRemove(folded, edit);
    else if (edit.kind === 'add') foldAdd(folded, edit);
    else folded.push(edit);
  }
  return folded.filter((edit) => edit.kind !== 'set' || edit.from !== edit.to);
}

/** Puts a setting into the latest one of the same cell, or into the adding of its player. */
function foldSet(folded: RosterEdit[], edit: Kind<'set'>): void {
  for (let at = folded.length - 1; at >= 0; at -= 1) {
    const earlier = folded[at];
    if (earlier === undefined || playerOfEdit(earlier) !== edit.playerId) continue;
    if (earlier.kind === 'remove') break;
    if (earlier.kind === 'add') {
      folded[at] = { ...earlier, player: writeCell(earlier.player, edit.field, edit.to) };
      return;
    }
    if (earlier.kind === 'set' && earlier.field === edit.field) {
      folded[at] = { ...earlier, to: edit.to };
      return;
    }
  }
  folded.push(edit);
}

/** A player set and then removed was removed as they were before: the settings would find nobody if sent again. */
function foldRemove(folded: RosterEdit[], edit: Kind<'remove'>): void {
  let was = edit.was;
  for (let at = folded.length - 1; at >= 0; at -= 1) {
    const earlier = folded[at];
    if (earlier === undefined || playerOfEdit(earlier) !== was.id) continue;
    if (earlier.kind === 'remove' || earlier.kind === 'add') break;
    if (earlier.kind !== 'set') continue;
    was = writeCell(was, earlier.field, earlier.from);
    folded.splice(at, 1);
  }
  folded.push({ ...edit, was });
}

/** A player removed and brought back was only changed, and put where they are now. */
function foldAdd(folded: RosterEdit[], edit: Kind<'add'>): void {
  const at = folded.findLastIndex((earlier) => playerOfEdit(earlier) === edit.player.id);
  const earlier = folded[at];
  if (earlier?.kind !== 'remove' || !sameExtra(earlier.was.extra, edit.player.extra)) {
    folded.push(edit);
    return;
  }
  const { was } = earlier;
  folded.splice(at, 1);
  for (const field of listDifferentCells(was, edit.player)) {
    const [from, to] = [readCell(was, field), readCell(edit.player, field)];
    foldSet(folded, { kind: 'set', playerId: was.id, field, from, to });
  }
  folded.push({ kind: 'move', playerId: was.id, after: edit.after, from: earlier.after });
}
