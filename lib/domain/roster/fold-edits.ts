import { writeCell } from './cells';
import { playerOfEdit, type RosterEdit } from './edit';

/**
 * The same edits in fewer: settings of one cell become one, settings of a player just added go into the adding, and
 * what ends as it began is dropped. Applied to the roster they were made on, they give the same roster.
 */
export function foldEdits(edits: readonly RosterEdit[]): RosterEdit[] {
  const folded: RosterEdit[] = [];
  for (const edit of edits) {
    if (edit.kind !== 'set' || !foldSet(folded, edit)) folded.push(edit);
  }
  return folded.filter((edit) => edit.kind !== 'set' || edit.from !== edit.to);
}

/** Puts a setting into the latest edit of the same cell or into the adding of its player; false when there is none. */
function foldSet(folded: RosterEdit[], edit: Extract<RosterEdit, { kind: 'set' }>): boolean {
  for (let at = folded.length - 1; at >= 0; at -= 1) {
    const earlier = folded[at];
    if (earlier === undefined || playerOfEdit(earlier) !== edit.playerId) continue;
    if (earlier.kind === 'add') {
      folded[at] = { ...earlier, player: writeCell(earlier.player, edit.field, edit.to) };
      return true;
    }
    if (earlier.kind === 'remove') return false;
    if (earlier.kind === 'set' && earlier.field === edit.field) {
      folded[at] = { ...earlier, to: edit.to };
      return true;
    }
  }
  return false;
}
