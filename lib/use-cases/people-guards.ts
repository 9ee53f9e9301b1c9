import { insertAuditEvent } from '@/db/queries/audit';
import { takeInvitation, listInvitationTeams } from '@/db/queries/invitations';
import { queueEmail } from '@/db/queries/jobs';
import { addMembershipTeams, ensureMembership, listTeamNames, type TeamName } from '@/db/queries/memberships';
import type { LeagueTx } from '@/db/tenant';
import type { Role } from '@/lib/domain/access/permissions';
import { formatInstant } from '@/lib/domain/dates/format';
import { joinWords } from '@/lib/domain/text/sentence';
import { AppError, notFound } from '@/lib/platform/errors';
import type { RequestContext } from './context';
import { links } from './links';

/** How long an invitation can be accepted. Our own figure. */
const daysValid = 14;
export const expiryOfInvitation = (now: Date): Date => new Date(now.getTime() + daysValid * 86_400_000);

/** The chosen teams by name; ends the use case when one of them is not a team of this league. */
export async function assertTeams(tx: LeagueTx, teamIds: readonly string[]): Promise<TeamName[]> {
  const wanted = new Set(teamIds);
  const teams = await listTeamNames(tx, [...wanted]);
  if (teams.length !== wanted.size) throw notFound('team');
  return teams;
}

/** Queues the letter with an invitation's link; the link itself is nowhere else. */
export async function mailInvitation(
  tx: LeagueTx,
  ctx: RequestContext & { league: { name: string; timeZone: string }; actor: { name: string } },
  invitation: { email: string; role: Role; teams: readonly TeamName[]; token: string; expiresAt: Date },
): Promise<void> {
  await queueEmail(tx, ctx, invitation.email, {
    template: 'invitation',
    params: {
      league: ctx.league.name,
      role: invitation.role,
      teams: joinWords(invitation.teams.map((team) => team.name)),
      invitedBy: ctx.actor.name,
      link: links.join(invitation.token),
      expires: `until ${formatInstant(invitation.expiresAt, ctx.league.timeZone)}`,
    },
  });
}

/**
 * Uses an invitation's link up and gives the person its role; a manager who is one already gets the teams added. The
 * caller has made sure that the person owns the address it was sent to.
 */
export async function joinLeague(
  tx: LeagueTx,
  ctx: RequestContext,
  input: { tokenHash: string; userId: string; email: string },
): Promise<void> {
  const invitation = await takeInvitation(tx, input.tokenHash, ctx.now);
  if (!invitation || invitation.email !== input.email) {
    throw new AppError(
      'conflict',
      'This invitation was accepted, withdrawn or replaced a moment ago, or it is too old. Ask your league admin to send it again.',
    );
  }
  const membership = await ensureMembership(tx, {
    id: ctx.newId(),
    userId: input.userId,
    role: invitation.role,
    shopId: invitation.shop_id,
    now: ctx.now,
  });
  const teams = await listInvitationTeams(tx, invitation.id);
  await addMembershipTeams(
    tx,
    membership.id,
    teams.map((team) => team.id),
  );
  await insertAuditEvent(
    tx,
    { ...ctx, userId: input.userId },
    { type: 'invitation accepted', subjectId: membership.id, data: { role: invitation.role } },
  );
}
