import { isSameEntry } from './cells';
import type { RosterEntry } from './edit';

/** What must be written so that a stored list of players becomes another; positions count from 0. */
export type PlayerWrites = {
  added: { player: RosterEntry; position: number }[];
  changed: RosterEntry[];
  /** Players whose place changed, whether or not anything else did. */
  moved: { id: string; position: number }[];
  removed: string[];
};

/** Compares the stored players with a list by id. Afterwards the positions are 0, 1, 2… in the order of the list. */
export function listPlayerWrites(
  before: readonly (RosterEntry & { position: number })[],
  after: readonly RosterEntry[],
): PlayerWrites {
  const known = new Map(before.map((player) => [player.id, player]));
  const writes: PlayerWrites = { added: [], changed: [], moved: [], removed: [] };
  for (const [position, player] of after.entries()) {
    const stored = known.get(player.id);
    known.delete(player.id);
    if (stored === undefined) writes.added.push({ player, position });
    else {
      if (!isSameEntry(stored, player)) writes.changed.push(player);
      if (stored.position !== position) writes.moved.push({ id: player.id, position });
    }
  }
  writes.removed = [...known.keys()];
  return writes;
}
