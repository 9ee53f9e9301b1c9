import { spawn, type ChildProcess } from 'node:child_process';
import { afterEach, describe, expect, it } from 'vitest';
import { readStoredFile } from '@/db/queries/stored-files';
import { buildBundle } from '@/lib/use-cases/batches/build-bundle';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { openBundleFile } from '@/lib/use-cases/batches/open-bundle-file';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { sha256 } from '@/lib/platform/ids';
import { buildTeam, buildWorld, type FurnishedLeague } from '../../factories/league';
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
    const released = await releaseOne();
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
