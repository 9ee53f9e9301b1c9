import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertDraft, insertRuleSet, listRuleSets } from '@/db/queries/rule-sets';
import { lockCurrentSeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { makeBlankRuleSet } from '@/lib/domain/rules/blank-rule-set';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { startRuleSetSchema } from './rule-set-schemas';

/** Starts a rule set as a draft: from a preset of the catalogue with its citations, or from nothing. */
export async function startRuleSet(
  ctx: ActorContext,
  input: z.output<typeof startRuleSetSchema>,
): Promise<{ ruleSetId: string }> {
  assertCan(ctx.actor, 'rule-set.write');
  const preset = input.presetId === null ? null : findCataloguePreset(input.presetId);
  if (preset === undefined) throw notFound('preset in the catalogue');
  return withLeague(ctx.league.id, async (tx) => {
    // The league's row is the lock: of two presses at once, the second finds the name taken.
    await lockCurrentSeason(tx);
    const taken = (await listRuleSets(tx)).some(
      (ruleSet) => ruleSet.name.toLowerCase() === input.name.toLowerCase(),
    );
    if (taken) {
      const message = `There is a rule set called ${input.name} already. Choose another name, or draft a new version of it.`;
      throw new AppError('conflict', message, { fields: { name: message } });
    }
    const ruleSetId = ctx.newId();
    const ruleSet = preset
      ? { ...preset.ruleSet, name: input.name }
      : makeBlankRuleSet(input.name, input.sport);
    await insertRuleSet(tx, { id: ruleSetId, name: input.name, presetId: input.presetId, now: ctx.now });
    await insertDraft(tx, {
      id: ctx.newId(),
      ruleSetId,
      version: 1,
      ruleSet,
      now: ctx.now,
      userId: ctx.actor.userId,
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'rule set started', subjectId: ruleSetId, data: { name: input.name, preset: input.presetId } },
    );
    return { ruleSetId };
  });
}
