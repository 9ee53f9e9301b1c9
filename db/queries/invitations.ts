import type { Role } from '@/lib/domain/access/permissions';
import type { LeagueTx, TokenTx } from '../tenant';
import type { TeamName } from './memberships';

/** An invitation nobody has accepted or withdrawn; it may be past its date. */
export type Invitation = {
  id: string;
  email: string;
  role: Role;
  shop: { id: string; name: string } | null;
  teams: TeamName[];
  invitedBy: string;
  createdAt: Date;
  expiresAt: Date;
};

const pendingInvitations = (tx: LeagueTx) =>
  tx
    .selectFrom('invitations as i')
    .leftJoin('users as u', 'u.id', 'i.invited_by')
    .leftJoin('shops as s', (join) =>
      join.onRef('s.league_id', '=', 'i.league_id').onRef('s.id', '=', 'i.shop_id'),
    )
    .select([
      'i.id',
      'i.email',
      'i.role',
      'i.shop_id',
      's.name as shop_name',
      'u.name as invited_by',
      'i.created_at',
      'i.expires_at',
    ])
    .where('i.league_id', '=', tx.leagueId)
    .where('i.accepted_at', 'is', null)
    .where('i.revoked_at', 'is', null);

type Row = Awaited<ReturnType<ReturnType<typeof pendingInvitations>['execute']>>[number];

async function present(tx: LeagueTx, rows: Row[]): Promise<Invitation[]> {
  if (rows.length === 0) return [];
  const teams = await tx
    .selectFrom('invitation_teams as it')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'it.league_id').onRef('t.id', '=', 'it.team_id'),
    )
    .select(['it.invitation_id', 't.id', 't.name'])
    .where('it.league_id', '=', tx.leagueId)
    .where(
      'it.invitation_id',
      'in',
      rows.map((row) => row.id),
    )
    .orderBy('t.name')
    .execute();
  return rows.map((row) => ({
    id: row.id,
    email: row.email,
    role: row.role,
    shop: row.shop_id !== null && row.shop_name !== null ? { id: row.shop_id, name: row.shop_name } : null,
    teams: teams.filter((team) => team.invitation_id === row.id).map(({ id, name }) => ({ id, name })),
    invitedBy: row.invited_by ?? 'A league admin',
    createdAt: row.created_at,
    expiresAt: row.expires_at,
  }));
}

/** The invitations that are still out, the newest first. */
export async function listInvitations(tx: LeagueTx): Promise<Invitation[]> {
  return present(tx, await pendingInvitations(tx).orderBy('i.created_at', 'desc').orderBy('i.id').execute());
}

/** One invitation that is still out, locked until the transaction ends; undefined when it is not. */
export async function lockInvitation(tx: LeagueTx, invitationId: string): Promise<Invitation | undefined> {
  const rows = await pendingInvitations(tx).where('i.id', '=', invitationId).forUpdate('i').execute();
  return (await present(tx, rows))[0];
}

/** The invitation of this kind that is still out to this address, locked; undefined when there is none. */
export async function lockSameInvitation(
  tx: LeagueTx,
  same: { email: string; role: Role; shopId: string | null },
): Promise<Invitation | undefined> {
  const rows = await pendingInvitations(tx)
    .where('i.email', '=', same.email)
    .where('i.role', '=', same.role)
    .where('i.shop_id', 'is not distinct from', same.shopId)
    .orderBy('i.created_at', 'desc')
    .limit(1)
    .forUpdate('i')
    .execute();
  return (await present(tx, rows))[0];
}

/** Adds an invitation; of its link only the hash is kept. */
export async function insertInvitation(
  tx: LeagueTx,
  invitation: {
    id: string;
    email: string;
    role: Role;
    shopId: string | null;
    tokenHash: string;
    invitedBy: string;
    now: Date;
    expiresAt: Date;
  },
): Promise<void> {
  await tx
    .insertInto('invitations')
    .values({
      league_id: tx.leagueId,
      id: invitation.id,
      email: invitation.email,
      role: invitation.role,
      shop_id: invitation.shopId,
      token_hash: invitation.tokenHash,
      invited_by: invitation.invitedBy,
      created_at: invitation.now,
      expires_at: invitation.expiresAt,
    })
    .execute();
}

/** Names the teams an invitation brings; those named before stay. */
export async function addInvitationTeams(
  tx: LeagueTx,
  invitationId: string,
  teamIds: readonly string[],
): Promise<void> {
  if (teamIds.length === 0) return;
  await tx
    .insertInto('invitation_teams')
    .values(
      teamIds.map((teamId) => ({ league_id: tx.leagueId, invitation_id: invitationId, team_id: teamId })),
    )
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

/** Gives an invitation a new link and date; the link sent before opens nothing from then on. */
export async function renewInvitation(
  tx: LeagueTx,
  renewal: { id: string; tokenHash: string; expiresAt: Date },
): Promise<void> {
  await tx
    .updateTable('invitations')
    .set({ token_hash: renewal.tokenHash, expires_at: renewal.expiresAt })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', renewal.id)
    .execute();
}

/** Withdraws an invitation that is still out; false when it is not. */
export async function withdrawInvitation(tx: LeagueTx, invitationId: string, now: Date): Promise<boolean> {
  const done = await tx
    .updateTable('invitations')
    .set({ revoked_at: now })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', invitationId)
    .where('accepted_at', 'is', null)
    .where('revoked_at', 'is', null)
    .executeTakeFirst();
  return done.numUpdatedRows === 1n;
}

/** The invitation this transaction's link belongs to, whatever became of it; undefined for a link nobody was sent. */
export function findInvitationByToken(tx: TokenTx, tokenHash: string) {
  return tx
    .selectFrom('invitations')
    .select(['league_id', 'id', 'email', 'role', 'expires_at', 'accepted_at', 'revoked_at'])
    .where('token_hash', '=', tokenHash)
    .executeTakeFirst();
}

/** Uses the link up and answers what it brings; undefined when it was used, withdrawn, renewed or is past its date. */
export function takeInvitation(tx: LeagueTx, tokenHash: string, now: Date) {
  return tx
    .updateTable('invitations')
    .set({ accepted_at: now })
    .where('league_id', '=', tx.leagueId)
    .where('token_hash', '=', tokenHash)
    .where('accepted_at', 'is', null)
    .where('revoked_at', 'is', null)
    .where('expires_at', '>', now)
    .returning(['id', 'email', 'role', 'shop_id'])
    .executeTakeFirst();
}

/** The teams an invitation brings, by name. */
export function listInvitationTeams(tx: LeagueTx, invitationId: string): Promise<TeamName[]> {
  return tx
    .selectFrom('invitation_teams as it')
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'it.league_id').onRef('t.id', '=', 'it.team_id'),
    )
    .select(['t.id', 't.name'])
    .where('it.league_id', '=', tx.leagueId)
    .where('it.invitation_id', '=', invitationId)
    .orderBy('t.name')
    .execute();
}
