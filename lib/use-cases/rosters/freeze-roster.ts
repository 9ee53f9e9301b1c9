import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster } from '../roster-guards';
import type { rosterStepSchema } from './roster-schemas';

/** Freezes a signed-off roster before its date. */
export async function freezeRoster(
  ctx: ActorContext,
  input: z.output<typeof rosterStepSchema>,
): Promise<{ team: string }> {
  assertCan(ctx.actor, 'roster.sign-off');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.sign-off', input.rosterId);
    const { roster } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('freeze', locked);
    await moveRoster(tx, ctx, roster, { state, frozenAt: ctx.now });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'roster frozen', subjectId: roster.id, data: { team: roster.team.name, because: 'person' } },
    );
    return { team: roster.team.name };
  });
}
