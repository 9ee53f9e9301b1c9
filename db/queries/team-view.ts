import type { RosterState } from '@/lib/domain/roster/roster-state';
import type { TeamKits } from '@/lib/domain/kit/kit';
import type { Player } from '@/lib/domain/roster/player';
import type { LeagueTx } from '../tenant';

/** A team of a season with the state of its roster. */
export type TeamView = {
  id: string;
  slug: string;
  name: string;
  divisionId: string;
  seasonId: string;
  kits: TeamKits;
  rowVersion: number;
  roster: {
    id: string;
    state: RosterState;
    revision: number;
    returnReason: string | null;
    submittedAt: Date | null;
    signedOffAt: Date | null;
    frozenAt: Date | null;
    updatedAt: Date;
  };
  /** The batch that holds the roster, if one does. */
  batch: { id: string; code: string; state: string } | null;
  /** How many people manage the team now. */
  managers: number;
};

/** The teams of a season by division then name; `teamIds` limits the list to those a manager may see. */
export async function listTeamViews(
  tx: LeagueTx,
  seasonId: string,
  teamIds: readonly string[] | null,
): Promise<TeamView[]> {
  if (teamIds?.length === 0) return [];
  let query = tx
    .selectFrom('teams as t')
    .innerJoin('divisions as d', (join) =>
      join.onRef('d.league_id', '=', 't.league_id').onRef('d.id', '=', 't.division_id'),
    )
    .innerJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 't.league_id').onRef('r.team_id', '=', 't.id'),
    )
    .leftJoin('batch_teams as bt', (join) =>
      join.onRef('bt.league_id', '=', 'r.league_id').onRef('bt.roster_id', '=', 'r.id'),
    )
    .leftJoin('batches as b', (join) =>
      join.onRef('b.league_id', '=', 'bt.league_id').onRef('b.id', '=', 'bt.batch_id'),
    )
    .selectAll('t')
    .select((eb) => [
      'r.id as roster_id',
      'r.state',
      'r.revision',
      'r.return_reason',
      'r.submitted_at',
      'r.signed_off_at',
      'r.frozen_at',
      'r.updated_at',
      'b.id as batch_id',
      'b.code as batch_code',
      'b.state as batch_state',
      eb
        .selectFrom('membership_teams as mt')
        .innerJoin('memberships as m', (join) =>
          join.onRef('m.league_id', '=', 'mt.league_id').onRef('m.id', '=', 'mt.membership_id'),
        )
        .whereRef('mt.league_id', '=', 't.league_id')
        .whereRef('mt.team_id', '=', 't.id')
        .where('m.ended_at', 'is', null)
        .select((inner) => inner.fn.countAll<number>().as('count'))
        .as('managers'),
    ])
    .where('t.league_id', '=', tx.leagueId)
    .where('t.season_id', '=', seasonId)
    .orderBy('d.position')
    .orderBy('d.name')
    .orderBy('t.name')
    .orderBy('t.id');
  if (teamIds !== null) query = query.where('t.id', 'in', [...teamIds]);
  const rows = await query.execute();
  return rows.map((row) => ({
    id: row.id,
    slug: row.slug,
    name: row.name,
    divisionId: row.division_id,
    seasonId: row.season_id,
    kits: { home: row.home_kit, away: row.away_kit },
    rowVersion: row.row_version,
    roster: {
      id: row.roster_id,
      state: row.state,
      revision: row.revision,
      returnReason: row.return_reason,
      submittedAt: row.submitted_at,
      signedOffAt: row.signed_off_at,
      frozenAt: row.frozen_at,
      updatedAt: row.updated_at,
    },
    batch:
      row.batch_id !== null && row.batch_code !== null && row.batch_state !== null
        ? { id: row.batch_id, code: row.batch_code, state: row.batch_state }
        : null,
    managers: row.managers ?? 0,
  }));
}

/** The players of the given rosters in their order, by roster id; a roster without players has an empty list. */
export async function listPlayersByRoster(
  tx: LeagueTx,
  rosterIds: readonly string[],
): Promise<Map<string, Player[]>> {
  const byRoster = new Map<string, Player[]>(rosterIds.map((id) => [id, []]));
  if (rosterIds.length === 0) return byRoster;
  const rows = await tx
    .selectFrom('players')
    .select(['id', 'roster_id', 'position', 'name', 'name_on_back', 'number', 'role', 'sizes', 'extra'])
    .where('league_id', '=', tx.leagueId)
    .where('roster_id', 'in', [...rosterIds])
    .orderBy('position')
    .orderBy('id')
    .execute();
  for (const row of rows) {
    byRoster.get(row.roster_id)?.push({
      id: row.id,
      position: row.position,
      name: row.name,
      nameOnBack: row.name_on_back,
      number: row.number,
      role: row.role,
      sizes: row.sizes,
      extra: row.extra,
    });
  }
  return byRoster;
}
