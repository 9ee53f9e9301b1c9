import { findInvitationByToken, listInvitations } from '@/db/queries/invitations';
import { findLeagueName } from '@/db/queries/leagues';
import { findAccountByEmail } from '@/db/queries/people';
import { withEmail, withLeague, withToken } from '@/db/tenant';
import type { Role } from '@/lib/domain/access/permissions';
import { formatInstant } from '@/lib/domain/dates/format';
import { hashToken } from '@/lib/platform/ids';
import type { RequestContext } from '../context';

export type OpenInvitation = {
  state: 'open';
  league: string;
  slug: string;
  email: string;
  role: Role;
  teams: string[];
  shop: string | null;
  invitedBy: string;
  expires: string;
  /** Whoever holds the link owns the address, so they may know. */
  hasAccount: boolean;
};
export type FoundInvitation =
  OpenInvitation | { state: 'accepted' | 'withdrawn' | 'expired'; league: string } | { state: 'unknown' };

/** What the link of an invitation stands for, and what became of it. */
export async function findInvitation(ctx: RequestContext, token: string): Promise<FoundInvitation> {
  const tokenHash = hashToken(token);
  const found = await withToken(tokenHash, (tx) => findInvitationByToken(tx, tokenHash));
  if (!found) return { state: 'unknown' };
  const { league, invitation } = await withLeague(found.league_id, async (tx) => ({
    league: await findLeagueName(tx),
    invitation: (await listInvitations(tx)).find((entry) => entry.id === found.id),
  }));
  if (!league) return { state: 'unknown' };
  if (found.accepted_at !== null) return { state: 'accepted', league: league.name };
  if (found.revoked_at !== null || !invitation) return { state: 'withdrawn', league: league.name };
  if (found.expires_at <= ctx.now) return { state: 'expired', league: league.name };
  const account = await withEmail(found.email, (tx) => findAccountByEmail(tx, found.email));
  return {
    state: 'open',
    league: league.name,
    slug: league.slug,
    email: found.email,
    role: found.role,
    teams: invitation.teams.map((team) => team.name),
    shop: invitation.shop?.name ?? null,
    invitedBy: invitation.invitedBy,
    expires: formatInstant(invitation.expiresAt, league.timeZone),
    hasAccount: account !== undefined,
  };
}
