import { type Garment, type RosterLine } from '../roster/player';
import { checkNamesOnBack } from './checks/check-names-on-back';
import { checkNumbers } from './checks/check-numbers';
import { checkPlayerNames } from './checks/check-player-names';
import { checkReserved } from './checks/check-reserved';
import { checkRosterSize } from './checks/check-roster-size';
import { checkSizes } from './checks/check-sizes';
import { checkUniqueness } from './checks/check-uniqueness';
import { checkZeros } from './checks/check-zeros';
import { type Check, readRoster } from './checks/roster-context';
import { compileRuleSet, type CompiledRuleSet } from './compile-rule-set';
import { findingCodes, findingFieldSchema, type CheckSummary, type Finding } from './finding';
import { type RuleSet } from './rule-set';

const checks: readonly Check[] = [
  checkRosterSize,
  checkPlayerNames,
  checkNamesOnBack,
  checkNumbers,
  checkUniqueness,
  checkZeros,
  checkReserved,
  checkSizes,
];

export type RosterCheck = { findings: Finding[]; summary: CheckSummary };

/**
 * Checks a roster against a rule set and says everything that is wrong with it. Total: any text in any cell gets
 * findings, never an exception. Findings about the whole roster come first, then by row, by field (name, name on back,
 * number, role, sizes in the garments' order) and by code; the same input always gives the same answer. Rows count
 * from 0. Without garments no size is checked. A finding weighs what its rule weighs in the rule set.
 */
export function checkRoster(
  rules: RuleSet | CompiledRuleSet,
  players: readonly RosterLine[],
  garments: readonly Garment[],
): RosterCheck {
  const context = readRoster(compileRuleSet(rules), players, garments);
  const findings: Finding[] = [];
  for (const check of checks) check(context, findings);
  if (findings.length > 1) findings.sort(compareFindings);
  return { findings, summary: summarise(findings, players.length) };
}

const fieldOrder = new Map(findingFieldSchema.options.map((field, i) => [field, i]));
const codeOrder = new Map(findingCodes.map((code, i) => [code, i]));

/** Sorting is stable, so sizes keep the order of the garments within one code. */
const compareFindings = (a: Finding, b: Finding): number =>
  (a.row ?? -1) - (b.row ?? -1) ||
  (fieldOrder.get(a.field) ?? 0) - (fieldOrder.get(b.field) ?? 0) ||
  (a.field === 'sizes' ? 0 : (codeOrder.get(a.code) ?? 0) - (codeOrder.get(b.code) ?? 0));

function summarise(findings: readonly Finding[], players: number): CheckSummary {
  const summary = { players, blockers: 0, cautions: 0, notes: 0, clean: players };
  const marked = new Set<number>();
  for (const finding of findings) {
    if (finding.severity === 'blocker') summary.blockers += 1;
    else if (finding.severity === 'caution') summary.cautions += 1;
    else summary.notes += 1;
    if (finding.row !== null) marked.add(finding.row);
  }
  summary.clean = players - marked.size;
  return summary;
}
