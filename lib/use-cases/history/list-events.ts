import { listHistory } from '@/db/queries/history';
import { withLeague } from '@/db/tenant';
import { listTypesOfKind } from '@/lib/domain/audit/event-kinds';
import { assertCan, type ActorContext } from '../context';
import { presentEvent, readCursor, writeCursor, type HistoryLine } from '../history-reading';
import type { HistoryQuery } from './history-schemas';

const pageSize = 50;

/** A page of the league's history, newest first; `next` is where the following page starts, null on the last. */
export async function listEvents(
  ctx: ActorContext,
  query: HistoryQuery,
): Promise<{ lines: HistoryLine[]; next: string | null }> {
  assertCan(ctx.actor, 'history.read');
  const rows = await withLeague(ctx.league.id, (tx) =>
    listHistory(tx, {
      types: query.kind === null ? null : listTypesOfKind(query.kind),
      search: query.search,
      before: readCursor(query.before),
      limit: pageSize + 1,
    }),
  );
  const page = rows.slice(0, pageSize);
  const last = page.at(-1);
  return {
    lines: page.map(presentEvent),
    next: rows.length > pageSize && last !== undefined ? writeCursor(last) : null,
  };
}
