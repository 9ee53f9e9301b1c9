import { listDivisionsByRuleSet, listRuleSets, listRuleSetVersions } from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { findVisibleDivisions } from '../visible-divisions';

/**
 * One rule set with all its versions, newest first, and the divisions of every season that play by it. For somebody who
 * sees only own teams it exists while one of their divisions plays by it.
 */
export async function getRuleSet(ctx: ActorContext, input: { ruleSetId: string }) {
  assertCan(ctx.actor, 'rule-set.read');
  return withLeague(ctx.league.id, async (tx) => {
    const ruleSet = (await listRuleSets(tx)).find((entry) => entry.id === input.ruleSetId);
    if (!ruleSet) throw notFound('rule set');
    const visible = await findVisibleDivisions(tx, ctx, 'rule-set.read');
    const divisions = (await listDivisionsByRuleSet(tx)).filter(
      (division) => division.ruleSetId === ruleSet.id && (visible?.has(division.id) ?? true),
    );
    if (visible !== null && divisions.length === 0) throw notFound('rule set');
    const mayChange = can(ctx.actor, 'rule-set.write');
    const versions = await listRuleSetVersions(tx, [ruleSet.id]);
    return {
      ...ruleSet,
      mayChange,
      // Unfinished rules are the league admin's desk, not yet anybody's to play by.
      versions: versions.filter((version) => mayChange || version.state !== 'draft'),
      divisions,
    };
  });
}
export type RuleSetDetail = Awaited<ReturnType<typeof getRuleSet>>;
