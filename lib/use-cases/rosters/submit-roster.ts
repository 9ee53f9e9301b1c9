import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster } from '../roster-guards';
import type { rosterStepSchema } from './roster-schemas';

/** Hands a roster without blockers to the league, exactly as the person saw it. */
export async function submitRoster(
  ctx: ActorContext,
  input: z.output<typeof rosterStepSchema>,
): Promise<{ team: string; players: number }> {
  assertCan(ctx.actor, 'roster.submit');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.submit', input.rosterId);
    const { roster, players } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('submit', locked);
    const submitted = { at: ctx.now, userId: ctx.actor.userId };
    await moveRoster(tx, ctx, roster, { state, submitted, returnReason: null });
    const data = { team: roster.team.name, players: players.length };
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'roster submitted', subjectId: roster.id, data },
    );
    return data;
  });
}
