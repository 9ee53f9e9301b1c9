import type { RosterEntry } from './edit';
import {
  listMergeSteps,
  planMerge,
  type IncomingLine,
  type MergeDecisions,
  type MergeMode,
} from './import/merge-roster';
import type { Player } from './player';

/** What a roster becomes when a file is brought in. `undecided` lines wait for a person; nothing is to be written then. */
export type MergedRoster = {
  players: RosterEntry[];
  undecided: number;
  unchanged: number;
  /** Where each incoming line (by its place from 0) ended up in `players`; lines that wait are not in it. */
  placeOfLine: ReadonlyMap<number, number>;
};

/**
 * The roster after a file has been merged into it: players keep their place, changed ones take what the file says, new
 * ones follow in the order of the file with ids from `newId`. In mode `add` lines in doubt stay out and count as
 * undecided too.
 */
export function mergePlayers(given: {
  players: readonly Player[];
  lines: readonly IncomingLine[];
  decisions: MergeDecisions;
  mode: MergeMode;
  newId: () => string;
}): MergedRoster {
  const plan = planMerge(given.players, given.lines, given.decisions);
  const steps = listMergeSteps(plan, given.mode);
  const gone = new Set(steps.remove.map(({ id }) => id));
  const updates = new Map(steps.update.map(({ player, after }) => [player.id, after]));
  const kept = given.players
    .filter(({ id }) => !gone.has(id))
    .map((player): RosterEntry => {
      const { id, name, nameOnBack, number, role, sizes, extra } = player;
      const after = updates.get(id);
      return after
        ? { id, ...after.line, extra: after.extra }
        : { id, name, nameOnBack, number, role, sizes, extra };
    });
  const added = steps.add.map(({ line, extra }): RosterEntry => ({ id: given.newId(), ...line, extra }));
  const places = new Map(kept.map(({ id }, at) => [id, at]));
  const placeOfLine = new Map([
    ...plan.matched.flatMap(({ row, id }): [number, number][] => {
      const at = places.get(id);
      return at === undefined ? [] : [[row, at]];
    }),
    ...plan.added.map(({ row }, at): [number, number] => [row, kept.length + at]),
  ]);
  return {
    placeOfLine,
    players: [...kept, ...added],
    undecided: steps.leftAlone.ambiguous.length,
    unchanged: kept.length - updates.size,
  };
}
