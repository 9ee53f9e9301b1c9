import type { Role } from '@/lib/domain/access/permissions';
import type { LeagueTx } from '../tenant';

export type TeamName = { id: string; name: string };

/** One role of one person in the league. A person with two roles is two of these. */
export type Membership = {
  id: string;
  userId: string;
  name: string;
  email: string;
  role: Role;
  shop: { id: string; name: string } | null;
  teams: TeamName[];
  since: Date;
};

const membershipsOf = (tx: LeagueTx) =>
  tx
    .selectFrom('memberships as m')
    .innerJoin('users as u', 'u.id', 'm.user_id')
    .leftJoin('shops as s', (join) =>
      join.onRef('s.league_id', '=', 'm.league_id').onRef('s.id', '=', 'm.shop_id'),
    )
    .select([
      'm.id',
      'm.user_id',
      'u.name',
      'u.email',
      'm.role',
      'm.shop_id',
      's.name as shop_name',
      'm.created_at',
    ])
    .where('m.league_id', '=', tx.leagueId)
    .where('m.ended_at', 'is', null);

type Row = Awaited<ReturnType<ReturnType<typeof membershipsOf>['execute']>>[number];

const present = (row: Row, teams: TeamName[]): Membership => ({
  id: row.id,
  userId: row.user_id,
  name: row.name,
  email: row.email,
  role: row.role,
  shop: row.shop_id !== null && row.shop_name !== null ? { id: row.shop_id, name: row.shop_name } : null,
  teams,
  since: row.created_at,
});

/** Everybody who belongs to the league now, by name, with the teams of managers. */
export async function listMemberships(tx: LeagueTx): Promise<Membership[]> {
  const rows = await membershipsOf(tx).orderBy('u.name').orderBy('u.id').orderBy('m.role').execute();
  const teams = await tx
    .selectFrom('membership_teams as mt')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'mt.league_id').onRef('t.id', '=', 'mt.team_id'),
    )
    .select(['mt.membership_id', 't.id', 't.name'])
    .where('mt.league_id', '=', tx.leagueId)
    .orderBy('t.name')
    .execute();
  return rows.map((row) =>
    present(
      row,
      teams.filter((team) => team.membership_id === row.id).map(({ id, name }) => ({ id, name })),
    ),
  );
}

/** One membership that has not ended, locked until the transaction does; undefined when there is none. */
export async function lockMembership(tx: LeagueTx, membershipId: string): Promise<Membership | undefined> {
  const row = await membershipsOf(tx).where('m.id', '=', membershipId).forUpdate('m').executeTakeFirst();
  return row && present(row, await listMembershipTeams(tx, row.id));
}

/** The membership of this kind that somebody with this address holds now, locked; undefined when there is none. */
export async function lockMembershipByEmail(
  tx: LeagueTx,
  held: { email: string; role: Role; shopId: string | null },
): Promise<Membership | undefined> {
  const row = await membershipsOf(tx)
    .where('u.email', '=', held.email)
    .where('m.role', '=', held.role)
    .where('m.shop_id', 'is not distinct from', held.shopId)
    .forUpdate('m')
    .executeTakeFirst();
  return row && present(row, await listMembershipTeams(tx, row.id));
}

function listMembershipTeams(tx: LeagueTx, membershipId: string): Promise<TeamName[]> {
  return tx
    .selectFrom('membership_teams as mt')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'mt.league_id').onRef('t.id', '=', 'mt.team_id'),
    )
    .select(['t.id', 't.name'])
    .where('mt.league_id', '=', tx.leagueId)
    .where('mt.membership_id', '=', membershipId)
    .orderBy('t.name')
    .execute();
}

/**
 * The ids of all memberships as league admin, locked in one order, so that two admins who end each other's at the same
 * moment wait for each other and the second finds one left.
 */
export async function lockAdmins(tx: LeagueTx): Promise<string[]> {
  const rows = await tx
    .selectFrom('memberships')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('role', '=', 'league admin')
    .where('ended_at', 'is', null)
    .orderBy('id')
    .forUpdate()
    .execute();
  return rows.map((row) => row.id);
}

/** Ends a membership; the database ends that person's sessions with it. False when it had ended before. */
export async function endMembership(tx: LeagueTx, membershipId: string, now: Date): Promise<boolean> {
  const done = await tx
    .updateTable('memberships')
    .set({ ended_at: now })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', membershipId)
    .where('ended_at', 'is', null)
    .executeTakeFirst();
  return done.numUpdatedRows === 1n;
}

/** Gives a person a role; when they hold it already nothing is written. Answers the id of the membership they hold now. */
export async function ensureMembership(
  tx: LeagueTx,
  membership: { id: string; userId: string; role: Role; shopId: string | null; now: Date },
): Promise<{ id: string; added: boolean }> {
  const done = await tx
    .insertInto('memberships')
    .values({
      league_id: tx.leagueId,
      id: membership.id,
      user_id: membership.userId,
      role: membership.role,
      shop_id: membership.shopId,
      created_at: membership.now,
    })
    .onConflict((conflict) => conflict.doNothing())
    .executeTakeFirst();
  if (done.numInsertedOrUpdatedRows === 1n) return { id: membership.id, added: true };
  const held = await tx
    .selectFrom('memberships')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('user_id', '=', membership.userId)
    .where('role', '=', membership.role)
    .where('shop_id', 'is not distinct from', membership.shopId)
    .where('ended_at', 'is', null)
    .forUpdate()
    .executeTakeFirstOrThrow();
  return { id: held.id, added: false };
}

/** Adds teams to a manager's; those held already stay as they are. */
export async function addMembershipTeams(
  tx: LeagueTx,
  membershipId: string,
  teamIds: readonly string[],
): Promise<void> {
  if (teamIds.length === 0) return;
  await tx
    .insertInto('membership_teams')
    .values(
      teamIds.map((teamId) => ({ league_id: tx.leagueId, membership_id: membershipId, team_id: teamId })),
    )
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

/** Takes teams away from a manager. */
export async function removeMembershipTeams(
  tx: LeagueTx,
  membershipId: string,
  teamIds: readonly string[],
): Promise<void> {
  if (teamIds.length === 0) return;
  await tx
    .deleteFrom('membership_teams')
    .where('league_id', '=', tx.leagueId)
    .where('membership_id', '=', membershipId)
    .where('team_id', 'in', [...teamIds])
    .execute();
}

/** Those of the ids that are teams of this league, by name; ids of other leagues are not found. */
export function listTeamNames(tx: LeagueTx, teamIds: readonly string[]): Promise<TeamName[]> {
  if (teamIds.length === 0) return Promise.resolve([]);
  return tx
    .selectFrom('teams')
    .select(['id', 'name'])
    .where('league_id', '=', tx.leagueId)
    .where('id', 'in', [...teamIds])
    .orderBy('name')
    .execute();
}

/** Every team of the league with its division and season, the latest season first. */
export function listTeamChoices(tx: LeagueTx) {
  return tx
    .selectFrom('teams as t')
    .innerJoin('divisions as d', (join) =>
      join.onRef('d.league_id', '=', 't.league_id').onRef('d.id', '=', 't.division_id'),
    )
    .innerJoin('seasons as s', (join) =>
      join.onRef('s.league_id', '=', 't.league_id').onRef('s.id', '=', 't.season_id'),
    )
    .select(['t.id', 't.name', 'd.name as division', 's.id as season_id', 's.name as season'])
    .where('t.league_id', '=', tx.leagueId)
    .orderBy('s.first_match_on', 'desc')
    .orderBy('d.position')
    .orderBy('t.name')
    .execute();
}

/** The shop of this name, whatever its case, made when there is none; `added` says which. */
export async function ensureShop(
  tx: LeagueTx,
  shop: { id: string; name: string; now: Date },
): Promise<{ id: string; added: boolean }> {
  const known = await tx
    .selectFrom('shops')
    .select(['id', 'name'])
    .where('league_id', '=', tx.leagueId)
    .execute();
  const same = known.find((entry) => entry.name.toLowerCase() === shop.name.toLowerCase());
  if (same) return { id: same.id, added: false };
  const done = await tx
    .insertInto('shops')
    .values({ league_id: tx.leagueId, id: shop.id, name: shop.name, created_at: shop.now })
    .onConflict((conflict) => conflict.columns(['league_id', 'name']).doNothing())
    .executeTakeFirst();
  if (done.numInsertedOrUpdatedRows === 1n) return { id: shop.id, added: true };
  const other = await tx
    .selectFrom('shops')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('name', '=', shop.name)
    .executeTakeFirstOrThrow();
  return { id: other.id, added: false };
}
