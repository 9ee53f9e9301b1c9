import { sql } from 'kysely';
import { jsonArrayFrom } from 'kysely/helpers/postgres';
import type { BatchState } from '@/lib/domain/batch/batch-state';
import type { TeamKits } from '@/lib/domain/kit/kit';
import type { Player } from '@/lib/domain/roster/player';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import type { LeagueTx } from '../tenant';

/** When something was done and by whom; `by` is null for the program, or for somebody who has left the league's books. */
export type Stamp = { at: Date; by: string | null };

/** A roster with its team and season, and who last did what to it. */
export type RosterView = {
  id: string;
  state: RosterState;
  revision: number;
  returnReason: string | null;
  ruleSetVersionId: string | null;
  submitted: Stamp | null;
  signedOff: Stamp | null;
  frozenAt: Date | null;
  updated: Stamp;
  team: { id: string; slug: string; name: string; kits: TeamKits; divisionId: string };
  season: { id: string; slug: string; name: string };
  batch: { code: string; state: BatchState } | null;
};

const readRosters = (tx: LeagueTx) =>
  tx
    .selectFrom('rosters as r')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'r.league_id').onRef('t.id', '=', 'r.team_id'),
    )
    .innerJoin('seasons as s', (join) =>
      join.onRef('s.league_id', '=', 't.league_id').onRef('s.id', '=', 't.season_id'),
    )
    .leftJoin('users as editor', 'editor.id', 'r.updated_by')
    .leftJoin('users as submitter', 'submitter.id', 'r.submitted_by')
    .leftJoin('users as signer', 'signer.id', 'r.signed_off_by')
    .leftJoin('batch_teams as bt', (join) =>
      join.onRef('bt.league_id', '=', 'r.league_id').onRef('bt.roster_id', '=', 'r.id'),
    )
    .leftJoin('batches as b', (join) =>
      join.onRef('b.league_id', '=', 'bt.league_id').onRef('b.id', '=', 'bt.batch_id'),
    )
    .selectAll('r')
    .select([
      't.slug as team_slug',
      't.name as team_name',
      't.home_kit',
      't.away_kit',
      't.division_id',
      's.id as season_id',
      's.slug as season_slug',
      's.name as season_name',
      'editor.name as editor_name',
      'submitter.name as submitter_name',
      'signer.name as signer_name',
      'b.code as batch_code',
      'b.state as batch_state',
    ])
    .where('r.league_id', '=', tx.leagueId);

type RawRoster = Awaited<ReturnType<ReturnType<typeof readRosters>['executeTakeFirstOrThrow']>>;

const stamp = (at: Date | null, by: string | null): Stamp | null => (at === null ? null : { at, by });

const toRosterView = (row: RawRoster): RosterView => ({
  id: row.id,
  state: row.state,
  revision: row.revision,
  returnReason: row.return_reason,
  ruleSetVersionId: row.rule_set_version_id,
  submitted: stamp(row.submitted_at, row.submitter_name),
  signedOff: stamp(row.signed_off_at, row.signer_name),
  frozenAt: row.frozen_at,
  updated: { at: row.updated_at, by: row.editor_name },
  team: {
    id: row.team_id,
    slug: row.team_slug,
    name: row.team_name,
    kits: { home: row.home_kit, away: row.away_kit },
    divisionId: row.division_id,
  },
  season: { id: row.season_id, slug: row.season_slug, name: row.season_name },
  batch:
    row.batch_code !== null && row.batch_state !== null
      ? { code: row.batch_code, state: row.batch_state }
      : null,
});

/** The roster of a team by the slugs of its season and team; undefined when the league has none. */
export async function findRosterOfTeam(
  tx: LeagueTx,
  slugs: { season: string; team: string },
): Promise<RosterView | undefined> {
  const row = await readRosters(tx)
    .where('s.slug', '=', slugs.season)
    .where('t.slug', '=', slugs.team)
    .executeTakeFirst();
  return row && toRosterView(row);
}

/** The roster with this id; undefined when the league has none. */
export async function findRoster(tx: LeagueTx, rosterId: string): Promise<RosterView | undefined> {
  const row = await readRosters(tx).where('r.id', '=', rosterId).executeTakeFirst();
  return row && toRosterView(row);
}

/** The same with its row locked until the transaction ends, so that whoever else changes it has to wait. */
export async function lockRoster(tx: LeagueTx, rosterId: string): Promise<RosterView | undefined> {
  // Locked before it is read: what another transaction has just committed must be seen.
  await tx
    .selectFrom('rosters')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', rosterId)
    .forNoKeyUpdate()
    .execute();
  return findRoster(tx, rosterId);
}

/** What a step writes beside the state; a field that is left out keeps its value. */
export type StateChange = {
  state: RosterState;
  returnReason?: string | null;
  ruleSetVersionId?: string | null;
  submitted?: { at: Date; userId: string } | null;
  signedOff?: { at: Date; userId: string } | null;
  frozenAt?: Date | null;
};

/**
 * Moves a locked roster to another state and counts its revision up. False when two of its players would be sealed
 * with one number: the database refuses that, and the transaction can only be given up.
 */
export async function updateRosterState(
  tx: LeagueTx,
  rosterId: string,
  change: StateChange,
  by: { now: Date; userId: string | null },
): Promise<boolean> {
  const { submitted, signedOff } = change;
  try {
    await tx
      .updateTable('rosters')
      .set({
        state: change.state,
        revision: sql<number>`revision + 1`,
        updated_at: by.now,
        updated_by: by.userId,
        ...(change.returnReason !== undefined && { return_reason: change.returnReason }),
        ...(change.ruleSetVersionId !== undefined && { rule_set_version_id: change.ruleSetVersionId }),
        ...(submitted !== undefined && {
          submitted_at: submitted?.at ?? null,
          submitted_by: submitted?.userId ?? null,
        }),
        ...(signedOff !== undefined && {
          signed_off_at: signedOff?.at ?? null,
          signed_off_by: signedOff?.userId ?? null,
        }),
        ...(change.frozenAt !== undefined && { frozen_at: change.frozenAt }),
      })
      .where('league_id', '=', tx.leagueId)
      .where('id', '=', rosterId)
      .execute();
    return true;
  } catch (error) {
    if (isRepeatedNumber(error)) return false;
    throw error;
  }
}

const isRepeatedNumber = (error: unknown): boolean =>
  error instanceof Error && 'constraint' in error && error.constraint === 'one_number_once_signed_off';

/** Counts the revision of a locked roster up after its players have changed, and answers the new one. */
export async function touchRoster(
  tx: LeagueTx,
  rosterId: string,
  by: { now: Date; userId: string },
): Promise<number> {
  const row = await tx
    .updateTable('rosters')
    .set({ revision: sql<number>`revision + 1`, updated_at: by.now, updated_by: by.userId })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', rosterId)
    .returning('revision')
    .executeTakeFirstOrThrow();
  return row.revision;
}

/** A team of a season as a list of rosters shows it, with its players in their order and the names of its managers. */
export type SeasonRoster = {
  team: { id: string; slug: string; name: string; kits: TeamKits; divisionId: string };
  id: string;
  state: RosterState;
  returnReason: string | null;
  submittedAt: Date | null;
  signedOffAt: Date | null;
  frozenAt: Date | null;
  updatedAt: Date;
  batch: { code: string; state: BatchState } | null;
  managers: { userId: string; name: string }[];
  players: Player[];
};

/**
 * Every roster of a season in one query, by division then team; `teamIds` limits it to those a manager may see. Players
 * come with it, because a list of rosters is a list of what holds them.
 */
export async function listSeasonRosters(
  tx: LeagueTx,
  seasonId: string,
  teamIds: readonly string[] | null,
): Promise<SeasonRoster[]> {
  if (teamIds?.length === 0) return [];
  let query = readRosters(tx)
    .innerJoin('divisions as d', (join) =>
      join.onRef('d.league_id', '=', 't.league_id').onRef('d.id', '=', 't.division_id'),
    )
    .select((eb) => [
      jsonArrayFrom(
        eb
          .selectFrom('players as p')
          .select([
            'p.id',
            'p.position',
            'p.name',
            'p.name_on_back as nameOnBack',
            'p.number',
            'p.role',
            'p.sizes',
            'p.extra',
          ])
          .whereRef('p.league_id', '=', 'r.league_id')
          .whereRef('p.roster_id', '=', 'r.id')
          .orderBy('p.position')
          .orderBy('p.id'),
      ).as('players'),
      jsonArrayFrom(
        eb
          .selectFrom('membership_teams as mt')
          .innerJoin('memberships as m', (join) =>
            join.onRef('m.league_id', '=', 'mt.league_id').onRef('m.id', '=', 'mt.membership_id'),
          )
          .innerJoin('users as u', 'u.id', 'm.user_id')
          .select(['u.id as userId', 'u.name'])
          .whereRef('mt.league_id', '=', 't.league_id')
          .whereRef('mt.team_id', '=', 't.id')
          .where('m.ended_at', 'is', null)
          .orderBy('u.name'),
      ).as('managers'),
    ])
    .where('t.season_id', '=', seasonId)
    .orderBy('d.position')
    .orderBy('d.name')
    .orderBy('t.name')
    .orderBy('t.id');
  if (teamIds !== null) query = query.where('t.id', 'in', [...teamIds]);
  const rows = await query.execute();
  return rows.map((row) => {
    const view = toRosterView(row);
    return {
      team: view.team,
      id: view.id,
      state: view.state,
      returnReason: view.returnReason,
      submittedAt: row.submitted_at,
      signedOffAt: row.signed_off_at,
      frozenAt: view.frozenAt,
      updatedAt: row.updated_at,
      batch: view.batch,
      managers: row.managers,
      players: row.players,
    };
  });
}

/** The people who manage these teams now, with the address their letters go to; one row per team and person. */
export function listManagersOfTeams(tx: LeagueTx, teamIds: readonly string[]) {
  return tx
    .selectFrom('membership_teams as mt')
    .innerJoin('memberships as m', (join) =>
      join.onRef('m.league_id', '=', 'mt.league_id').onRef('m.id', '=', 'mt.membership_id'),
    )
    .innerJoin('users as u', 'u.id', 'm.user_id')
    .select(['mt.team_id as teamId', 'u.id as userId', 'u.name', 'u.email'])
    .distinct()
    .where('mt.league_id', '=', tx.leagueId)
    .where('mt.team_id', 'in', teamIds.length === 0 ? [null] : [...teamIds])
    .where('m.ended_at', 'is', null)
    .orderBy('u.email')
    .execute();
}
