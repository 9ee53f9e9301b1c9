import { columnMappingSchema, type ColumnMapping } from '@/lib/domain/roster/import/column-mapping';
import type { LeagueTx } from '../tenant';

/** Every mapping kept for a team, by the signature of the headings it was made for. One no longer readable is left out. */
export async function listColumnMappings(
  tx: LeagueTx,
  teamId: string,
): Promise<{ signature: string; mapping: ColumnMapping }[]> {
  const rows = await tx
    .selectFrom('column_mappings')
    .select(['signature', 'mapping'])
    .where('league_id', '=', tx.leagueId)
    .where('team_id', '=', teamId)
    .orderBy('used_at', 'desc')
    .limit(mostKept)
    .execute();
  return rows.flatMap(({ signature, mapping }) => {
    const read = columnMappingSchema.safeParse(mapping);
    return read.success ? [{ signature, mapping: read.data }] : [];
  });
}

/** Keeps a team's mapping for files with these headings, in place of an earlier one; the oldest beyond 20 are let go. */
export async function saveColumnMapping(
  tx: LeagueTx,
  kept: { teamId: string; signature: string; mapping: ColumnMapping; now: Date },
): Promise<void> {
  const values = { mapping: JSON.stringify(kept.mapping), used_at: kept.now };
  await tx
    .insertInto('column_mappings')
    .values({ league_id: tx.leagueId, team_id: kept.teamId, signature: kept.signature, ...values })
    .onConflict((conflict) => conflict.columns(['league_id', 'team_id', 'signature']).doUpdateSet(values))
    .execute();
  await tx
    .deleteFrom('column_mappings')
    .where('league_id', '=', tx.leagueId)
    .where('team_id', '=', kept.teamId)
    .where('signature', 'not in', (eb) =>
      eb
        .selectFrom('column_mappings')
        .select('signature')
        .where('league_id', '=', tx.leagueId)
        .where('team_id', '=', kept.teamId)
        .orderBy('used_at', 'desc')
        .orderBy('signature')
        .limit(mostKept),
    )
    .execute();
}

const mostKept = 20;
