import { spawn, type ChildProcess } from 'node:child_process';
import { afterEach, describe, expect, it } from 'vitest';
import { readStoredFile } from '@/db/queries/stored-files';
import { handleBuildBundle } from '@/lib/jobs/handlers/build-bundle';
import { buildBundle, failBundle } from '@/lib/use-cases/batches/build-bundle';
import { getBatch, getBundleState } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { openBundleFile } from '@/lib/use-cases/batches/open-bundle-file';
import { rebuildBundle } from '@/lib/use-cases/batches/rebuild-bundle';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { sha256 } from '@/lib/platform/ids';
import { buildMember, buildShop, buildTeam, buildWorld, type FurnishedLeague } from '../../factories/league';
import { makeRequest } from '../../factories/people';
import { getTestUrls, queryAsAdmin } from '../../support/database';

type Released = { world: FurnishedLeague; code: string; batchId: string };

/** A league with a batch that was just released, of the signed-off team and `more` further players. */
async function releaseOne(more = 0): Promise<Released> {
  const [world] = await buildWorld();
  const big =
    more > 0
      ? [
          await buildTeam(world.league, world.division, {
            players: Array.from({ length: more }, () => ({})),
            state: 'signed off',
          }),
        ]
      : [];
  const { code } = await holdBatch(world.admin, {
    season: world.season.slug,
    teamIds: [world.teams[1].id, ...big.map((team) => team.id)],
    shopId: world.shop.id,
    promisedOn: '2027-04-01',
  });
  const { batch } = await getBatch(world.admin, { code });
  await releaseBatch(world.admin, { batchId: batch.id });
  return { world, code, batchId: batch.id };
}

const build = ({ world, batchId }: Released, ctx = makeRequest()) =>
  buildBundle(ctx, { leagueId: world.league.id, batchId });

async function readZip({ world, code }: Released): Promise<Buffer> {
  const file = await openBundleFile(world.decorator, { code, path: null, isFirstRange: false });
  const chunks: Uint8Array[] = [];
  for await (const chunk of file.read({ start: 0, end: file.bytes - 1 })) chunks.push(chunk);
  return Buffer.concat(chunks);
}

const count = async (text: string): Promise<number> =>
  Number((await queryAsAdmin<{ n: string }>(`select count(*) as n from ${text}`))[0]?.n);

/** Files that no bundle points at any more: none may be left behind. */
const countOrphans = ({ world }: Released) =>
  count(
    `stored_files f where f.league_id = '${world.league.id}' and not exists (select 1 from bundle_parts p where p.file_id = f.id) and not exists (select 1 from bundles b where b.zip_file_id = f.id)`,
  );

describe('the bundle of a released batch', () => {
  it('is ready only when every file and the ZIP are stored, and the ZIP is the sum of its parts', async () => {
    const released = await releaseOne();
    await expect(readZip(released)).rejects.toThrow('not ready yet');
    expect(await build(released)).toBe('built');
    const detail = await getBatch(released.world.decorator, { code: released.code });
    expect(detail.bundle).toMatchObject({ state: 'ready' });
    const zip = await readZip(released);
    expect(sha256(zip)).toBe(detail.bundle?.sha256);
    for (const part of detail.parts) expect(zip.includes(Buffer.from(part.path))).toBe(true);
  });

  it('comes out with the same bytes when it is made a second time from the same batch', async () => {
    const released = await releaseOne();
    await build(released);
    const first = await readZip(released);
    await queryAsAdmin('delete from bundle_parts');
    await queryAsAdmin(`update bundles set state = 'queued', zip_file_id = null where batch_id = $1`, [
      released.batchId,
    ]);
    await build(released);
    expect(sha256(await readZip(released))).toBe(sha256(first));
  });

  it('goes on where it was broken off: what was finished is kept, and nothing half is ever shown', async () => {
    const released = await releaseOne();
    let ids = 0;
    const ctx = makeRequest();
    const broken = {
      ...ctx,
      newId: () => {
        ids += 1;
        if (ids > 3) throw new Error('the power failed');
        return ctx.newId();
      },
    };
    await expect(build(released, broken)).rejects.toThrow('the power failed');
    await expect(readZip(released)).rejects.toThrow('not ready yet');
    const kept = await count(
      `bundle_parts p join bundles b on b.id = p.bundle_id where b.batch_id = '${released.batchId}'`,
    );
    expect(kept).toBe(3);
    expect(await build(released)).toBe('built');
    expect((await getBatch(released.world.admin, { code: released.code })).bundle).toMatchObject({
      state: 'ready',
    });
    expect(await countOrphans(released)).toBe(0);
  });

  it('is made once when two workers build it at the same moment, and leaves no file behind', async () => {
    const released = await releaseOne();
    const outcomes = await Promise.all([build(released), build(released)]);
    expect(outcomes.sort()).toEqual(['already there', 'built']);
    expect(await countOrphans(released)).toBe(0);
  });

  it('does not change when its job is delivered again', async () => {
    const released = await releaseOne();
    await build(released);
    const before = await queryAsAdmin('select * from bundles where batch_id = $1', [released.batchId]);
    expect(await build(released)).toBe('already there');
    expect(await queryAsAdmin('select * from bundles where batch_id = $1', [released.batchId])).toEqual(
      before,
    );
  });

  it('can be read in pieces that join to the whole', async () => {
    const released = await releaseOne(99);
    await build(released);
    const whole = await readZip(released);
    const file = await openBundleFile(released.world.decorator, {
      code: released.code,
      path: null,
      isFirstRange: false,
    });
    const middle: Uint8Array[] = [];
    for await (const chunk of file.read({ start: 1000, end: 51_000 })) middle.push(chunk);
    expect(Buffer.concat(middle).equals(whole.subarray(1000, 51_001))).toBe(true);
    // Around the edges of what is stored together, and at both ends of the file.
    const edge = 256 * 1024;
    expect(whole.length).toBeGreaterThan(edge);
    const cuts = [0, 1, 999, edge - 1, edge, edge + 1, 2 * edge - 1, 2 * edge, whole.length - 1].filter(
      (cut) => cut < whole.length,
    );
    for (const start of cuts) {
      for (const end of cuts.filter((cut) => cut >= start)) {
        const pieces: Uint8Array[] = [];
        for await (const chunk of file.read({ start, end })) pieces.push(chunk);
        expect([start, end, Buffer.concat(pieces).equals(whole.subarray(start, end + 1))]).toEqual([
          start,
          end,
          true,
        ]);
      }
    }
    const [stored] = await queryAsAdmin<{ id: string }>(
      'select zip_file_id as id from bundles where batch_id = $1',
      [released.batchId],
    );
    const last: Uint8Array[] = [];
    for await (const chunk of readStoredFile(released.world.league.id, stored?.id ?? '', {
      start: whole.length - 1,
      end: whole.length - 1,
    }))
      last.push(chunk);
    expect(Buffer.concat(last)).toEqual(whole.subarray(-1));
  });
});

describe('a bundle that gave up', () => {
  const fail = (released: Released) =>
    failBundle(makeRequest(), { leagueId: released.world.league.id, batchId: released.batchId });
  const bundleOf = async ({ world, code }: Released) => (await getBatch(world.admin, { code })).bundle;

  it('says so with a reference, and is queued again by its shop or the league, once', async () => {
    const released = await releaseOne();
    const { world, batchId } = released;
    await queryAsAdmin(`select graphile_worker.remove_job($1)`, [`bundle:${batchId}`]);
    await fail(released);
    expect(await bundleOf(released)).toMatchObject({
      state: 'failed',
      failure: expect.stringMatching(
        /^The bundle could not be built\. Try again; .* quote [0-9a-f]{8}\.$/,
      ) as unknown,
    });
    await expect(readZip(released)).rejects.toThrow('not ready yet');
    expect(await rebuildBundle(world.decorator, { batchId })).toEqual({ queued: true });
    expect(await bundleOf(released)).toMatchObject({ state: 'queued', failure: null, done: 0 });
    const queued = await queryAsAdmin('select 1 from graphile_worker.jobs where key = $1', [
      `bundle:${batchId}`,
    ]);
    expect(queued).toHaveLength(1);
    await expect(rebuildBundle(world.admin, { batchId })).rejects.toMatchObject({ code: 'conflict' });
    expect(await build(released)).toBe('built');
  });

  it('keeps what it had finished, and comes out as if nothing had happened', async () => {
    const released = await releaseOne();
    const ctx = makeRequest();
    let ids = 0;
    const broken = {
      ...ctx,
      newId: () => {
        ids += 1;
        if (ids > 2) throw new Error('the power failed');
        return ctx.newId();
      },
    };
    await expect(build(released, broken)).rejects.toThrow('the power failed');
    await fail(released);
    await rebuildBundle(released.world.admin, { batchId: released.batchId });
    await build(released);
    const resumed = sha256(await readZip(released));
    await queryAsAdmin('delete from bundle_parts');
    await queryAsAdmin(`update bundles set state = 'queued', zip_file_id = null where batch_id = $1`, [
      released.batchId,
    ]);
    await build(released);
    expect(sha256(await readZip(released))).toBe(resumed);
  });

  it('is not what a ready bundle becomes, however late a try gives up', async () => {
    const released = await releaseOne();
    await build(released);
    await fail(released);
    expect(await bundleOf(released)).toMatchObject({ state: 'ready', failure: null });
    await expect(rebuildBundle(released.world.admin, { batchId: released.batchId })).rejects.toMatchObject({
      code: 'conflict',
    });
  });
});

describe('a worker’s last try', () => {
  it('is the only one that marks the bundle failed; the tries before leave it to the next', async () => {
    const { world, batchId, code } = await releaseOne();
    // A snapshot that no document can be made of, written past every guard: the build has to throw.
    await queryAsAdmin('alter table batches disable trigger user');
    await queryAsAdmin(`update batches set snapshot = '{}' where id = $1`, [batchId]);
    await queryAsAdmin('alter table batches enable trigger user');
    const stateOf = async () =>
      (await queryAsAdmin<{ state: string }>('select state from bundles where batch_id = $1', [batchId]))[0]
        ?.state;
    const run = (attempts: number) =>
      handleBuildBundle({ leagueId: world.league.id, batchId }, {
        job: { attempts, max_attempts: 8 },
      } as never);
    await expect(run(7)).rejects.toThrow();
    expect([code, await stateOf()]).not.toEqual([code, 'failed']);
    await expect(run(8)).rejects.toThrow();
    expect(await stateOf()).toBe('failed');
  });
});

describe('who gets a bundle', () => {
  it('is the league and the shop it was released to; to every other shop, and by any path, it is not there', async () => {
    const released = await releaseOne();
    await build(released);
    const { world, code, batchId } = released;
    const shop = await buildShop(world.league);
    const other = await buildMember(world.league, 'decorator', { shopId: shop.id });
    const open = (ctx: typeof world.decorator, path: string | null) =>
      openBundleFile(ctx, { code, path, isFirstRange: true });
    const parts = (await getBatch(world.decorator, { code })).parts;
    for (const ctx of [other.ctx, world.manager, world.referee]) {
      for (const path of [null, ...parts.map((part) => part.path)])
        await expect(open(ctx, path)).rejects.toMatchObject({ code: 'not-found' });
      await expect(getBundleState(ctx, { code })).rejects.toMatchObject({ code: 'not-found' });
      await expect(rebuildBundle(ctx, { batchId })).rejects.toMatchObject({ code: 'not-found' });
    }
    for (const path of ['../secrets', '/etc/passwd', '', 'manifest.json/'])
      await expect(open(world.decorator, path)).rejects.toMatchObject({ code: 'not-found' });
    await expect(open(world.admin, null)).resolves.toMatchObject({ mediaType: 'application/zip' });
  });

  it('is noted once for each download, not for each further range', async () => {
    const released = await releaseOne();
    await build(released);
    const { world, code, batchId } = released;
    await openBundleFile(world.decorator, { code, path: null, isFirstRange: true });
    await openBundleFile(world.decorator, { code, path: null, isFirstRange: false });
    expect(await count(`audit_events where subject_id = '${batchId}' and type = 'bundle downloaded'`)).toBe(
      1,
    );
  });

  it('is noted too when somebody asks for a piece alone, with no download before it', async () => {
    const released = await releaseOne();
    await build(released);
    const { world, code, batchId } = released;
    await openBundleFile(world.decorator, { code, path: null, isFirstRange: true });
    await openBundleFile(world.admin, { code, path: null, isFirstRange: false });
    await openBundleFile(world.decorator, { code, path: 'manifest.json', isFirstRange: false });
    expect(await count(`audit_events where subject_id = '${batchId}' and type = 'bundle downloaded'`)).toBe(
      3,
    );
  });

  it('hides from a shop that a batch is being held for it, however its bundle is asked for', async () => {
    const [world] = await buildWorld();
    const { code } = await holdBatch(world.admin, {
      season: world.season.slug,
      teamIds: [world.teams[1].id],
      shopId: world.shop.id,
      promisedOn: null,
    });
    const { batch } = await getBatch(world.admin, { code });
    const ask = (batchId: string) =>
      rebuildBundle(world.decorator, { batchId }).catch((error: unknown) => (error as Error).message);
    expect(await ask(batch.id)).toEqual(await ask(crypto.randomUUID()));
    await expect(getBundleState(world.decorator, { code })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('a worker process', () => {
  const children: ChildProcess[] = [];
  afterEach(() => {
    for (const child of children.splice(0)) child.kill('SIGKILL');
  });

  const startWorker = (): ChildProcess => {
    const { appUrl, ownerUrl } = getTestUrls();
    const child = spawn(
      process.execPath,
      ['--conditions=react-server', '--import', 'tsx', 'scripts/worker.ts'],
      {
        env: {
          ...process.env,
          RAGLAN_DATABASE_URL: appUrl,
          RAGLAN_OWNER_URL: ownerUrl,
          RAGLAN_SECRET: 'a secret for tests only',
          LOG_LEVEL: 'warn',
          NODE_ENV: 'test',
        },
        stdio: 'ignore',
      },
    );
    children.push(child);
    return child;
  };

  it(
    'that is killed in the middle of a bundle leaves nothing half, and the next worker finishes it',
    { timeout: 120_000 },
    async () => {
      const released = await releaseOne(99);
      const stateOf = async () =>
        (
          await queryAsAdmin<{ state: string; done: number }>(
            'select state, done from bundles where batch_id = $1',
            [released.batchId],
          )
        )[0];
      const first = startWorker();
      await expect
        .poll(async () => (await stateOf())?.done ?? 0, { timeout: 60_000, interval: 50 })
        .toBeGreaterThan(0);
      first.kill('SIGKILL');
      expect((await stateOf())?.state).toBe('building');
      await expect(readZip(released)).rejects.toThrow('not ready yet');
      startWorker();
      await expect
        .poll(async () => (await stateOf())?.state, { timeout: 90_000, interval: 250 })
        .toBe('ready');
      expect(await countOrphans(released)).toBe(0);
    },
  );
});
