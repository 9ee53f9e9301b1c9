import { EventEmitter } from 'node:events';
import { beforeEach, describe, expect, test } from 'vitest';
import { watchLiveness } from '@/db/liveness';
import { getTestUrls, queryAsAdmin } from '@/tests/support/database';

/** Queues a job and locks it as if a worker pool had taken it so many seconds ago. */
async function lockJob(pool: string, secondsAgo: number): Promise<string> {
  const [job] = await queryAsAdmin<{ id: string }>(
    `select id from graphile_worker.add_job('tidy', '{}'::json)`,
  );
  await queryAsAdmin(
    `update graphile_worker._private_jobs
     set locked_by = $1, locked_at = now() - make_interval(secs => $2) where id = $3`,
    [pool, secondsAgo, job?.id],
  );
  return job?.id ?? '';
}

const listLocked = async (): Promise<string[]> =>
  (
    await queryAsAdmin<{ locked_by: string }>(
      'select locked_by from graphile_worker._private_jobs where locked_by is not null order by 1',
    )
  ).map((row) => row.locked_by);

describe('watching over workers', () => {
  beforeEach(async () => {
    await queryAsAdmin('delete from graphile_worker._private_jobs');
  });

  test('frees the jobs of a pool that holds no lock, and says which', async () => {
    await lockJob('pool-dead', 60);
    const released: string[] = [];
    const watch = await watchLiveness(getTestUrls().ownerUrl, new EventEmitter(), {
      onLost: () => expect.unreachable(),
      onReleased: (pools) => released.push(...pools),
    });
    await watch.ready();
    await watch.stop();
    expect(released).toEqual(['pool-dead']);
    expect(await listLocked()).toEqual([]);
  });

  test('leaves the jobs of a living pool alone, for as long as it lives', async () => {
    const theirs = new EventEmitter();
    const living = await watchLiveness(getTestUrls().ownerUrl, theirs, {
      onLost: () => expect.unreachable(),
      onReleased: () => {},
    });
    theirs.emit('pool:create', { workerPool: { id: 'pool-alive' } });
    await living.ready();
    await lockJob('pool-alive', 60);

    const look = async () => {
      const watch = await watchLiveness(getTestUrls().ownerUrl, new EventEmitter(), {
        onLost: () => expect.unreachable(),
        onReleased: () => {},
      });
      await watch.ready();
      await watch.stop();
    };
    await look();
    expect(await listLocked()).toEqual(['pool-alive']);

    await living.stop();
    await look();
    expect(await listLocked()).toEqual([]);
  });

  test('does not take a job from a pool that took it a moment ago and may not hold its lock yet', async () => {
    await lockJob('pool-new', 1);
    const watch = await watchLiveness(getTestUrls().ownerUrl, new EventEmitter(), {
      onLost: () => expect.unreachable(),
      onReleased: () => expect.unreachable(),
    });
    await watch.ready();
    await watch.stop();
    expect(await listLocked()).toEqual(['pool-new']);
  });

  test('tells its process when its own connection is cut, since others will now take its jobs', async () => {
    const lost = new Promise<void>((resolve) => {
      void watchLiveness(getTestUrls().ownerUrl, new EventEmitter(), {
        onLost: () => resolve(),
        onReleased: () => {},
      }).then(() =>
        queryAsAdmin(
          `select pg_terminate_backend(pid) from pg_stat_activity
           where application_name = 'raglan worker liveness' and datname = current_database()`,
        ),
      );
    });
    await lost;
  });
});
