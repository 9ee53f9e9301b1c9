// Brings the tables up to date: the job queue's first (one of our functions stands on them), then ours, in order.
import { promises as fs } from 'node:fs';
import path from 'node:path';
import { Logger, runMigrations } from 'graphile-worker';
import { FileMigrationProvider, Kysely, Migrator, PostgresDialect } from 'kysely';
import pg from 'pg';

const connectionString = process.env.RAGLAN_OWNER_URL;
if (!connectionString) {
  console.error(
    'RAGLAN_OWNER_URL is not set. It is the address of the database as the role that owns the tables.',
  );
  process.exit(1);
}

const pool = new pg.Pool({ connectionString, max: 2, connectionTimeoutMillis: 10_000 });
// The query under way reports what happens to its connection.
pool.on('error', () => {});
pool.on('connect', (client) => client.on('error', () => {}));
const db = new Kysely<unknown>({ dialect: new PostgresDialect({ pool }) });
const silent = new Logger(() => () => {});

await runMigrations({ pgPool: pool, logger: silent });
const migrator = new Migrator({
  db,
  provider: new FileMigrationProvider({
    fs,
    path,
    migrationFolder: path.join(import.meta.dirname, '..', 'migrations'),
  }),
});
const { error, results = [] } = await migrator.migrateToLatest();
await db.destroy();

const done = results.filter((result) => result.status === 'Success');
if (done.length > 0) console.log(`Tables brought up to date: ${done.length} steps.`);
if (error) {
  const failed = results.find((result) => result.status === 'Error');
  console.error(`Step ${failed?.migrationName ?? 'before the first'} failed:`);
  console.error(error);
  process.exit(1);
}
