import type { HistoryCursor, HistoryRow } from '@/db/queries/history';
import { describeEvent, listChanges, type ShownChange } from '@/lib/domain/audit/describe-event';
import type { AuditEvent } from '@/lib/domain/audit/event';

/** One line of the history: who, what as the rest of the sentence, and the single changes behind it. */
export type HistoryLine = {
  id: string;
  at: Date;
  who: string;
  what: string;
  type: string;
  changes: ShownChange[];
};

/** A stored event as a line. */
export function presentEvent(row: HistoryRow): HistoryLine {
  // Rows are only ever written through insertAuditEvent, which takes this type.
  const event = { type: row.type, subjectId: row.subjectId, data: row.data } as AuditEvent;
  return {
    id: row.id,
    at: row.at,
    who: row.who ?? 'The program',
    what: describeEvent(event),
    type: row.type,
    changes: listChanges(event),
  };
}

/** A place in the history as it stands in an address: the instant, then the event's id. */
export const writeCursor = (row: { at: Date; id: string }): string => `${row.at.toISOString()}_${row.id}`;

/** The place an address names; historyQuerySchema has seen to its shape. */
export function readCursor(text: string | null): HistoryCursor | null {
  const [at, id] = text?.split('_') ?? [];
  return at === undefined || id === undefined ? null : { at: new Date(at), id };
}
