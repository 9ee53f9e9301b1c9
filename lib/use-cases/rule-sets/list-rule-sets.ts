import {
  listDivisionsByRuleSet,
  listRuleSets as readRuleSets,
  listRuleSetVersions,
} from '@/db/queries/rule-sets';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { assertCan, type ActorContext } from '../context';
import { findVisibleDivisions } from '../visible-divisions';

/**
 * The rule sets the person may see, each with the version in force, its draft if there is one, and the divisions that
 * play by it. Drafts are for those who write them.
 */
export async function listRuleSets(ctx: ActorContext) {
  assertCan(ctx.actor, 'rule-set.read');
  return withLeague(ctx.league.id, async (tx) => {
    const ruleSets = await readRuleSets(tx);
    const mayChange = can(ctx.actor, 'rule-set.write');
    const visible = await findVisibleDivisions(tx, ctx, 'rule-set.read');
    const versions = await listRuleSetVersions(
      tx,
      ruleSets.map((ruleSet) => ruleSet.id),
    );
    const divisions = (await listDivisionsByRuleSet(tx)).filter(
      (division) => visible?.has(division.id) ?? true,
    );
    const current = ctx.league.currentSeason?.id;
    const entries = ruleSets.map((ruleSet) => {
      const own = versions.filter((version) => version.ruleSetId === ruleSet.id);
      return {
        ...ruleSet,
        inForce: own.find((version) => version.state === 'in force') ?? null,
        draft: (mayChange && own.find((version) => version.state === 'draft')) || null,
        divisions: divisions
          .filter((division) => division.ruleSetId === ruleSet.id && division.seasonId === current)
          .map((division) => division.name),
      };
    });
    if (mayChange) return entries;
    const played = new Set(divisions.map((division) => division.ruleSetId));
    return entries.filter((entry) => entry.inForce && (visible === null || played.has(entry.id)));
  });
}
