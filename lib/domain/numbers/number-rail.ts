import { type RosterLine } from '../roster/player';
import { nameRows, readRoster, type RosterContext } from '../rules/checks/roster-context';
import { compileRuleSet, refuseLabel, type CompiledRuleSet } from '../rules/compile-rule-set';
import { type RuleSet } from '../rules/rule-set';
import { tidyText } from '../text/normalise-text';
import { joinWords } from '../text/sentence';
import { canonicalLabel } from './label-rules';
import { compareLabels } from './parse-labels';

/** What a label of the number rail is: free, worn once, set aside and unworn, worn by several, or not allowed. */
export type RailState = 'free' | 'taken' | 'kept back' | 'twice' | 'refused';

/** One label of the rail. `rows` are the players who wear it, counted from 0; `reason` is a whole sentence. */
export type RailEntry = { label: string; state: RailState; rows: readonly number[]; reason: string };

/** The highest label drawn when the rules allow no higher one. */
const usualHighest = 99;

/**
 * The number rail of a roster: 00, then every number from 0 to the end of the row of ten that holds the highest
 * allowed one (at most 99 unless the rules allow more), then whatever else the rules name or players wear, in wearing
 * order. Where several players may share a number it is `taken` however many wear it.
 */
export function buildNumberRail(
  rules: RuleSet | CompiledRuleSet,
  players: readonly RosterLine[],
): RailEntry[] {
  const compiled = compileRuleSet(rules);
  const context = readRoster(compiled, players, []);
  return listRailLabels(context).map((label) => describeEntry(context, label));
}

function listRailLabels({ rules, readings }: RosterContext): string[] {
  const highest = Number(rules.labels.at(-1) ?? usualHighest);
  const end = Math.floor(highest / 10) * 10 + 9;
  const labels = new Set(['00', ...Array.from({ length: end + 1 }, (_, value) => String(value))]);
  for (const label of rules.labels) labels.add(label);
  for (const reading of readings) {
    if (reading.ok && !labels.has(canonicalLabel(rules.ruleSet.labels, reading.label)))
      labels.add(reading.label);
  }
  return [...labels].sort(compareLabels);
}

function describeEntry(context: RosterContext, label: string): RailEntry {
  const { rules, rowsByKey } = context;
  const key = canonicalLabel(rules.ruleSet.labels, label);
  const rows = rowsByKey.get(key) ?? [];
  const entry = (state: RailState, reason: string): RailEntry => ({ label, state, rows, reason });

  const refusal = refuseLabel(rules, label);
  if (refusal !== null) return entry('refused', refusal.message);
  const clash = clashOfZeros(context, key);
  if (clash !== null) return entry(rows.length > 0 ? 'twice' : 'refused', clash);
  if (rows.length > 1 && rules.unique)
    return entry('twice', `${label} is worn by ${nameRows(context, rows)}.`);
  if (rows.length > 0) return entry('taken', `${label} is worn by ${nameRows(context, rows)}.`);

  const reservation = rules.reserved.get(key);
  if (reservation === undefined) return entry('free', `${label} is free.`);
  const reason = tidyText(reservation.reason).replace(/\.$/, '');
  const whom = reservation.keptBack ? 'kept back' : `kept for the role ${joinWords(reservation.roles, 'or')}`;
  return entry('kept back', `${label} is ${whom}: ${reason}.`);
}

/** Where 0 and 00 may not both be worn: the sentence for one of them while the other is worn, or null. */
function clashOfZeros(context: RosterContext, key: string): string | null {
  const { rules, rowsByKey } = context;
  if (rules.ruleSet.labels.zeroAndDoubleZero !== 'not both' || (key !== '0' && key !== '00')) return null;
  const other = key === '0' ? '00' : '0';
  const rows = rowsByKey.get(other);
  if (rows === undefined) return null;
  const names = nameRows(context, rows);
  return `0 and 00 may not both be on one roster, and ${names} ${rows.length === 1 ? 'wears' : 'wear'} ${other}.`;
}
