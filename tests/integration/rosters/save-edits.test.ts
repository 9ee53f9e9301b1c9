import { describe, expect, it } from 'vitest';
import { getRosterNews } from '@/lib/use-cases/rosters/get-roster';
import { saveRosterEditsSchema } from '@/lib/use-cases/rosters/roster-schemas';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import type { RosterEdit } from '@/lib/domain/roster/edit';
import type { ActorContext } from '@/lib/use-cases/context';
import { buildTeam, laterBy, moveRoster } from '../../factories/league';
import { queryAsAdmin } from '../../support/database';
import { buildRoster, listRosterEvents, makeAdd, makeSet, type BuiltRoster } from '../../factories/rosters';

const save = (ctx: ActorContext, built: BuiltRoster, baseRevision: number, edits: RosterEdit[]) =>
  saveRosterEdits(ctx, { rosterId: built.team.rosterId, baseRevision, edits });

describe('saving edits of a roster', () => {
  it('keeps the changes of two people who edit different cells at the same time', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const [ines, pip] = seen.players;
    const [a, b] = await Promise.all([
      save(built.ana, built, seen.revision, [makeSet(ines, 'number', '5')]),
      save(built.ben, built, seen.revision, [
        makeSet(pip, 'size:jersey', 'AS'),
        makeSet(ines, 'name', 'Calloway, Inés'),
      ]),
    ]);
    expect([a.conflicts, b.conflicts]).toEqual([[], []]);
    const now = await built.read();
    expect(now.players.map(({ name, number, sizes }) => [name, number, sizes['jersey']])).toEqual([
      ['Calloway, Inés', '5', 'YM'],
      ['Dunmore, Pip', '14', 'AS'],
    ]);
    expect(now.revision).toBe(seen.revision + 2);
  });

  it('answers the second of two changes of one cell with both values, and keeps the first', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const [ines] = seen.players;
    await save(built.ana, built, seen.revision, [makeSet(ines, 'number', '5')]);
    const late = makeSet(ines, 'number', '6');
    const answer = await save(built.ben, built, seen.revision, [late]);
    expect(answer.conflicts).toEqual([{ edit: late, theirs: { is: 'cell', value: '5' } }]);
    expect(answer.players[0]?.number).toBe('5');
    expect(answer.players[0]?.changedBy).toBe(built.ana.actor.name);
  });

  it('does edits that arrive twice once', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const add = makeAdd({ name: 'Ellery, Jonah', number: '25' }, seen.players.at(-1)?.id ?? null);
    const edits = [add, makeSet(seen.players[0], 'number', '5')];
    const once = await save(built.ana, built, seen.revision, edits);
    const twice = await save(built.ana, built, seen.revision, edits);
    expect(twice.revision).toBe(once.revision);
    expect(twice.players).toEqual(once.players);
    expect(twice.conflicts).toEqual([]);
    expect(twice.players.map(({ name }) => name)).toEqual([
      'Calloway, Ines',
      'Dunmore, Pip',
      'Ellery, Jonah',
    ]);
  });

  it('does not remove a player whom somebody has changed meanwhile', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const [, pip] = seen.players;
    if (!pip) throw new Error('no player');
    await save(built.ana, built, seen.revision, [makeSet(pip, 'number', '15')]);
    const { changedAt: _at, changedBy: _by, ...was } = pip;
    const remove: RosterEdit = { kind: 'remove', was, after: seen.players[0]?.id ?? null };
    const answer = await save(built.ben, built, seen.revision, [remove]);
    expect(answer.conflicts[0]?.theirs).toMatchObject({ is: 'changed player', player: { number: '15' } });
    expect(answer.players).toHaveLength(2);
  });

  it('keeps the order of the list when players are added between, removed and moved', async () => {
    const built = await buildRoster({ players: ['A', 'B', 'C', 'D'].map((name) => ({ name })) });
    const seen = await built.read();
    const [a, b, , d] = seen.players;
    if (!a || !b || !d) throw new Error('no player');
    const { changedAt: _at, changedBy: _by, ...was } = b;
    await save(built.ana, built, seen.revision, [
      makeAdd({ name: 'A2' }, a.id),
      { kind: 'remove', was, after: a.id },
      { kind: 'move', playerId: d.id, after: null, from: seen.players[2]?.id ?? null },
    ]);
    expect((await built.read()).players.map(({ name }) => name)).toEqual(['D', 'A', 'A2', 'C']);
  });

  it('is refused once the roster is submitted, signed off or frozen, with the way out', async () => {
    for (const state of ['submitted', 'signed off', 'frozen'] as const) {
      const built = await buildRoster();
      const seen = await built.read();
      await moveRoster(built.league, built.team.rosterId, state);
      await expect(
        save(built.ana, built, seen.revision, [makeSet(seen.players[0], 'number', '5')]),
      ).rejects.toMatchObject({ code: 'locked', message: expect.stringContaining(`is ${state}`) });
    }
  });

  it('of another team or another league finds no roster', async () => {
    const built = await buildRoster();
    const elsewhere = await buildRoster();
    const seen = await built.read();
    const edits = [makeSet(seen.players[0], 'number', '5')];
    for (const ctx of [built.stranger, elsewhere.ana, elsewhere.admin]) {
      await expect(save(ctx, built, seen.revision, edits)).rejects.toMatchObject({ code: 'not-found' });
    }
  });

  it('cannot take a player of another roster over by their id', async () => {
    const built = await buildRoster();
    const division = built.division;
    const other = await buildTeam(built.league, division, { players: [{ name: 'Somebody' }] });
    const theirs = (await built.read(built.admin)).players;
    const [row] = await queryAsAdmin<{ id: string }>('select id from players where roster_id = $1', [
      other.rosterId,
    ]);
    const add = makeAdd({ name: 'Thief' }, null);
    if (add.kind !== 'add') throw new Error('not an add');
    await expect(
      save(built.ana, built, 1, [{ ...add, player: { ...add.player, id: row?.id ?? '' } }]),
    ).rejects.toMatchObject({ code: 'conflict' });
    expect((await built.read()).players).toEqual(theirs);
  });

  it('never grows a roster over 200 players', async () => {
    const built = await buildRoster({ players: [] });
    const adds = Array.from({ length: 201 }, () => makeAdd({ name: 'Wren' }, null));
    await expect(save(built.ana, built, 1, adds)).rejects.toMatchObject({
      code: 'invalid',
      message: expect.stringContaining('at most 200 players'),
    });
    expect((await built.read()).players).toEqual([]);
    await save(built.ana, built, 1, adds.slice(0, 200));
    expect((await built.read()).players).toHaveLength(200);
  });

  it('writes who changed what into the history, and nothing for edits that change nothing', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const edit = makeSet(seen.players[0], 'number', '5');
    await save(built.ana, built, seen.revision, [edit]);
    await save(built.ana, built, seen.revision, [edit]);
    const events = await listRosterEvents(built.team.rosterId);
    expect(events).toEqual([
      {
        type: 'roster edited',
        user_id: built.ana.actor.userId,
        data: {
          team: 'Herons',
          changes: [{ kind: 'cell', playerId: seen.players[0]?.id, field: 'number', from: '4', to: '5' }],
        },
      },
    ]);
  });

  it('takes text no database would, cleaned', async () => {
    const built = await buildRoster({ players: [] });
    const add = makeAdd({ name: 'Wr\u0000en \ud800', sizes: { jersey: 'Y\u0000M' } }, null);
    const input = saveRosterEditsSchema.parse({
      rosterId: built.team.rosterId,
      baseRevision: 1,
      edits: [add],
    });
    await saveRosterEdits(built.ana, input);
    expect((await built.read()).players[0]).toMatchObject({ name: 'Wren \ufffd', sizes: { jersey: 'YM' } });
  });
});

describe('looking for news of a roster', () => {
  it('answers little when nothing is new, and everything once somebody has changed a cell or the state', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const ask = (since: number, state?: 'open' | 'submitted') =>
      getRosterNews(built.ben, { rosterId: built.team.rosterId, since, state });
    expect(await ask(seen.revision, 'open')).toEqual({ changed: false, revision: seen.revision });
    await save(laterBy(built.ana, 5), built, seen.revision, [makeSet(seen.players[0], 'number', '5')]);
    const news = await ask(seen.revision, 'open');
    expect(news).toMatchObject({
      changed: true,
      revision: seen.revision + 1,
      updated: { by: built.ana.actor.name },
    });
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    expect(await ask(seen.revision + 1, 'open')).toMatchObject({ changed: true, state: 'submitted' });
  });

  it('is for those who may see the team only', async () => {
    const built = await buildRoster();
    await expect(
      getRosterNews(built.stranger, { rosterId: built.team.rosterId, since: 0, state: undefined }),
    ).rejects.toMatchObject({ code: 'not-found' });
  });
});
