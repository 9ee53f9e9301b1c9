import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyEdits, insistOn, playerAbove, type EditConflict } from '@/lib/domain/roster/apply-edits';
import {
  isSameEntry,
  listDifferentCells,
  makeEmptyEntry,
  readCell,
  writeCell,
} from '@/lib/domain/roster/cells';
import {
  invertEdit,
  playerOfEdit,
  rosterEditSchema,
  type CellField,
  type RosterEdit,
  type RosterEntry,
} from '@/lib/domain/roster/edit';
import { foldEdits } from '@/lib/domain/roster/fold-edits';

const idAt = (at: number): string => `00000000-0000-4000-8000-${String(at).padStart(12, '0')}`;
const fields: CellField[] = ['name', 'nameOnBack', 'number', 'role', 'size:jersey', 'size:shorts'];
const valueArb = fc.constantFrom('', '4', '14', 'YM', 'Adisa', 'constructor');

const entryArb = (id: string): fc.Arbitrary<RosterEntry> =>
  fc
    .record({ name: valueArb, nameOnBack: valueArb, number: valueArb, role: valueArb, jersey: valueArb })
    .map(({ jersey, ...own }) => ({
      ...makeEmptyEntry(id),
      ...own,
      sizes: jersey === '' ? {} : { jersey },
      extra: jersey === 'YM' ? { 'Played before': 'yes' } : {},
    }));

const rosterArb = fc
  .integer({ min: 0, max: 6 })
  .chain((count) => fc.tuple(...Array.from({ length: count }, (_, at) => entryArb(idAt(at)))));

/** A step somebody takes on whatever they see: what it becomes depends on the roster at that moment. */
const stepArb = fc.record({
  kind: fc.constantFrom('set', 'set', 'set', 'add', 'remove', 'move'),
  row: fc.nat(9),
  other: fc.nat(9),
  field: fc.constantFrom(...fields),
  value: valueArb,
});
type Step = typeof stepArb extends fc.Arbitrary<infer T> ? T : never;

/** The edits of one person who takes these steps one after the other on their own screen. */
function takeSteps(start: readonly RosterEntry[], steps: readonly Step[], firstId: number): RosterEdit[] {
  let players = [...start];
  const edits: RosterEdit[] = [];
  for (const [at, step] of steps.entries()) {
    const row = players.length === 0 ? 0 : step.row % players.length;
    const player = players[row];
    let edit: RosterEdit;
    if (step.kind === 'add' || player === undefined) {
      const added = { ...makeEmptyEntry(idAt(firstId + at)), name: step.value };
      edit = { kind: 'add', player: added, after: players.at(-1)?.id ?? null };
    } else if (step.kind === 'remove') {
      edit = { kind: 'remove', was: player, after: playerAbove(players, row) };
    } else if (step.kind === 'move') {
      const rest = players.filter(({ id }) => id !== player.id);
      const after = playerAbove(rest, step.other % (rest.length + 1));
      edit = { kind: 'move', playerId: player.id, after, from: playerAbove(players, row) };
    } else {
      const from = readCell(player, step.field);
      edit = { kind: 'set', playerId: player.id, field: step.field, from, to: step.value };
    }
    edits.push(edit);
    players = applyEdits(players, [edit]).players;
  }
  return edits;
}

const stepsArb = fc.array(stepArb, { maxLength: 12 });
const idsOf = (players: readonly RosterEntry[]) => players.map(({ id }) => id);

describe('edits of a roster', () => {
  it('taken back in turn leave the roster as it was, order included', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, (start, steps) => {
        const edits = takeSteps(start, steps, 100);
        const done = applyEdits(start, edits);
        const undone = applyEdits(done.players, [...done.applied].reverse().map(invertEdit));
        expect(idsOf(undone.players)).toEqual(idsOf(start));
        for (const [at, player] of undone.players.entries())
          expect(isSameEntry(player, start[at] ?? makeEmptyEntry(''))).toBe(true);
      }),
    );
  });

  it('of one person on their own screen never conflict', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, (start, steps) => {
        expect(applyEdits(start, takeSteps(start, steps, 100)).conflicts).toEqual([]);
      }),
    );
  });

  it('of two people, in either order, are each applied, there already or named as a conflict', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, stepsArb, (start, mine, theirs) => {
        const first = takeSteps(start, mine, 100);
        const second = takeSteps(start, theirs, 200);
        for (const [one, two] of [
          [first, second],
          [second, first],
        ] as const) {
          const before = applyEdits(start, one);
          const outcome = applyEdits(before.players, two);
          const told = [...outcome.applied, ...outcome.already, ...outcome.conflicts.map(({ edit }) => edit)];
          for (const edit of two) expect(told).toContain(edit);
        }
      }),
    );
  });

  it('of two people on different cells are all there in the end, whoever comes first', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, stepsArb, (start, mine, theirs) => {
        const sets = (steps: readonly Step[], parity: number) =>
          takeSteps(
            start,
            steps
              .filter(({ field }) => fields.indexOf(field) % 2 === parity)
              .map((step) => ({ ...step, kind: 'set' as const })),
            parity * 100 + 100,
          ).filter((edit) => edit.kind === 'set' && start.some(({ id }) => id === edit.playerId));
        const [a, b] = [sets(mine, 0), sets(theirs, 1)];
        const ab = applyEdits(applyEdits(start, a).players, b);
        const ba = applyEdits(applyEdits(start, b).players, a);
        expect(ab.conflicts).toEqual([]);
        expect(ba.conflicts).toEqual([]);
        for (const [at, player] of ab.players.entries())
          expect(isSameEntry(player, ba.players[at] ?? makeEmptyEntry(''))).toBe(true);
      }),
    );
  });

  it('in conflict name the value that stands and lose neither', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, stepsArb, (start, mine, theirs) => {
        const before = applyEdits(start, takeSteps(start, theirs, 200));
        const outcome = applyEdits(before.players, takeSteps(start, mine, 100));
        for (const { edit, theirs: found } of outcome.conflicts) {
          const there = before.players.find(({ id }) => id === playerOfEdit(edit));
          if (found.is === 'removed') expect(there).toBeUndefined();
          if (found.is === 'cell' && edit.kind === 'set') {
            expect(found.value).not.toBe(edit.from);
            expect(found.value).not.toBe(edit.to);
          }
        }
      }),
    );
  });

  it('sent twice are done once', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, (start, steps) => {
        const folded = foldEdits(takeSteps(start, steps, 100));
        const once = applyEdits(start, folded);
        const twice = applyEdits(once.players, folded);
        expect(new Set(idsOf(twice.players))).toEqual(new Set(idsOf(once.players)));
        expect(twice.conflicts).toEqual([]);
        for (const player of twice.players)
          expect(once.players.some((other) => isSameEntry(other, player))).toBe(true);
      }),
    );
  });

  it('folded into fewer give the same roster', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, (start, steps) => {
        const edits = takeSteps(start, steps, 100);
        const folded = foldEdits(edits);
        expect(folded.length).toBeLessThanOrEqual(edits.length);
        const [plain, short] = [applyEdits(start, edits), applyEdits(start, folded)];
        expect(short.conflicts).toEqual([]);
        expect(idsOf(short.players)).toEqual(idsOf(plain.players));
        for (const [at, player] of short.players.entries())
          expect(listDifferentCells(player, plain.players[at] ?? makeEmptyEntry(''))).toEqual([]);
      }),
    );
  });

  it('insisted on after a conflict, as they are sent, end the way their editor wanted', () => {
    fc.assert(
      fc.property(rosterArb, stepsArb, stepsArb, (start, mine, theirs) => {
        const before = applyEdits(start, takeSteps(start, theirs, 200));
        const outcome = applyEdits(before.players, foldEdits(takeSteps(start, mine, 100)));
        const conflict: EditConflict | undefined = outcome.conflicts.at(-1);
        if (conflict === undefined) return;
        const known = start.find(({ id }) => id === playerOfEdit(conflict.edit));
        const present = outcome.players.find(({ id }) => id === playerOfEdit(conflict.edit));
        const end = applyEdits(outcome.players, insistOn(conflict, present, known, null));
        const player = end.players.find(({ id }) => id === playerOfEdit(conflict.edit));
        if (conflict.edit.kind === 'remove') expect(player).toBeUndefined();
        if (conflict.edit.kind === 'set')
          expect(player && readCell(player, conflict.edit.field)).toBe(conflict.edit.to);
      }),
    );
  });

  it('of a player who was removed meanwhile are kept as a conflict, and the player can come back with them', () => {
    const pip = { ...makeEmptyEntry(idAt(1)), name: 'Dunmore, Pip', number: '14' };
    const edit: RosterEdit = { kind: 'set', playerId: pip.id, field: 'number', from: '14', to: '15' };
    const { conflicts } = applyEdits([], [edit]);
    expect(conflicts).toEqual([{ edit, theirs: { is: 'removed' } }]);
    const [conflict] = conflicts;
    const back = applyEdits([], conflict ? insistOn(conflict, undefined, pip, null) : []);
    expect(back.players).toEqual([{ ...pip, number: '15' }]);
  });

  it('remove a player only as they were seen', () => {
    const pip = { ...makeEmptyEntry(idAt(1)), name: 'Dunmore, Pip' };
    const changed = writeCell(pip, 'number', '15');
    const { players, conflicts } = applyEdits([changed], [{ kind: 'remove', was: pip, after: null }]);
    expect(players).toEqual([changed]);
    expect(conflicts[0]?.theirs).toEqual({ is: 'changed player', player: changed });
  });
});

describe('an edit from outside', () => {
  const set = { kind: 'set', playerId: idAt(1), field: 'number', from: '', to: '7' };

  it('is cleaned of what no database takes', () => {
    expect(rosterEditSchema.parse({ ...set, to: ' 7\u0000\u200b ' })).toEqual({ ...set, to: '7' });
  });

  it('is refused with a sentence when it is too long for its cell, and never cut', () => {
    const result = rosterEditSchema.safeParse({ ...set, to: '7'.repeat(21) });
    expect(result.error?.issues[0]?.message).toBe('A number has at most 20 characters; this one has 21.');
  });

  it('may name only cells there are', () => {
    for (const field of ['sizes', 'size:', 'size:__proto__', 'extra', 'number_key', ''])
      expect(rosterEditSchema.safeParse({ ...set, field }).success).toBe(false);
    expect(rosterEditSchema.safeParse({ ...set, field: 'size:constructor' }).success).toBe(true);
  });
});
