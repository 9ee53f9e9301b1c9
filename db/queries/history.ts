import { sql } from 'kysely';
import type { LeagueTx } from '../tenant';

/** One event as it is stored; `who` is null for what the program did by itself. */
export type HistoryRow = {
  id: string;
  at: Date;
  who: string | null;
  type: string;
  subjectId: string | null;
  data: Record<string, unknown>;
};

/** Where a page of the history ends: the next one starts below it. */
export type HistoryCursor = { at: Date; id: string };

/**
 * Events of the league, newest first, `limit` of them at most, from below the cursor on. `types` null means all;
 * `search` looks for every word in the type, the data and the person's name, whatever its case.
 */
export async function listHistory(
  tx: LeagueTx,
  wanted: {
    types: readonly string[] | null;
    search: string;
    before: HistoryCursor | null;
    limit: number;
  },
): Promise<HistoryRow[]> {
  if (wanted.types?.length === 0) return [];
  let query = tx
    .selectFrom('audit_events as e')
    .leftJoin('users as u', 'u.id', 'e.user_id')
    .select(['e.id', 'e.at', 'u.name as who', 'e.type', 'e.subject_id', 'e.data'])
    .where('e.league_id', '=', tx.leagueId);
  if (wanted.types !== null) query = query.where('e.type', 'in', [...wanted.types]);
  for (const word of wanted.search.split(/\s+/).filter((part) => part !== '')) {
    const pattern = `%${word.replace(/[\\%_]/g, '\\$&')}%`;
    query = query.where(sql<boolean>`concat_ws(' ', e.type, e.data::text, u.name) ilike ${pattern}`);
  }
  if (wanted.before !== null) {
    const { at, id } = wanted.before;
    query = query.where(sql<boolean>`(e.at, e.id) < (${at}, ${id}::uuid)`);
  }
  const rows = await query.orderBy('e.at', 'desc').orderBy('e.id', 'desc').limit(wanted.limit).execute();
  return rows.map((row) => ({
    id: row.id,
    at: row.at,
    who: row.who,
    type: row.type,
    subjectId: row.subject_id,
    data: row.data,
  }));
}
