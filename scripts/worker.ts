// The worker process: takes jobs from PostgreSQL and runs them. Any number of workers may share one database.
import { EventEmitter } from 'node:events';
import { Logger, run } from 'graphile-worker';
import pg from 'pg';
import { watchLiveness } from '@/db/liveness';
import { crontab, taskList } from '@/lib/jobs/registry';
import { getEnv } from '@/lib/platform/env';
import { getLog } from '@/lib/platform/log';

/** How long a job under way may take after we are told to stop; what is not done by then another worker does again. */
const stopLimitMs = 12_000;
const concurrency = 2;

const log = getLog();
const { RAGLAN_OWNER_URL: ownerUrl } = getEnv();
if (!ownerUrl) {
  log.fatal('RAGLAN_OWNER_URL is not set: the worker takes its jobs as the owner of the queue');
  process.exit(78);
}

const pool = new pg.Pool({
  connectionString: ownerUrl,
  max: concurrency + 3,
  application_name: 'raglan worker',
});
// A connection that drops must not end the process: the queue reconnects by itself.
const warn = (error: Error) => log.warn({ err: error }, 'queue connection lost');
pool.on('error', warn);
pool.on('connect', (client) => client.on('error', warn));

const events = new EventEmitter();
const liveness = await watchLiveness(ownerUrl, events, {
  onLost: (error) => {
    log.fatal({ err: error }, 'liveness connection lost: others may take our jobs now, so this worker ends');
    process.exit(70);
  },
  onReleased: (pools) => log.warn({ pools }, 'jobs of a dead worker are free again'),
});

const runner = await run({
  pgPool: pool,
  concurrency,
  pollInterval: 1000,
  noHandleSignals: true,
  events,
  taskList,
  crontab,
  // Batched completion drops what finishes during a shutdown (seen in 0.17.3): the job would run again later.
  preset: { worker: { completeJobBatchDelay: 0, failJobBatchDelay: 0 } },
  logger: new Logger(() => (level, message) => {
    log[level === 'warning' ? 'warn' : level === 'error' ? 'error' : 'debug'](message);
  }),
});
await liveness.ready();
log.info({ tasks: Object.keys(taskList) }, 'worker ready');

let stopping = false;
for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.on(signal, () => {
    if (stopping) return;
    stopping = true;
    log.info({ signal }, 'worker stops after the jobs under way');
    setTimeout(() => {
      log.warn('a job did not end in time; another worker will do it again');
      process.exit(0);
    }, stopLimitMs).unref();
    void runner.stop();
  });
}

await runner.promise;
await liveness.stop();
await pool.end();
process.exit(0);
