import {
  listDivisionsByRuleSet,
  listRuleSets as readRuleSets,
  listRuleSetVersions,
} from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';

/** The league's rule sets, each with the version in force, its draft if there is one, and the divisions that play by it. */
export async function listRuleSets(ctx: ActorContext) {
  assertCan(ctx.actor, 'rule-set.read');
  return withLeague(ctx.league.id, async (tx) => {
    const ruleSets = await readRuleSets(tx);
    const versions = await listRuleSetVersions(
      tx,
      ruleSets.map((ruleSet) => ruleSet.id),
    );
    const divisions = await listDivisionsByRuleSet(tx);
    const current = ctx.league.currentSeason?.id;
    return ruleSets.map((ruleSet) => {
      const own = versions.filter((version) => version.ruleSetId === ruleSet.id);
      return {
        ...ruleSet,
        inForce: own.find((version) => version.state === 'in force') ?? null,
        draft: own.find((version) => version.state === 'draft') ?? null,
        divisions: divisions
          .filter((division) => division.ruleSetId === ruleSet.id && division.seasonId === current)
          .map((division) => division.name),
      };
    });
  });
}
export type RuleSetList = Awaited<ReturnType<typeof listRuleSets>>;
