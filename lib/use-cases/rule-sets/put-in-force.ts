import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listRuleSetVersions, lockRuleSet, putDraftInForce } from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { toDay } from '@/lib/domain/dates/zone';
import { listRuleSetProblems } from '@/lib/domain/rules/list-rule-set-problems';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { putInForceSchema } from './rule-set-schemas';

/** Puts the draft of a rule set in force from today; the version before is superseded in the same transaction and kept. */
export async function putInForce(
  ctx: ActorContext,
  input: z.output<typeof putInForceSchema>,
): Promise<{ version: number }> {
  assertCan(ctx.actor, 'rule-set.write');
  return withLeague(ctx.league.id, async (tx) => {
    const known = await lockRuleSet(tx, input.ruleSetId);
    if (!known) throw notFound('rule set');
    const draft = (await listRuleSetVersions(tx, [known.id])).find((version) => version.state === 'draft');
    if (!draft) throw notFound('draft');
    if (draft.rowVersion !== input.rowVersion) {
      throw new AppError(
        'conflict',
        'The draft was changed since you opened it. Reload and look at it once more before it is put in force.',
      );
    }
    const [problem] = listRuleSetProblems(draft.ruleSet);
    if (problem) throw new AppError('invalid', problem.message);
    await putDraftInForce(tx, {
      id: draft.id,
      ruleSetId: known.id,
      from: toDay(ctx.now, ctx.league.timeZone),
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'rule set put in force',
        subjectId: known.id,
        data: { name: known.name, version: draft.version },
      },
    );
    return { version: draft.version };
  });
}
