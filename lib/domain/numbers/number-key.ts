import { compileRuleSet, type CompiledRuleSet } from '../rules/compile-rule-set';
import { type RuleSet } from '../rules/rule-set';
import { canonicalLabel } from './label-rules';
import { readNumber } from './label';

/**
 * The key that two numbers share when a team may not wear both: 07 and 7 where a leading zero counts for nothing, 0
 * and 00 where they are one value. Null when the number is blank or unreadable, and when these rules would let a
 * roster with a repeated number be signed off (no uniqueness asked, or asked only as a caution). At most 20 digits.
 */
export function numberKey(rules: RuleSet | CompiledRuleSet, text: string): string | null {
  const { ruleSet } = compileRuleSet(rules);
  if (ruleSet.uniqueness.within === 'none' || ruleSet.uniqueness.weight !== 'blocker') return null;
  const reading = readNumber(text);
  return reading.ok ? canonicalLabel(ruleSet.labels, reading.label) : null;
}
