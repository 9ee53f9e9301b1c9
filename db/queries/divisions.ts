import { sql } from 'kysely';
import type { LeagueTx } from '../tenant';

/** What a division is made of besides its id; `freezesAt` null means the season's freeze holds. */
export type DivisionFields = {
  name: string;
  ageBand: string;
  level: string;
  ruleSetId: string;
  leastPlayers: number;
  mostPlayers: number;
  freezesAt: Date | null;
};

const toColumns = (fields: DivisionFields) => ({
  name: fields.name,
  age_band: fields.ageBand,
  level: fields.level,
  rule_set_id: fields.ruleSetId,
  least_players: fields.leastPlayers,
  most_players: fields.mostPlayers,
  freezes_at: fields.freezesAt,
});

/** Locks a season, so that its divisions and teams are added one transaction after the other; false when it is not there. */
export async function lockSeason(tx: LeagueTx, seasonId: string): Promise<boolean> {
  const row = await tx
    .selectFrom('seasons')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', seasonId)
    .forNoKeyUpdate()
    .executeTakeFirst();
  return row !== undefined;
}

/**
 * Locks the season of a division, before the division itself: whoever adds teams takes the two in this order, and the
 * other way round they would wait for each other. Undefined when the league has no such division.
 */
export async function lockSeasonOfDivision(tx: LeagueTx, divisionId: string): Promise<string | undefined> {
  const row = await tx
    .selectFrom('seasons as s')
    .innerJoin('divisions as d', (join) =>
      join.onRef('d.league_id', '=', 's.league_id').onRef('d.season_id', '=', 's.id'),
    )
    .select('s.id')
    .where('s.league_id', '=', tx.leagueId)
    .where('d.id', '=', divisionId)
    .forNoKeyUpdate('s')
    .executeTakeFirst();
  return row?.id;
}

/** Adds a division after the others of its season. */
export async function insertDivision(
  tx: LeagueTx,
  division: DivisionFields & { id: string; seasonId: string; slug: string; now: Date },
): Promise<void> {
  await tx
    .insertInto('divisions')
    .values({
      league_id: tx.leagueId,
      id: division.id,
      season_id: division.seasonId,
      slug: division.slug,
      position: sql<number>`(
        select coalesce(max(position) + 1, 0) from divisions
        where league_id = ${tx.leagueId} and season_id = ${division.seasonId}
      )`,
      created_at: division.now,
      ...toColumns(division),
    })
    .execute();
}

/** Rewrites a division's fields; false when somebody changed it since `rowVersion`, or the league has no such division. */
export async function updateDivision(
  tx: LeagueTx,
  division: DivisionFields & { id: string; rowVersion: number },
): Promise<boolean> {
  const result = await tx
    .updateTable('divisions')
    .set({ ...toColumns(division), row_version: division.rowVersion + 1 })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', division.id)
    .where('row_version', '=', division.rowVersion)
    .executeTakeFirst();
  return result.numUpdatedRows === 1n;
}

/** Locks a division and says what it is; undefined when the league has none with this id. */
export function lockDivision(tx: LeagueTx, divisionId: string) {
  return tx
    .selectFrom('divisions')
    .select(['id', 'name', 'season_id as seasonId'])
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', divisionId)
    .forUpdate()
    .executeTakeFirst();
}

/** The divisions that these teams play in, by id. */
export async function listDivisionIdsOfTeams(tx: LeagueTx, teamIds: readonly string[]): Promise<Set<string>> {
  if (teamIds.length === 0) return new Set();
  const rows = await tx
    .selectFrom('teams')
    .select('division_id')
    .distinct()
    .where('league_id', '=', tx.leagueId)
    .where('id', 'in', [...teamIds])
    .execute();
  return new Set(rows.map((row) => row.division_id));
}

/** How many teams a division has. */
export async function countTeams(tx: LeagueTx, divisionId: string): Promise<number> {
  const row = await tx
    .selectFrom('teams')
    .select((eb) => eb.fn.countAll<number>().as('count'))
    .where('league_id', '=', tx.leagueId)
    .where('division_id', '=', divisionId)
    .executeTakeFirstOrThrow();
  return row.count;
}

/** Removes a division with its garments; the database refuses while it has teams. */
export async function deleteDivision(tx: LeagueTx, divisionId: string): Promise<void> {
  await tx
    .deleteFrom('divisions')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', divisionId)
    .execute();
}

/** Teams and players of each division of a season, by division id; a division without teams is left out. */
export async function countByDivision(
  tx: LeagueTx,
  seasonId: string,
): Promise<Map<string, { teams: number; players: number }>> {
  const rows = await tx
    .selectFrom('teams as t')
    .leftJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 't.league_id').onRef('r.team_id', '=', 't.id'),
    )
    .leftJoin('players as p', (join) =>
      join.onRef('p.league_id', '=', 'r.league_id').onRef('p.roster_id', '=', 'r.id'),
    )
    .select((eb) => [
      't.division_id',
      eb.fn.count<number>('t.id').distinct().as('teams'),
      eb.fn.count<number>('p.id').as('players'),
    ])
    .where('t.league_id', '=', tx.leagueId)
    .where('t.season_id', '=', seasonId)
    .groupBy('t.division_id')
    .execute();
  return new Map(rows.map((row) => [row.division_id, { teams: row.teams, players: row.players }]));
}
