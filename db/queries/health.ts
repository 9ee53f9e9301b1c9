import { readdir } from 'node:fs/promises';
import path from 'node:path';
import { sql } from 'kysely';
import { getDatabase } from '../client';

/** Whether the database answers a query at all; throws what the connection says otherwise. */
export async function pingDatabase(): Promise<void> {
  await sql`select 1`.execute(getDatabase().db);
}

let names: Promise<string[]> | undefined;

/** The names of the migrations this code was shipped with, read once from its own folder. */
function listOwnMigrations(): Promise<string[]> {
  names ??= readdir(path.join(/* turbopackIgnore: true */ process.cwd(), 'migrations')).then((files) =>
    files.filter((file) => /\.[cm]?[jt]s$/.test(file)).map((file) => file.replace(/\.[^.]+$/, '')),
  );
  return names;
}

/** The migrations of this code that the database has not had, by name; empty when they belong together. */
export async function listMissingMigrations(): Promise<string[]> {
  const applied = await sql<{ name: string }>`select name from kysely_migration`.execute(getDatabase().db);
  const known = new Set(applied.rows.map((row) => row.name));
  return (await listOwnMigrations()).filter((name) => !known.has(name));
}

/** How many jobs are due and wait for a worker, and for how many seconds the oldest of them has (0 when none). */
export async function readQueueStatus(): Promise<{ waiting: number; oldestDueSeconds: number }> {
  const found = await sql<{
    waiting: number;
    oldest_due_seconds: number;
  }>`select waiting, oldest_due_seconds from queue_status()`.execute(getDatabase().db);
  const row = found.rows[0];
  return { waiting: row?.waiting ?? 0, oldestDueSeconds: row?.oldest_due_seconds ?? 0 };
}

/** Removes links and letters that can no longer be used (older than a week, three days for letters), and counts them. */
export async function tidyExpired(
  now: Date,
): Promise<{ signUps: number; passwordResets: number; emails: number }> {
  const found = await sql<{
    sign_ups: number;
    password_resets: number;
    emails: number;
  }>`select * from tidy_expired(${now})`.execute(getDatabase().db);
  const row = found.rows[0];
  return {
    signUps: row?.sign_ups ?? 0,
    passwordResets: row?.password_resets ?? 0,
    emails: row?.emails ?? 0,
  };
}
