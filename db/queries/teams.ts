import type { TeamKits } from '@/lib/domain/kit/kit';
import type { LeagueTx } from '../tenant';

/** What a team is made of besides its id. */
export type TeamFields = { name: string; divisionId: string; kits: TeamKits };

const toColumns = ({ name, divisionId, kits }: TeamFields) => ({
  name,
  division_id: divisionId,
  home_kit: JSON.stringify(kits.home),
  away_kit: kits.away === null ? null : JSON.stringify(kits.away),
});

/** Adds a team and its roster, which is open and empty. */
export async function insertTeam(
  tx: LeagueTx,
  team: TeamFields & {
    id: string;
    rosterId: string;
    seasonId: string;
    slug: string;
    now: Date;
    userId: string | null;
  },
): Promise<void> {
  await tx
    .insertInto('teams')
    .values({
      league_id: tx.leagueId,
      id: team.id,
      season_id: team.seasonId,
      slug: team.slug,
      created_at: team.now,
      ...toColumns(team),
    })
    .execute();
  await tx
    .insertInto('rosters')
    .values({
      league_id: tx.leagueId,
      id: team.rosterId,
      team_id: team.id,
      state: 'open',
      updated_at: team.now,
      updated_by: team.userId,
    })
    .execute();
}

/** Rewrites a team's fields; false when somebody changed it since `rowVersion`, or the league has no such team. */
export async function updateTeam(
  tx: LeagueTx,
  team: TeamFields & { id: string; rowVersion: number },
): Promise<boolean> {
  const result = await tx
    .updateTable('teams')
    .set({ ...toColumns(team), row_version: team.rowVersion + 1 })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', team.id)
    .where('row_version', '=', team.rowVersion)
    .executeTakeFirst();
  return result.numUpdatedRows === 1n;
}

/**
 * Locks the season of a team, before the team itself: an import takes the two in this order. Undefined when the league
 * has no such team.
 */
export async function lockSeasonOfTeam(tx: LeagueTx, teamId: string): Promise<string | undefined> {
  const row = await tx
    .selectFrom('seasons as s')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 's.league_id').onRef('t.season_id', '=', 's.id'),
    )
    .select('s.id')
    .where('s.league_id', '=', tx.leagueId)
    .where('t.id', '=', teamId)
    .forNoKeyUpdate('s')
    .executeTakeFirst();
  return row?.id;
}

/**
 * Locks a team and its roster and says what would go with them: how many players, and the batch that holds the roster.
 * Undefined when the league has no such team.
 */
export async function lockTeam(tx: LeagueTx, teamId: string) {
  const team = await tx
    .selectFrom('teams as t')
    .innerJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 't.league_id').onRef('r.team_id', '=', 't.id'),
    )
    .select(['t.id', 't.name', 't.season_id as seasonId', 'r.id as rosterId', 'r.state'])
    .where('t.league_id', '=', tx.leagueId)
    .where('t.id', '=', teamId)
    .forUpdate()
    .executeTakeFirst();
  if (!team) return undefined;
  const players = await tx
    .selectFrom('players')
    .select((eb) => eb.fn.countAll<number>().as('count'))
    .where('league_id', '=', tx.leagueId)
    .where('roster_id', '=', team.rosterId)
    .executeTakeFirstOrThrow();
  const batch = await tx
    .selectFrom('batch_teams as bt')
    .innerJoin('batches as b', (join) =>
      join.onRef('b.league_id', '=', 'bt.league_id').onRef('b.id', '=', 'bt.batch_id'),
    )
    .select('b.code')
    .where('bt.league_id', '=', tx.leagueId)
    .where('bt.roster_id', '=', team.rosterId)
    .executeTakeFirst();
  return { ...team, players: players.count, batch: batch?.code ?? null };
}

/** Removes a team with its roster, its players and its managers' links to it. */
export async function deleteTeam(tx: LeagueTx, teamId: string): Promise<void> {
  await tx.deleteFrom('teams').where('league_id', '=', tx.leagueId).where('id', '=', teamId).execute();
}

/** How many players each team of a season has, by team id; a team without any is left out. */
export async function countPlayersByTeam(tx: LeagueTx, seasonId: string): Promise<Map<string, number>> {
  const rows = await tx
    .selectFrom('teams as t')
    .innerJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 't.league_id').onRef('r.team_id', '=', 't.id'),
    )
    .innerJoin('players as p', (join) =>
      join.onRef('p.league_id', '=', 'r.league_id').onRef('p.roster_id', '=', 'r.id'),
    )
    .select((eb) => ['t.id', eb.fn.count<number>('p.id').as('players')])
    .where('t.league_id', '=', tx.leagueId)
    .where('t.season_id', '=', seasonId)
    .groupBy('t.id')
    .execute();
  return new Map(rows.map((row) => [row.id, row.players]));
}
