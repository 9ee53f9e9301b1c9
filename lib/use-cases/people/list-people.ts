import { listShops } from '@/db/queries/batches';
import { listInvitations } from '@/db/queries/invitations';
import { listMemberships, listTeamChoices } from '@/db/queries/memberships';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';

/** Everybody of the league, the invitations still out, and what an invitation can name. */
export async function listPeople(ctx: ActorContext) {
  assertCan(ctx.actor, 'people.read');
  return withLeague(ctx.league.id, async (tx) => {
    const memberships = await listMemberships(tx);
    const invitations = await listInvitations(tx);
    return {
      memberships,
      invitations: invitations.map((invitation) => ({
        ...invitation,
        expired: invitation.expiresAt <= ctx.now,
      })),
      admins: memberships.filter((membership) => membership.role === 'league admin').length,
      teams: await listTeamChoices(tx),
      shops: await listShops(tx),
    };
  });
}
