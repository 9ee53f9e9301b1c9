import { compileRuleSet, type CompiledRuleSet } from '../rules/compile-rule-set';
import { type RuleSet } from '../rules/rule-set';

/**
 * Every label a rule set lets players wear, reserved ones included, in wearing order: 00, 0, 1, 2 … The ranges less
 * what the digit set, the number of digits, leading zeros and the rule on 0 and 00 take away. Empty when the ranges
 * cannot be read.
 */
export const listAllowedLabels = (rules: RuleSet | CompiledRuleSet): readonly string[] =>
  compileRuleSet(rules).labels;
