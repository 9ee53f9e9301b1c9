import type { TaskList } from 'graphile-worker';
import { handleBuildBundle } from './handlers/build-bundle';
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
  tidy: handleTidy,
} satisfies TaskList;

/** What the worker starts by itself, in crontab form (UTC). One of them does it, however many workers run. */
export const crontab = '17 * * * * tidy ?max=1';
