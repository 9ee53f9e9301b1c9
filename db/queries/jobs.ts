import { sql } from 'kysely';
import type { OutgoingEmail } from '@/lib/domain/league/email';
import type { AnyTx } from '../tenant';

/** Every task a worker knows, with its payload. */
export type Job =
  | { task: 'send-email'; payload: { emailId: string } }
  | { task: 'build-bundle'; payload: { leagueId: string; batchId: string } }
  | { task: 'freeze-rosters'; payload: { leagueId: string; seasonId: string } };

/**
 * Queues a job in the transaction that causes it: a rollback drops it. `key` makes a later job with the same key
 * replace one that has not started; `runAt` null means at once. Jobs run at least once.
 */
export async function enqueueJob(
  tx: AnyTx,
  job: Job,
  options: { key: string; runAt: Date | null },
): Promise<void> {
  await sql`select enqueue_job(${job.task}, ${JSON.stringify(job.payload)}::json, ${options.key}, ${options.runAt})`.execute(
    tx,
  );
}

/** Puts an e-mail into the outbox and queues its sending, in the transaction that causes it. */
export async function queueEmail(
  tx: AnyTx,
  stamp: { now: Date; newId: () => string },
  to: string,
  email: OutgoingEmail,
): Promise<void> {
  const id = stamp.newId();
  await tx
    .insertInto('emails')
    .values({
      id,
      to_address: to,
      template: email.template,
      params: JSON.stringify(email.params),
      created_at: stamp.now,
    })
    .execute();
  await enqueueJob(tx, { task: 'send-email', payload: { emailId: id } }, { key: `email:${id}`, runAt: null });
}
