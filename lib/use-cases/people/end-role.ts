import { insertAuditEvent } from '@/db/queries/audit';
import { endMembership, lockAdmins, lockMembership } from '@/db/queries/memberships';
import { withLeague } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/**
 * Ends one role of one person. They are signed out everywhere by it. The last league admin stays, whoever asks and
 * however many ask at the same moment: a league nobody can run is lost.
 */
export async function endRole(
  ctx: ActorContext,
  input: { membershipId: string },
): Promise<{ person: string; role: string }> {
  assertCan(ctx.actor, 'people.manage');
  return withLeague(ctx.league.id, async (tx) => {
    const admins = await lockAdmins(tx);
    const membership = await lockMembership(tx, input.membershipId);
    if (!membership) throw notFound('membership');
    if (membership.role === 'league admin' && admins.length < 2) {
      throw new AppError(
        'conflict',
        `${membership.name} is the only league admin. Invite another one first, then end this membership.`,
      );
    }
    await endMembership(tx, membership.id, ctx.now);
    const { name: person, role } = membership;
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'membership ended', subjectId: membership.id, data: { role, person } },
    );
    return { person, role };
  });
}
