import { insertAuditEvent } from '@/db/queries/audit';
import { deleteDraft, listRuleSetVersions, lockRuleSet } from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Discards the draft of a rule set; the version in force stays. The only version of a rule set can't be discarded. */
export async function discardDraft(
  ctx: ActorContext,
  input: { ruleSetId: string },
): Promise<{ version: number }> {
  assertCan(ctx.actor, 'rule-set.write');
  return withLeague(ctx.league.id, async (tx) => {
    const known = await lockRuleSet(tx, input.ruleSetId);
    if (!known) throw notFound('rule set');
    const versions = await listRuleSetVersions(tx, [known.id]);
    const draft = versions.find((version) => version.state === 'draft');
    if (!draft) throw notFound('draft');
    if (versions.length === 1)
      throw new AppError('conflict', 'This draft is the only version of its rule set. Change it instead.');
    await deleteDraft(tx, draft.id);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'rule set draft discarded',
        subjectId: known.id,
        data: { name: known.name, version: draft.version },
      },
    );
    return { version: draft.version };
  });
}
