import type { EventEmitter } from 'node:events';
import pg from 'pg';

/** How long a job must have been locked before a sweep may call its worker dead, in seconds. */
const graceSeconds = 5;

const sweepSql = `
  with locked as (
    select distinct locked_by from graphile_worker._private_jobs
    where locked_by is not null and locked_at < now() - make_interval(secs => $1)
  ), dead as (
    select locked_by from locked where not exists (
      select 1 from pg_locks k
      where k.locktype = 'advisory' and k.objsubid = 1
        and k.database = (select oid from pg_database where datname = current_database())
        and ((k.classid::bigint << 32) | k.objid::bigint) = hashtextextended(locked.locked_by, 0)
    )
  )
  select pools, graphile_worker.force_unlock_workers(pools)
  from (select array_agg(locked_by) as pools from dead) d where pools is not null`;

export type Liveness = {
  /** Resolves when every pool made so far holds its lock and the first sweep is done. */
  ready: () => Promise<void>;
  /** Lets go of the locks; call it when no job runs any more. */
  stop: () => Promise<void>;
};

/**
 * Lets workers notice each other's death. A killed worker leaves its jobs locked for four hours; here each worker pool
 * holds a session advisory lock on its own id, which the server lets go the moment the process is gone, and every
 * worker sweeps for jobs whose pool holds none. A job locked for less than five seconds is left alone: its pool may not
 * have been given its lock yet. When this connection itself is lost, others will take our jobs, so `onLost` must end
 * the process at once. `sweepMs` is the pause between sweeps.
 */
export async function watchLiveness(
  ownerUrl: string,
  events: EventEmitter,
  told: { onLost: (error?: Error) => void; onReleased: (pools: string[]) => void },
  sweepMs = 2000,
): Promise<Liveness> {
  const client = new pg.Client({
    connectionString: ownerUrl,
    keepAlive: true,
    query_timeout: 15_000,
    application_name: 'raglan worker liveness',
  });
  let over = false;
  let timer: NodeJS.Timeout | undefined;
  const lose = (error?: Error) => {
    if (!over) told.onLost(error);
  };
  client.on('error', lose);
  client.on('end', () => lose());
  await client.connect();

  const claims: Promise<unknown>[] = [];
  events.on('pool:create', ({ workerPool }: { workerPool: { id: string } }) => {
    claims.push(
      client.query('select pg_advisory_lock(hashtextextended($1, 0))', [workerPool.id]).catch(lose),
    );
  });

  const sweep = async () => {
    const { rows } = await client.query<{ pools: string[] }>(sweepSql, [graceSeconds]);
    for (const row of rows) told.onReleased(row.pools);
  };
  const sweepForEver = () => {
    timer = setTimeout(() => void sweep().then(sweepForEver, lose), sweepMs);
  };
  return {
    ready: async () => {
      await Promise.all(claims);
      await sweep();
      sweepForEver();
    },
    stop: async () => {
      over = true;
      clearTimeout(timer);
      await client.end();
    },
  };
}
