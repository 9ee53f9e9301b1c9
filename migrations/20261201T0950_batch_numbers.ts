import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

// A code that a discarded batch once had is not given again: the history would tell of two batches by one name.
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);
  await sql`alter table leagues add column last_batch_number int not null default 0`.execute(db);
}
