import { sql } from 'kysely';
import type { AuditEvent, SystemEvent } from '@/lib/domain/audit/event';
import type { AnyTx, LeagueTx } from '../tenant';

type Stamp = { now: Date; requestId: string; newId: () => string };

/** Appends one event to the league's history, in the transaction of the change it tells of. `userId` null = the program. */
export async function insertAuditEvent(
  tx: LeagueTx,
  stamp: Stamp & { userId: string | null },
  event: AuditEvent,
): Promise<void> {
  await tx
    .insertInto('audit_events')
    .values({
      league_id: tx.leagueId,
      id: stamp.newId(),
      at: stamp.now,
      user_id: stamp.userId,
      type: event.type,
      subject_id: event.subjectId,
      data: JSON.stringify(event.data),
      request_id: stamp.requestId,
    })
    .execute();
}

/** Whether the league's history tells of this very event by this person, at `since` or later. */
export async function hasAuditEventSince(
  tx: LeagueTx,
  asked: { event: AuditEvent; userId: string; since: Date },
): Promise<boolean> {
  const row = await tx
    .selectFrom('audit_events')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('subject_id', '=', asked.event.subjectId)
    .where('type', '=', asked.event.type)
    .where('user_id', '=', asked.userId)
    .where('at', '>=', asked.since)
    .where('data', '@>', sql<never>`${JSON.stringify(asked.event.data)}::jsonb`)
    .limit(1)
    .executeTakeFirst();
  return row !== undefined;
}

/** Appends one event that belongs to no league, such as a sign-in. */
export async function insertSystemEvent(
  tx: AnyTx,
  stamp: Stamp & { userId: string | null },
  event: SystemEvent,
): Promise<void> {
  await tx
    .insertInto('system_events')
    .values({
      id: stamp.newId(),
      at: stamp.now,
      user_id: stamp.userId,
      type: event.type,
      data: JSON.stringify(event.data),
      request_id: stamp.requestId,
    })
    .execute();
}
