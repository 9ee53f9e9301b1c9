import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertDraft, listRuleSetVersions, lockRuleSet, updateDraft } from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { listRuleSetProblems } from '@/lib/domain/rules/list-rule-set-problems';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { saveDraftSchema } from './rule-set-schemas';

/** Saves the draft of a rule set, or starts the next one. Rules in force stay as they are until a draft replaces them. */
export async function saveDraft(
  ctx: ActorContext,
  input: z.output<typeof saveDraftSchema>,
): Promise<{ rowVersion: number; version: number }> {
  assertCan(ctx.actor, 'rule-set.write');
  const [problem] = listRuleSetProblems(input.ruleSet);
  if (problem)
    throw new AppError('invalid', problem.message, { fields: { [problem.part]: problem.message } });
  return withLeague(ctx.league.id, async (tx) => {
    const known = await lockRuleSet(tx, input.ruleSetId);
    if (!known) throw notFound('rule set');
    const versions = await listRuleSetVersions(tx, [known.id]);
    const draft = versions.find((version) => version.state === 'draft');
    const ruleSet = { ...input.ruleSet, name: known.name };
    if ((draft?.rowVersion ?? null) !== input.rowVersion) {
      throw new AppError(
        'conflict',
        'Somebody saved a draft of these rules since you opened them. Your entries are kept here; reload to see theirs.',
      );
    }
    const number = draft?.version ?? (versions[0]?.version ?? 0) + 1;
    const before = draft?.ruleSet ?? versions.find((version) => version.state === 'in force')?.ruleSet;
    if (draft) await updateDraft(tx, { id: draft.id, rowVersion: draft.rowVersion, ruleSet });
    else
      await insertDraft(tx, {
        id: ctx.newId(),
        ruleSetId: known.id,
        version: number,
        ruleSet,
        now: ctx.now,
        userId: ctx.actor.userId,
      });
    const changes = before && listDifferences(before, ruleSet);
    if (changes) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        {
          type: 'rule set drafted',
          subjectId: known.id,
          data: { name: known.name, version: number, changes },
        },
      );
    }
    return { rowVersion: draft ? draft.rowVersion + 1 : 1, version: number };
  });
}
