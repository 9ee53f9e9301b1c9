import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { setNumberKeys } from '@/db/queries/players';
import { withLeague } from '@/db/tenant';
import { numberKey } from '@/lib/domain/numbers/number-key';
import { AppError } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { assertRevision, assertStep, lockRosterFor, moveRoster, tellManagers } from '../roster-guards';
import type { rosterStepSchema } from './roster-schemas';

/**
 * Signs a submitted roster off under the rules in force, and writes to its managers. From here on the database itself
 * refuses a second player with the same number.
 */
export async function signOffRoster(
  ctx: ActorContext,
  input: z.output<typeof rosterStepSchema>,
): Promise<{ team: string; players: number; told: number }> {
  assertCan(ctx.actor, 'roster.sign-off');
  return withLeague(ctx.league.id, async (tx) => {
    const locked = await lockRosterFor(tx, ctx, 'roster.sign-off', input.rosterId);
    const { roster, players, division } = locked;
    assertRevision(roster, input.revision);
    const state = assertStep('sign off', locked);
    const rules = division.rules;
    if (rules === null) throw new Error('a roster was judged without rules');

    const keys = players.map(({ id, number }) => ({ id, key: numberKey(rules.ruleSet, number) }));
    const repeated = keys.find(
      ({ key }, row) => key !== null && keys.some((other, at) => at < row && other.key === key),
    );
    if (repeated) {
      throw new AppError('conflict', `Two players of ${roster.team.name} wear ${repeated.key}. Change one.`);
    }
    await setNumberKeys(tx, roster.id, keys);
    await moveRoster(tx, ctx, roster, {
      state,
      ruleSetVersionId: rules.versionId,
      signedOff: { at: ctx.now, userId: ctx.actor.userId },
      returnReason: null,
    });
    const data = { team: roster.team.name, players: players.length };
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'roster signed off', subjectId: roster.id, data },
    );
    const told = await tellManagers(tx, ctx, roster, (params) => ({ template: 'roster-signed-off', params }));
    return { ...data, told };
  });
}
