import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { listMergeSteps, planMerge, type IncomingLine } from '@/lib/domain/roster/import/merge-roster';
import type { Player } from '@/lib/domain/roster/player';

const player = (id: string, name: string, number = '', more: Partial<Player> = {}): Player => ({
  id, position: 0, name, nameOnBack: '', number, role: '', sizes: {}, extra: {}, ...more,
}); // prettier-ignore
const incoming = (name: string, number = '', more: Partial<IncomingLine['line']> = {}): IncomingLine => ({
  line: { name, nameOnBack: '', number, role: '', sizes: {}, ...more },
  extra: {},
});

describe('planMerge', () => {
  it.each(['Tilly Vane', 'VANE, tilly', 'Vane,  Tilly', 'Tílly Vane', 'tilly vane.'])(
    'knows Vane, Tilly again in %j',
    (name) => {
      const plan = planMerge([player('a', 'Vane, Tilly', '7')], [incoming(name, '8')]);
      expect(plan.changed.map(({ player: { id } }) => id)).toEqual(['a']);
    },
  );

  it.each([
    ['Łukasz Wójt', 'Lukasz Wojt'],
    ["Bo O'Tarn", 'Bo O’Tarn'],
    ['Ana-Lu Quill', 'Ana Lu Quill'],
  ])('knows %j again in %j', (before, after) => {
    expect(planMerge([player('a', before)], [incoming(after, '8')]).changed).toHaveLength(1);
  });

  it('keeps names apart whose vowel signs differ in a script that spells with them', () => {
    expect(planMerge([player('a', 'कमल')], [incoming('कमला')]).added).toHaveLength(1);
  });

  it('changes what the file says and keeps what it leaves empty', () => {
    const before = player('a', 'Vane, Tilly', '7', {
      role: 'captain',
      sizes: { shirt: 'YM', shorts: 'YS' },
      extra: { Parent: 'Jo' },
    });
    const plan = planMerge(
      [before],
      [{ ...incoming('Vane, Tilly', '9', { sizes: { shirt: 'YL', shorts: '' } }), extra: { Bus: 'yes' } }],
    );
    expect(plan.changed[0]?.after).toEqual({
      line: {
        name: 'Vane, Tilly',
        nameOnBack: '',
        number: '9',
        role: 'captain',
        sizes: { shirt: 'YL', shorts: 'YS' },
      },
      extra: { Parent: 'Jo', Bus: 'yes' },
    });
    expect(plan.changed[0]?.before.line.number).toBe('7');
    const bare = planMerge([before], [incoming('tilly vane', '', { nameOnBack: 'VANE' })]).changed[0]?.after
      .line;
    expect(bare).toMatchObject({ name: 'tilly vane', nameOnBack: 'VANE', number: '7', role: 'captain' });
  });

  it('lists players the file does not name, and those it changes nothing about', () => {
    const plan = planMerge(
      [player('a', 'Ana Quill', '7'), player('b', 'Bo Tarn', '8')],
      [incoming('Ana Quill', '7')],
    );
    expect(plan.unchanged.map(({ id }) => id)).toEqual(['a']);
    expect(plan.missing.map(({ id }) => id)).toEqual(['b']);
  });

  it('lets the number decide between namesakes, read as a label', () => {
    const namesakes = [player('a', 'Ana Quill', '7'), player('b', 'Ana Quill', '07')];
    const plan = planMerge(namesakes, [
      incoming('Ana Quill', 'No. 07', { role: 'captain' }),
      incoming('Ana Quill', '7', { role: 'x' }),
    ]);
    expect(plan.changed.map(({ player: { id }, after }) => [id, after.line.role])).toEqual([
      ['b', 'captain'],
      ['a', 'x'],
    ]);
  });

  it('leaves in doubt what the number does not decide, and waits for a person', () => {
    const namesakes = [player('a', 'Ana Quill', '7'), player('b', 'Ana Quill', '8')];
    const lines = [incoming('Ana Quill', '9')];
    const plan = planMerge(namesakes, lines);
    expect(plan.ambiguous.map(({ row, candidates }) => [row, candidates.map(({ id }) => id)])).toEqual([
      [0, ['a', 'b']],
    ]);
    expect(plan.missing).toEqual([]);
    expect(planMerge(namesakes, lines, new Map([[0, { as: 'player', id: 'b' }]])).changed[0]?.player.id).toBe(
      'b',
    );
    expect(planMerge(namesakes, lines, new Map([[0, { as: 'new' }]])).added).toHaveLength(1);
  });

  it('asks again when two lines are said to be one player, rather than take the second for another', () => {
    const namesakes = [player('a', 'Pip Dunmore'), player('b', 'Pip Dunmore')];
    const lines = [incoming('Pip Dunmore', '4'), incoming('Pip Dunmore', '5')];
    const both = new Map([0, 1].map((row) => [row, { as: 'player' as const, id: 'a' }]));
    const plan = planMerge(namesakes, lines, both);
    expect(plan.changed.map(({ player: { id } }) => id)).toEqual(['a']);
    expect(plan.ambiguous).toMatchObject([{ row: 1, candidates: [{ id: 'a' }] }]);
    expect(plan.ambiguous[0]?.reason).toContain('already');
    const gone = planMerge([], lines, new Map([[0, { as: 'player' as const, id: 'a' }]]));
    expect(gone.ambiguous).toMatchObject([{ row: 0 }]);
  });

  it('asks when two rows have the name of one player, and when a name stands the other way round', () => {
    const plan = planMerge(
      [player('a', 'Ana Quill')],
      [incoming('Ana Quill', '7'), incoming('Ana Quill', '8')],
    );
    expect(plan.ambiguous).toHaveLength(2);
    expect(planMerge([player('a', 'Ana Quill')], [incoming('Quill Ana')]).ambiguous[0]?.reason).toContain(
      'another order',
    );
  });

  it('removes only in replace mode, and never a player some line may be', () => {
    const roster = [player('a', 'Ana Quill', '7'), player('b', 'Bo Tarn'), player('c', 'Cy Vane')];
    const plan = planMerge(roster, [incoming('Ana Quill', '9'), incoming('Tarn Bo'), incoming('Di Marl')]);
    const idsOf = (mode: 'add' | 'update matching' | 'replace') => {
      const steps = listMergeSteps(plan, mode);
      return [
        steps.add.map(({ line }) => line.name),
        steps.update.map((change) => change.player.id),
        steps.remove.map(({ id }) => id),
      ];
    };
    expect(idsOf('add')).toEqual([['Di Marl'], [], []]);
    expect(idsOf('update matching')).toEqual([['Di Marl'], ['a'], []]);
    expect(idsOf('replace')).toEqual([['Di Marl'], ['a'], ['c']]);
    expect(listMergeSteps(plan, 'add').leftAlone).toMatchObject({
      changes: [{ player: { id: 'a' } }],
      ambiguous: [{ row: 1 }],
    });
  });

  it('puts every line and every player in one place, whatever they are', () => {
    const name = fc.constantFrom(
      'Ana Quill',
      'Quill, Ana',
      'Quill Ana',
      'Bo Tarn',
      'BO TARN',
      'Cy',
      '',
      '...',
    );
    const number = fc.constantFrom('', '7', '07', '8');
    const decision = fc.oneof(
      fc.constant({ as: 'new' as const }),
      fc.nat(6).map((id) => ({ as: 'player' as const, id: String(id) })),
    );
    fc.assert(
      fc.property(
        fc.array(fc.tuple(name, number), { maxLength: 6 }),
        fc.array(fc.tuple(name, number), { maxLength: 6 }),
        fc.array(fc.tuple(fc.nat(6), decision), { maxLength: 3 }),
        (had, brought, decisions) => {
          const roster = had.map(([text, label], at) => player(String(at), text, label));
          const plan = planMerge(
            roster,
            brought.map(([text, label]) => incoming(text, label)),
            new Map(decisions),
          );
          const { added, changed, unchanged, ambiguous, missing } = plan;
          expect(added.length + changed.length + unchanged.length + ambiguous.length).toBe(brought.length);
          const touched = [
            ...changed.map((change) => change.player.id),
            ...unchanged.map(({ id }) => id),
            ...missing.map(({ id }) => id),
          ];
          expect(new Set(touched).size).toBe(touched.length);
          const doubted = ambiguous.flatMap(({ candidates }) => candidates.map(({ id }) => id));
          expect(new Set([...touched, ...doubted]).size).toBe(roster.length);
          expect(doubted.filter((id) => missing.some((other) => other.id === id))).toEqual([]);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it('brings the same file in twice without a change the second time', () => {
    const lines = [incoming('Ana Quill', '7'), incoming('Tarn, Bo', '00', { sizes: { shirt: 'M' } })];
    const stored = lines.map(({ line, extra }, at): Player => ({
      ...line,
      extra,
      id: String(at),
      position: at,
    }));
    expect(planMerge(stored, lines)).toMatchObject({ added: [], changed: [], ambiguous: [], missing: [] });
  });
});
