import { insertAuditEvent } from '@/db/queries/audit';
import { lockInvitation, renewInvitation } from '@/db/queries/invitations';
import { withLeague } from '@/db/tenant';
import { hashToken, newToken } from '@/lib/platform/ids';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { expiryOfInvitation, mailInvitation } from '../people-guards';
import { invitationBudget, spend } from '../rate-budgets';

/** Sends an invitation once more, with a new link and a new date; the link sent before opens nothing from then on. */
export async function resendInvitation(
  ctx: ActorContext,
  input: { invitationId: string },
): Promise<{ email: string }> {
  assertCan(ctx.actor, 'people.manage');
  await spend(invitationBudget, ctx.league.id, 'This league has sent 300 invitations within an hour.');
  return withLeague(ctx.league.id, async (tx) => {
    const invitation = await lockInvitation(tx, input.invitationId);
    if (!invitation) throw notFound('invitation');
    const { id, email, role, teams } = invitation;
    const token = newToken();
    const expiresAt = expiryOfInvitation(ctx.now);
    await renewInvitation(tx, { id, tokenHash: hashToken(token), expiresAt });
    await mailInvitation(tx, ctx, { email, role, teams, token, expiresAt });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'invitation sent again', subjectId: id, data: { role, email } },
    );
    return { email };
  });
}
