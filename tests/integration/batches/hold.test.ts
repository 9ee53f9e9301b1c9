import { beforeEach, describe, expect, it } from 'vitest';
import { changeBatch } from '@/lib/use-cases/batches/change-batch';
import { discardBatch } from '@/lib/use-cases/batches/discard-batch';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { getBatchOptions, listBatches } from '@/lib/use-cases/batches/list-batches';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { reopenRoster } from '@/lib/use-cases/rosters/reopen-roster';
import {
  buildShop,
  buildTeam,
  buildWorld,
  type BuiltTeam,
  type FurnishedLeague,
} from '../../factories/league';
import { queryAsAdmin } from '../../support/database';
import { codeOf } from '../../support/outcomes';

let world: FurnishedLeague;
beforeEach(async () => {
  [world] = await buildWorld();
});

const signedOff = (): Promise<BuiltTeam> =>
  buildTeam(world.league, world.division, { players: [{}], state: 'signed off' });
const hold = (...teams: BuiltTeam[]) =>
  holdBatch(world.admin, {
    season: world.season.slug,
    teamIds: teams.map((team) => team.id),
    shopId: world.shop.id,
    promisedOn: '2027-04-01',
  });
const read = async (code: string) => getBatch(world.admin, { code });
const change = async (code: string, teams: BuiltTeam[], rowVersion?: number) => {
  const { batch } = await read(code);
  return changeBatch(world.admin, {
    batchId: batch.id,
    rowVersion: rowVersion ?? batch.rowVersion,
    teamIds: teams.map((team) => team.id),
    shopId: world.shop.id,
    promisedOn: null,
  });
};
const discard = async (code: string) => discardBatch(world.admin, { batchId: (await read(code)).batch.id });
const listHeld = async (code: string) => (await read(code)).heldTeams.map((team) => team.id).sort();
const countBatchesPerRoster = () =>
  queryAsAdmin<{ n: number }>(
    'select count(*)::int as n from batch_teams where league_id = $1 group by roster_id having count(*) > 1',
    [world.league.id],
  );

describe('a batch that is held', () => {
  it('takes signed-off teams, and names every other one with what it is', async () => {
    const [open, ready, empty] = world.teams;
    await expect(hold(ready, open, empty)).rejects.toMatchObject({
      code: 'conflict',
      message: `${open.name} is open, not signed off; ${empty.name} is open, not signed off. Take them out and try again.`,
    });
    expect((await listBatches(world.admin, { season: world.season.slug })).batches).toEqual([]);
    const { code } = await hold(ready);
    expect(await listHeld(code)).toEqual([ready.id]);
  });

  it('refuses a team that another batch holds, and one of another season or nowhere', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    await expect(hold(team)).rejects.toMatchObject({
      message: `${team.name} is already in batch ${code}. Take it out and try again.`,
    });
    await expect(hold({ ...team, id: crypto.randomUUID() })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('keeps a team out of two batches, however many are made at the same moment', async () => {
    const [shared, second, third] = [await signedOff(), await signedOff(), await signedOff()];
    const outcomes = await Promise.allSettled([
      hold(shared, second),
      hold(shared, third),
      hold(third, shared),
    ]);
    expect(outcomes.map(codeOf).sort()).toEqual(['conflict', 'conflict', 'done']);
    expect(await countBatchesPerRoster()).toEqual([]);
  });

  it('is kept from holding a roster twice by the database too', async () => {
    const team = await signedOff();
    const other = await signedOff();
    await hold(team);
    const { batch } = await read((await hold(other)).code);
    await expect(
      queryAsAdmin('insert into batch_teams (league_id, batch_id, roster_id) values ($1, $2, $3)', [
        world.league.id,
        batch.id,
        team.rosterId,
      ]),
    ).rejects.toMatchObject({ code: '23505' });
  });

  it('is numbered without gaps and without twins when ten are made at the same moment', async () => {
    const teams: BuiltTeam[] = [];
    for (let i = 0; i < 10; i += 1) teams.push(await signedOff());
    const made = await Promise.all(teams.map((team) => hold(team)));
    expect(made.map(({ code }) => code).sort()).toEqual(
      Array.from({ length: 10 }, (_, i) => `B-${String(i + 1).padStart(2, '0')}`),
    );
  });

  it('leaves no gap behind when it is refused', async () => {
    const [open, ready] = world.teams;
    await expect(hold(open)).rejects.toMatchObject({ code: 'conflict' });
    expect(await hold(ready)).toEqual({ code: 'B-01' });
  });

  it('never gets the code of one that was discarded', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    await discard(code);
    expect((await hold(team)).code).not.toBe(code);
  });

  it('keeps a team from being reopened while it holds it', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    const [roster] = await queryAsAdmin<{ revision: number }>('select revision from rosters where id = $1', [
      team.rosterId,
    ]);
    const reopen = () =>
      reopenRoster(world.admin, {
        rosterId: team.rosterId,
        revision: roster?.revision ?? 0,
        reason: 'A family wrote.',
      });
    await expect(reopen()).rejects.toMatchObject({ code: 'conflict' });
    await discard(code);
    await expect(reopen()).resolves.toBeDefined();
  });
});

describe('changing a held batch', () => {
  it('replaces its teams, shop and day in one go, and the history says what changed', async () => {
    const [first, second] = [await signedOff(), await signedOff()];
    const shop = await buildShop(world.league);
    const { code } = await hold(first);
    const { batch } = await read(code);
    await changeBatch(world.admin, {
      batchId: batch.id,
      rowVersion: batch.rowVersion,
      teamIds: [second.id],
      shopId: shop.id,
      promisedOn: null,
    });
    expect((await read(code)).batch).toMatchObject({ shop, promisedOn: null, rowVersion: 2 });
    expect(await listHeld(code)).toEqual([second.id]);
    const events = await queryAsAdmin<{ data: { changes: object } }>(
      `select data from audit_events where subject_id = $1 and type = 'batch changed'`,
      [batch.id],
    );
    expect(events).toHaveLength(1);
    expect(Object.keys(events[0]?.data.changes ?? {}).sort()).toEqual(['promisedOn', 'shop', 'teams']);
    // The team that was taken out can go elsewhere.
    await expect(hold(first)).resolves.toEqual({ code: 'B-02' });
  });

  it('is refused to a page that is behind, and then changes nothing', async () => {
    const [first, second] = [await signedOff(), await signedOff()];
    const { code } = await hold(first);
    await change(code, [first, second]);
    await expect(change(code, [second], 1)).rejects.toMatchObject({ code: 'conflict' });
    expect(await listHeld(code)).toEqual([first.id, second.id].sort());
  });

  it('keeps a team out of two batches when two are changed to the same one at the same moment', async () => {
    const [one, two, wanted] = [await signedOff(), await signedOff(), await signedOff()];
    const [a, b] = [await hold(one), await hold(two)];
    const outcomes = await Promise.allSettled([change(a.code, [one, wanted]), change(b.code, [two, wanted])]);
    expect(outcomes.map(codeOf).sort()).toEqual(['conflict', 'done']);
    expect(await countBatchesPerRoster()).toEqual([]);
  });

  it('answers with a sentence, not with a fault, when two batches reach for each other’s teams', async () => {
    for (let round = 0; round < 10; round += 1) {
      const [one, two] = [await signedOff(), await signedOff()];
      const [a, b] = [await hold(one), await hold(two)];
      const outcomes = await Promise.allSettled([change(a.code, [one, two]), change(b.code, [two, one])]);
      expect(outcomes.map(codeOf)).toEqual(['conflict', 'conflict']);
    }
  });

  it('answers with a sentence, not with a fault, when its teams are released while others reach for them', async () => {
    for (let round = 0; round < 10; round += 1) {
      const teams = [await signedOff(), await signedOff(), await signedOff()];
      const { batch } = await read((await hold(...teams)).code);
      const outcomes = await Promise.allSettled([
        releaseBatch(world.admin, { batchId: batch.id }),
        hold(...teams.toReversed()),
      ]);
      expect(outcomes.map(codeOf)).toEqual(['done', 'conflict']);
    }
  });

  it('is refused once it is released', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    await releaseBatch(world.admin, { batchId: (await read(code)).batch.id });
    await expect(change(code, [await signedOff()])).rejects.toMatchObject({ code: 'locked' });
    await expect(discard(code)).rejects.toMatchObject({ code: 'locked' });
  });
});

describe('discarding a held batch', () => {
  it('sets its teams free and is kept in the history', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    const { batch } = await read(code);
    const offered = async () =>
      (await getBatchOptions(world.admin, { season: world.season.slug, batchId: null })).teams.map(
        ({ id }) => id,
      );
    expect(await offered()).not.toContain(team.id);
    await discard(code);
    expect(await offered()).toContain(team.id);
    await expect(read(code)).rejects.toMatchObject({ code: 'not-found' });
    expect(
      await queryAsAdmin(`select type from audit_events where subject_id = $1 order by at, id`, [batch.id]),
    ).toContainEqual({ type: 'batch discarded' });
  });

  it('or releasing it: of the two at the same moment, one happens whole', async () => {
    const team = await signedOff();
    const { code } = await hold(team);
    const { batch } = await read(code);
    const outcomes = await Promise.allSettled([
      discardBatch(world.admin, { batchId: batch.id }),
      releaseBatch(world.admin, { batchId: batch.id }),
    ]);
    expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
    const [roster] = await queryAsAdmin<{ state: string }>('select state from rosters where id = $1', [
      team.rosterId,
    ]);
    const left = await queryAsAdmin('select 1 from batches where id = $1', [batch.id]);
    expect([roster?.state, left.length]).toEqual(
      outcomes[0].status === 'fulfilled' ? ['signed off', 0] : ['frozen', 1],
    );
  });
});
