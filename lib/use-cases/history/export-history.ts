import { listHistory, type HistoryCursor, type HistoryRow } from '@/db/queries/history';
import { withLeague } from '@/db/tenant';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { listTypesOfKind } from '@/lib/domain/audit/event-kinds';
import { toLocalInput } from '@/lib/domain/dates/zone';
import { assertCan, type ActorContext } from '../context';
import { presentEvent, type HistoryLine } from '../history-reading';
import type { HistoryQuery } from './history-schemas';

const chunk = 1000;

/**
 * The history as CSV, a thousand events at a time, so that a long one is never whole in memory. Checks the permission
 * before it answers; the rows are read while they are sent.
 */
export function exportHistory(
  ctx: ActorContext,
  query: Omit<HistoryQuery, 'before'>,
): AsyncGenerator<string> {
  assertCan(ctx.actor, 'history.read');
  return writeChunks(ctx, query);
}

async function* writeChunks(ctx: ActorContext, query: Omit<HistoryQuery, 'before'>): AsyncGenerator<string> {
  const types = query.kind === null ? null : listTypesOfKind(query.kind);
  const headings = [`time (${ctx.league.timeZone})`, 'time (UTC)', 'who', 'what', 'type', 'changes'];
  yield writeCsv(headings, [], { byteOrderMark: true });
  let place: { before: HistoryCursor | null } | null = { before: null };
  while (place !== null) {
    const rows = await readChunk(ctx, { types, search: query.search, before: place.before });
    if (rows.length > 0) yield rows.map((row) => writeLine(ctx.league.timeZone, presentEvent(row))).join('');
    const last = rows.at(-1);
    place = rows.length < chunk || last === undefined ? null : { before: { at: last.at, id: last.id } };
  }
}

const readChunk = (
  ctx: ActorContext,
  wanted: { types: readonly string[] | null; search: string; before: HistoryCursor | null },
): Promise<HistoryRow[]> => withLeague(ctx.league.id, (tx) => listHistory(tx, { ...wanted, limit: chunk }));

const writeLine = (timeZone: string, line: HistoryLine): string =>
  writeCsv(
    [
      toLocalInput(line.at, timeZone).replace('T', ' '),
      line.at.toISOString(),
      line.who,
      line.what,
      line.type,
      line.changes.map(({ what, from, to }) => `${what}: ${from} -> ${to}`).join('; '),
    ],
    [],
  );
