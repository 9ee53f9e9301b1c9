import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster, tellManagers } from '../roster-guards';
import type { reasonedStepSchema } from './roster-schemas';

/** Gives a roster back to its managers with the reason, and writes to each of them. */
export async function returnRoster(
  ctx: ActorContext,
  input: z.output<typeof reasonedStepSchema>,
): Promise<{ team: string; told: number }> {
  assertCan(ctx.actor, 'roster.return');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.return', input.rosterId);
    const { roster } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('return', locked);
    await moveRoster(tx, ctx, roster, {
      state,
      returnReason: input.reason,
      submitted: null,
      signedOff: null,
      ruleSetVersionId: null,
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'roster returned',
        subjectId: roster.id,
        data: { team: roster.team.name, reason: input.reason },
      },
    );
    const told = await tellManagers(tx, ctx, roster, (common) => ({
      template: 'roster-returned',
      params: { ...common, reason: input.reason },
    }));
    return { team: roster.team.name, told };
  });
}
