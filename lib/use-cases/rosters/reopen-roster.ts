import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster } from '../roster-guards';
import type { reasonedStepSchema } from './roster-schemas';

/** Undoes a sign-off or a freeze that no batch holds; the reason stands on the page and in the history. */
export async function reopenRoster(
  ctx: ActorContext,
  input: z.output<typeof reasonedStepSchema>,
): Promise<{ team: string }> {
  assertCan(ctx.actor, 'roster.sign-off');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.sign-off', input.rosterId);
    const { roster } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('reopen', locked);
    await moveRoster(tx, ctx, roster, {
      state,
      returnReason: input.reason,
      submitted: null,
      signedOff: null,
      frozenAt: null,
      ruleSetVersionId: null,
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'roster reopened',
        subjectId: roster.id,
        data: { team: roster.team.name, reason: input.reason },
      },
    );
    return { team: roster.team.name };
  });
}
