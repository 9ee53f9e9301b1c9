import type { LeagueTx } from '../tenant';

/** What a season is made of besides its id: days are YYYY-MM-DD on the league's calendar, the freeze an instant. */
export type SeasonFields = {
  name: string;
  sport: string;
  rosterOpensOn: string;
  freezesAt: Date;
  releaseOn: string | null;
  handOutOn: string;
  firstMatchOn: string;
};

const toColumns = (fields: SeasonFields) => ({
  name: fields.name,
  sport: fields.sport,
  roster_opens_on: fields.rosterOpensOn,
  freezes_at: fields.freezesAt,
  release_on: fields.releaseOn,
  hand_out_on: fields.handOutOn,
  first_match_on: fields.firstMatchOn,
});

/** Adds a season; a slug the league has already is refused by the database. */
export async function insertSeason(
  tx: LeagueTx,
  season: SeasonFields & { id: string; slug: string; now: Date },
): Promise<void> {
  await tx
    .insertInto('seasons')
    .values({
      league_id: tx.leagueId,
      id: season.id,
      slug: season.slug,
      created_at: season.now,
      ...toColumns(season),
    })
    .execute();
}

/** Rewrites a season's fields; false when somebody changed it since `rowVersion`, or the league has no such season. */
export async function updateSeason(
  tx: LeagueTx,
  season: SeasonFields & { id: string; rowVersion: number },
): Promise<boolean> {
  const result = await tx
    .updateTable('seasons')
    .set({ ...toColumns(season), row_version: season.rowVersion + 1 })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', season.id)
    .where('row_version', '=', season.rowVersion)
    .executeTakeFirst();
  return result.numUpdatedRows === 1n;
}

/**
 * Keeps everybody else from adding seasons or choosing the current one until the transaction ends, and answers the
 * current season's id; the league's row is the lock.
 */
export async function lockCurrentSeason(tx: LeagueTx): Promise<string | null> {
  const row = await tx
    .selectFrom('leagues')
    .select('current_season_id')
    .where('id', '=', tx.leagueId)
    .forNoKeyUpdate()
    .executeTakeFirst();
  return row?.current_season_id ?? null;
}

/** Makes a season the one people work in. */
export async function setCurrentSeason(tx: LeagueTx, seasonId: string): Promise<void> {
  await tx
    .updateTable('leagues')
    .set({ current_season_id: seasonId })
    .where('id', '=', tx.leagueId)
    .execute();
}

/** How many divisions, teams and frozen rosters each season has, by season id; a season without any is left out. */
export async function countBySeason(
  tx: LeagueTx,
): Promise<Map<string, { divisions: number; teams: number; frozen: number }>> {
  const rows = await tx
    .selectFrom('divisions as d')
    .leftJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'd.league_id').onRef('t.division_id', '=', 'd.id'),
    )
    .leftJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 't.league_id').onRef('r.team_id', '=', 't.id'),
    )
    .select((eb) => [
      'd.season_id',
      eb.fn.count<number>('d.id').distinct().as('divisions'),
      eb.fn.count<number>('t.id').as('teams'),
      eb.fn.count<number>('r.id').filterWhere('r.state', '=', 'frozen').as('frozen'),
    ])
    .where('d.league_id', '=', tx.leagueId)
    .groupBy('d.season_id')
    .execute();
  return new Map(
    rows.map((row) => [row.season_id, { divisions: row.divisions, teams: row.teams, frozen: row.frozen }]),
  );
}
