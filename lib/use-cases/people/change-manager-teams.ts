import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { queueEmail } from '@/db/queries/jobs';
import { addMembershipTeams, lockMembership, removeMembershipTeams } from '@/db/queries/memberships';
import { withLeague } from '@/db/tenant';
import { joinWords } from '@/lib/domain/text/sentence';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { links } from '../links';
import { assertTeams } from '../people-guards';
import type { changeManagerTeamsSchema } from './people-schemas';

/** Names the teams a manager looks after, at least one; new ones are told to them by e-mail. */
export async function changeManagerTeams(
  ctx: ActorContext,
  input: z.output<typeof changeManagerTeamsSchema>,
): Promise<{ added: string[]; removed: string[] }> {
  assertCan(ctx.actor, 'people.manage');
  return withLeague(ctx.league.id, async (tx) => {
    const membership = await lockMembership(tx, input.membershipId);
    if (!membership) throw notFound('membership');
    if (membership.role !== 'team manager') {
      throw new AppError('conflict', `${membership.name} is ${membership.role}: only a manager has teams.`);
    }
    const wanted = await assertTeams(tx, input.teamIds);
    const added = wanted.filter((team) => !membership.teams.some((held) => held.id === team.id));
    const removed = membership.teams.filter((held) => !wanted.some((team) => team.id === held.id));
    const change = { added: added.map((team) => team.name), removed: removed.map((team) => team.name) };
    if (added.length + removed.length === 0) return change;
    await addMembershipTeams(
      tx,
      membership.id,
      added.map((team) => team.id),
    );
    await removeMembershipTeams(
      tx,
      membership.id,
      removed.map((team) => team.id),
    );
    if (added.length > 0) {
      const params = {
        league: ctx.league.name,
        teams: joinWords(change.added),
        addedBy: ctx.actor.name,
        link: links.league(ctx.league.slug),
      };
      await queueEmail(tx, ctx, membership.email, { template: 'teams-added', params });
    }
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'manager teams changed',
        subjectId: membership.id,
        data: { person: membership.name, ...change },
      },
    );
    return change;
  });
}
