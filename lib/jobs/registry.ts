import type { Task } from 'graphile-worker';
import type { Job } from '@/db/queries/jobs';
import { handleBuildBundle } from './handlers/build-bundle';
import { handleFreezeRosters } from './handlers/freeze-rosters';
import { handleSendEmail } from './handlers/send-email';
import { handleTidy } from './handlers/tidy';

/**
 * Every task a worker can do, by name. A name that the web process may queue also stands in the type Job
 * (db/queries/jobs.ts) and in the database's own list (enqueue_job). Each handler parses its payload, and may be run
 * twice with the same one.
 */
export const taskList = {
  'send-email': handleSendEmail,
  'build-bundle': handleBuildBundle,
  'freeze-rosters': handleFreezeRosters,
  tidy: handleTidy,
} satisfies Record<Job['task'] | 'tidy', Task>;

/** What the worker starts by itself, in crontab form (UTC). One of them does it, however many workers run. */
export const crontab = '17 * * * * tidy ?max=1';
