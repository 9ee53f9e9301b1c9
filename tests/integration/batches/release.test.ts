import { beforeEach, describe, expect, it } from 'vitest';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { listShopBatches } from '@/lib/use-cases/batches/list-shop-batches';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { sha256 } from '@/lib/platform/ids';
import { writeCanonicalJson } from '@/lib/domain/batch/canonical-json';
import { putInForce } from '@/lib/use-cases/rule-sets/put-in-force';
import { startRuleSet } from '@/lib/use-cases/rule-sets/start-rule-set';
import { saveDraft } from '@/lib/use-cases/rule-sets/save-draft';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import { buildMember, buildTeam, buildWorld, type FurnishedLeague } from '../../factories/league';
import { listLetters } from '../../factories/people';
import { makeAdd } from '../../factories/rosters';
import { queryAsAdmin } from '../../support/database';
import { codeOf } from '../../support/outcomes';

let world: FurnishedLeague;
let code: string;
let batchId: string;
beforeEach(async () => {
  [world] = await buildWorld();
  const second = await buildTeam(world.league, world.division, { players: [{}], state: 'signed off' });
  ({ code } = await holdBatch(world.admin, {
    season: world.season.slug,
    teamIds: [world.teams[1].id, second.id],
    shopId: world.shop.id,
    promisedOn: '2027-04-01',
  }));
  batchId = (await getBatch(world.admin, { code })).batch.id;
});

const release = (ctx = world.admin) => releaseBatch(ctx, { batchId });
const statesOfRosters = async () =>
  (
    await queryAsAdmin<{ state: string }>(
      'select r.state from rosters r join batch_teams b on b.roster_id = r.id where b.batch_id = $1',
      [batchId],
    )
  ).map(({ state }) => state);
const jobs = () =>
  queryAsAdmin<{ key: string; task: string }>(
    'select key, task_identifier as task from graphile_worker.jobs where key = $1',
    [`bundle:${batchId}`],
  );
const letters = async () =>
  (await listLetters(world.members.decorator.person.email)).filter(
    ({ template }) => template === 'batch-released',
  );
/** Everything a release writes, to see that nothing of it is there. */
const traces = async () => ({
  rosters: await statesOfRosters(),
  jobs: await jobs(),
  letters: await letters(),
  bundles: await queryAsAdmin('select 1 from bundles where batch_id = $1', [batchId]),
  events: await queryAsAdmin('select 1 from batch_events where batch_id = $1', [batchId]),
  batch: await queryAsAdmin('select state, snapshot from batches where id = $1', [batchId]),
  history: await queryAsAdmin(
    `select type from audit_events where league_id = $1 and type in ('batch released', 'roster frozen')`,
    [world.league.id],
  ),
});

describe('the release of a batch', () => {
  it('freezes its rosters, queues its bundle once and writes to everyone who works for the shop now', async () => {
    const colleague = await buildMember(world.league, 'decorator', { shopId: world.shop.id });
    await release();
    expect(await statesOfRosters()).toEqual(['frozen', 'frozen']);
    expect(await jobs()).toEqual([{ key: `bundle:${batchId}`, task: 'build-bundle' }]);
    expect(await letters()).toMatchObject([
      {
        params: {
          batch: code,
          teams: '2',
          link: `http://localhost:3000/shop/${world.league.slug}/${code.toLowerCase()}`,
        },
      },
    ]);
    expect(await listLetters(colleague.person.email)).toHaveLength(1);
    expect(await listLetters(world.members.manager.person.email)).toEqual([]);
    expect((await traces()).history.map(({ type }) => String(type)).sort()).toEqual([
      'batch released',
      'roster frozen',
      'roster frozen',
    ]);
  });

  it('puts exactly the players of its rosters into a snapshot, under a hash that can be checked', async () => {
    await release();
    const [row] = await queryAsAdmin<{ snapshot: never; sha: string }>(
      'select snapshot, snapshot_sha256 as sha from batches where id = $1',
      [batchId],
    );
    expect(sha256(writeCanonicalJson(row?.snapshot))).toBe(row?.sha);
    const { contents, snapshotSha256 } = await getBatch(world.decorator, { code });
    expect(snapshotSha256).toBe(row?.sha);
    expect(contents).toMatchObject({ players: 3, teams: [{ players: 2 }, { players: 1 }] });
  });

  it('happens once when it is asked for three times at the same moment', async () => {
    const outcomes = await Promise.allSettled([release(), release(), release()]);
    expect(outcomes.map(codeOf).sort()).toEqual(['done', 'locked', 'locked']);
    expect(await letters()).toHaveLength(1);
    expect((await traces()).events).toHaveLength(1);
  });

  it('leaves nothing at all behind when it breaks off, wherever that is', async () => {
    const before = await traces();
    let fails = 0;
    for (let allowed = 0; ; allowed += 1) {
      let made = 0;
      const broken = {
        ...world.admin,
        newId: () => {
          made += 1;
          if (made > allowed) throw new Error('the power failed');
          return world.admin.newId();
        },
      };
      const outcome = await release(broken).then(
        () => 'done',
        (error: unknown) => (error as Error).message,
      );
      if (outcome === 'done') break;
      fails += 1;
      expect(outcome).toBe('the power failed');
      expect(await traces()).toEqual(before);
    }
    // An id each for the step, the bundle, the events of the history and the letter.
    expect(fails).toBeGreaterThanOrEqual(5);
    expect(await statesOfRosters()).toEqual(['frozen', 'frozen']);
  });

  it('is refused when the rules in force have changed so that a roster no longer passes', async () => {
    const ruleSet = {
      ...world.ruleSet.rules,
      labels: { ...world.ruleSet.rules.labels, allowed: '50-60' },
    };
    const { rowVersion } = await saveDraft(world.admin, {
      ruleSetId: world.ruleSet.id,
      rowVersion: null,
      ruleSet,
    });
    await putInForce(world.admin, { ruleSetId: world.ruleSet.id, rowVersion });
    const before = await traces();
    await expect(release()).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('under the rules now in force') as unknown,
    });
    expect(await traces()).toEqual(before);
  });

  it('is refused while a division has no number rules in force, since nothing could be checked', async () => {
    const { ruleSetId } = await startRuleSet(world.admin, {
      name: 'Only a draft',
      sport: 'basketball',
      presetId: null,
    });
    await queryAsAdmin('update divisions set rule_set_id = $1 where id = $2', [ruleSetId, world.division.id]);
    const before = await traces();
    await expect(release()).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('has no number rules in force') as unknown,
    });
    expect(await traces()).toEqual(before);
  });

  it('is for league admins alone', async () => {
    for (const ctx of [world.manager, world.referee, world.decorator])
      await expect(release(ctx)).rejects.toMatchObject({ code: 'forbidden' });
    expect(await statesOfRosters()).toEqual(['signed off', 'signed off']);
  });
});

describe('what was released', () => {
  const write = (set: string) => queryAsAdmin(`update batches set ${set} where id = $1`, [batchId]);

  it('never changes, whatever is written past the program', async () => {
    await release();
    const read = () => queryAsAdmin('select * from batches where id = $1', [batchId]);
    const before = await read();
    for (const set of [
      `snapshot = jsonb_set(snapshot, '{teams,0,name}', '"Others"')`,
      `snapshot = null`,
      `snapshot = null, state = 'held', released_at = null`,
      `snapshot_sha256 = 'ff'`,
      `snapshot_sha256 = null`,
      `state = 'held'`,
      `released_at = null`,
      `code = 'B-99'`,
    ]) {
      const outcome = await write(set).then(
        () => 'written',
        (error: unknown) => String((error as { code?: string }).code),
      );
      expect([set, outcome]).toEqual([set, '23514']);
    }
    await expect(queryAsAdmin('delete from batches where id = $1', [batchId])).rejects.toThrow(
      'never change',
    );
    expect(await read()).toEqual(before);
  });

  it('keeps its rosters from being edited by the program and by SQL', async () => {
    const { rosterId } = world.teams[1];
    await release();
    await expect(
      saveRosterEdits(world.admin, { rosterId, baseRevision: 1, edits: [makeAdd({ number: '77' }, null)] }),
    ).rejects.toMatchObject({ code: 'locked' });
    for (const text of [
      `update players set number = '77' where roster_id = $1`,
      `delete from players where roster_id = $1`,
    ])
      await expect(queryAsAdmin(text, [rosterId])).rejects.toMatchObject({ constraint: 'roster_is_sealed' });
  });

  it('is seen by its shop from that moment, and not before', async () => {
    const decorator = { ...world.decorator, userId: world.members.decorator.person.id };
    await expect(getBatch(world.decorator, { code })).rejects.toMatchObject({ code: 'not-found' });
    expect(await listShopBatches(decorator)).toEqual([]);
    await release();
    await expect(getBatch(world.decorator, { code })).resolves.toMatchObject({
      batch: { state: 'released' },
      may: { change: false, mark: true, receive: false },
    });
    expect(await listShopBatches(decorator)).toMatchObject([{ code, teams: 2, bundleState: 'queued' }]);
  });
});
