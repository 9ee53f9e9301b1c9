import { Kysely, PostgresDialect } from 'kysely';
import pg from 'pg';
import { getEnv } from '@/lib/platform/env';
import { getLog } from '@/lib/platform/log';
import type { Database } from './schema';

// Calendar days stay text: a Date would move them with the server's time zone. Sizes in bytes fit a double.
pg.types.setTypeParser(pg.types.builtins.DATE, (value) => value);
pg.types.setTypeParser(pg.types.builtins.INT8, Number);

type Handles = { pool: pg.Pool; db: Kysely<Database> };

// Hot reload evaluates this file again; one pool per process must survive it.
const store = globalThis as typeof globalThis & { raglanDatabase?: Handles | undefined };

/** The pool and query builder of the runtime role, made on first use. */
export function getDatabase(): Handles {
  if (store.raglanDatabase) return store.raglanDatabase;
  const { RAGLAN_DATABASE_URL, RAGLAN_DB_POOL } = getEnv();
  const pool = new pg.Pool({
    connectionString: RAGLAN_DATABASE_URL,
    max: RAGLAN_DB_POOL,
    idleTimeoutMillis: 10_000,
    connectionTimeoutMillis: 5_000,
    application_name: 'raglan',
  });
  // An idle connection that loses its server must not end the process; the next query opens a new one.
  pool.on('error', (error) => getLog().warn({ err: error }, 'idle database connection lost'));
  store.raglanDatabase = { pool, db: new Kysely<Database>({ dialect: new PostgresDialect({ pool }) }) };
  return store.raglanDatabase;
}

/** Closes the pool; for scripts and tests that must end. */
export async function closeDatabase(): Promise<void> {
  const handles = store.raglanDatabase;
  store.raglanDatabase = undefined;
  await handles?.db.destroy();
}
