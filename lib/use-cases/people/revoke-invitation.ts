import { insertAuditEvent } from '@/db/queries/audit';
import { lockInvitation, withdrawInvitation } from '@/db/queries/invitations';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Withdraws an invitation that nobody has accepted: its link says so from then on. */
export async function revokeInvitation(
  ctx: ActorContext,
  input: { invitationId: string },
): Promise<{ email: string }> {
  assertCan(ctx.actor, 'people.manage');
  return withLeague(ctx.league.id, async (tx) => {
    const invitation = await lockInvitation(tx, input.invitationId);
    if (!invitation) throw notFound('invitation');
    const { id, role, email } = invitation;
    await withdrawInvitation(tx, id, ctx.now);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'invitation withdrawn', subjectId: id, data: { role, email } },
    );
    return { email };
  });
}
