import { listMissingMigrations, pingDatabase, readQueueStatus } from '@/db/queries/health';
import { getLog } from '@/lib/platform/log';

/** A job due for longer than this means that no worker takes any. */
const longestWaitSeconds = 300;

type Part = { ok: boolean; says: string };
export type Readiness = { ready: boolean; parts: { database: Part; migrations: Part; queue: Part } };

/**
 * Whether this process can serve: the database answers, it has had every migration of this code, and jobs are being
 * taken. Each part says what is wrong in words without addresses or names; the log has the rest.
 */
export async function checkReady(): Promise<Readiness> {
  const database = await check('database', async () => {
    await pingDatabase();
    return { ok: true, says: 'answers' };
  });
  const unknown: Part = { ok: false, says: 'not known while the database does not answer' };
  const [migrations, queue] = database.ok
    ? await Promise.all([check('migrations', checkMigrations), check('queue', checkQueue)])
    : [unknown, unknown];
  const parts = { database, migrations, queue };
  return { ready: Object.values(parts).every((part) => part.ok), parts };
}

async function checkMigrations(): Promise<Part> {
  const missing = await listMissingMigrations();
  return missing.length === 0
    ? { ok: true, says: 'all applied' }
    : { ok: false, says: `${missing.length} not applied, the first is ${missing[0]}` };
}

async function checkQueue(): Promise<Part> {
  const { waiting, oldestDueSeconds } = await readQueueStatus();
  const stuck = oldestDueSeconds > longestWaitSeconds;
  return {
    ok: !stuck,
    says: stuck
      ? `${waiting} jobs are due and the oldest has waited ${Math.round(oldestDueSeconds)} seconds: is a worker running?`
      : `${waiting} jobs due`,
  };
}

async function check(name: string, run: () => Promise<Part>): Promise<Part> {
  try {
    return await run();
  } catch (error) {
    getLog().error({ err: error, part: name }, 'not ready');
    return { ok: false, says: 'could not be asked; the log says why' };
  }
}
