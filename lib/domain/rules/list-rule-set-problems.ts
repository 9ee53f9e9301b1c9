import { parseAllowedLabels } from '../numbers/parse-labels';
import { compileRuleSet } from './compile-rule-set';
import { type RuleSet } from './rule-set';

/** What is wrong with a rule set although its shape is right: the part it is about and a whole sentence. */
export type RuleSetProblem = { part: 'labels' | 'reserved' | 'roster'; message: string };

/**
 * What would keep a rule set from being useful: labels that cannot be read, no label left to wear, numbers set aside
 * that cannot be read, a least above the most. Ask before a rule set is saved or used; empty when it is sound.
 */
export function listRuleSetProblems(ruleSet: RuleSet): RuleSetProblem[] {
  const compiled = compileRuleSet(ruleSet);
  const problems: RuleSetProblem[] = [];
  if (compiled.unreadableLabels !== null)
    problems.push({ part: 'labels', message: compiled.unreadableLabels });
  else if (compiled.labels.length === 0) {
    const message =
      'No number is left to wear: the digits, zeros and number of digits refuse the whole list.';
    problems.push({ part: 'labels', message });
  }
  for (const { labels } of ruleSet.reserved) {
    const parsed = parseAllowedLabels(labels);
    if (!parsed.ok) problems.push({ part: 'reserved', message: parsed.error });
  }
  const { least, most, requiredRoles } = ruleSet.roster;
  if (least > most) {
    problems.push({
      part: 'roster',
      message: `At least ${least} players can't be fewer than at most ${most}.`,
    });
  }
  const needed = requiredRoles.reduce((sum, { least: count }) => sum + count, 0);
  if (needed > most) {
    const message = `The roles need ${needed} players, and a roster holds at most ${most}.`;
    problems.push({ part: 'roster', message });
  }
  return problems;
}
