import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster } from '../roster-guards';
import type { rosterStepSchema } from './roster-schemas';

/** Takes a submitted roster back so that it can be edited again. */
export async function withdrawRoster(
  ctx: ActorContext,
  input: z.output<typeof rosterStepSchema>,
): Promise<{ team: string }> {
  assertCan(ctx.actor, 'roster.submit');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.submit', input.rosterId);
    const { roster } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('withdraw', locked);
    await moveRoster(tx, ctx, roster, { state, submitted: null });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'roster withdrawn', subjectId: roster.id, data: { team: roster.team.name } },
    );
    return { team: roster.team.name };
  });
}
