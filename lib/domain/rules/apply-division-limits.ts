import type { RuleSet } from './rule-set';

/** The rule set as one division plays it: the same rules with the division's own least and most players. */
export function applyDivisionLimits(
  ruleSet: RuleSet,
  limits: { leastPlayers: number; mostPlayers: number },
): RuleSet {
  return { ...ruleSet, roster: { ...ruleSet.roster, least: limits.leastPlayers, most: limits.mostPlayers } };
}
