import { canonicalLabel, refuseForm, type LabelRefusal } from '../numbers/label-rules';
import { compareLabels, parseAllowedLabels, writeLabels } from '../numbers/parse-labels';
import { foldText } from '../text/normalise-text';
import { type RuleSet } from './rule-set';

/** Who may wear a label set aside: the roles as written, the same folded for comparing, and why. */
export type Reservation = {
  roles: readonly string[];
  folded: ReadonlySet<string>;
  /** True when no role may wear it. */
  keptBack: boolean;
  reason: string;
};

/** A rule set made ready for checking many rosters. Make it once with `compileRuleSet`; it holds no roster. */
export type CompiledRuleSet = {
  kind: 'compiled rule set';
  ruleSet: RuleSet;
  /** Every label that may be worn, reserved ones included, in wearing order: 00, 0, 1, 2 … */
  labels: readonly string[];
  allowed: ReadonlySet<string>;
  /** The same labels by the label they count as. */
  allowedKeys: ReadonlySet<string>;
  /** Whether two players of a team may not wear one number; false where the rule is off. */
  unique: boolean;
  /** Reservations by the label they count as; none where the rule is off. */
  reserved: ReadonlyMap<string, Reservation>;
  /** The allowed labels as a person would write them, or '' when that would be too long for a sentence. */
  says: string;
  /** Sentences about labels that could not be read; the check reports them instead of judging without them. */
  unreadableLabels: string | null;
  unreadableReserved: string | null;
};

const longestList = 60;
const compiledSets = new WeakMap<RuleSet, CompiledRuleSet>();

/**
 * Prepares a rule set for checking; the same object is prepared once and must not be changed afterwards. Labels that
 * cannot be read do not throw: they leave the list empty and a sentence in `unreadableLabels` or `unreadableReserved`.
 */
export function compileRuleSet(rules: RuleSet | CompiledRuleSet): CompiledRuleSet {
  if ('kind' in rules) return rules;
  const known = compiledSets.get(rules);
  if (known !== undefined) return known;
  const compiled = compile(rules);
  compiledSets.set(rules, compiled);
  return compiled;
}

function compile(ruleSet: RuleSet): CompiledRuleSet {
  const parsed = parseAllowedLabels(ruleSet.labels.allowed);
  const labels = parsed.ok ? keepWearable(ruleSet.labels, parsed.value) : [];
  const reserved = compileReserved(ruleSet);
  const says = writeLabels(labels);
  return {
    kind: 'compiled rule set',
    ruleSet,
    labels,
    allowed: new Set(labels),
    allowedKeys: new Set(labels.map((label) => canonicalLabel(ruleSet.labels, label))),
    unique: ruleSet.uniqueness.within === 'team' && ruleSet.uniqueness.weight !== 'off',
    reserved: ruleSet.reservedWeight === 'off' ? new Map() : reserved.byKey,
    says: says.length > longestList ? '' : says,
    unreadableLabels: parsed.ok ? null : parsed.error,
    unreadableReserved: reserved.error,
  };
}

function keepWearable(rules: RuleSet['labels'], labels: readonly string[]): string[] {
  const written = rules.leadingZeros === 'same as without' ? withoutZeros(rules, labels) : labels;
  return written.filter((label) => refuseForm(rules, label) === null);
}

/** Where 07 counts as 7 the list shows 7; 00 keeps its own entry. */
const withoutZeros = (rules: RuleSet['labels'], labels: readonly string[]): string[] => [
  ...new Set(
    labels.map((label) => (label === '00' ? label : canonicalLabel(rules, label))).sort(compareLabels),
  ),
];

function compileReserved(ruleSet: RuleSet): { byKey: Map<string, Reservation>; error: string | null } {
  const byKey = new Map<string, Reservation>();
  let error: string | null = null;
  for (const entry of ruleSet.reserved) {
    const labels = parseAllowedLabels(entry.labels);
    if (!labels.ok) error ??= labels.error;
    for (const label of labels.ok ? labels.value : []) {
      const key = canonicalLabel(ruleSet.labels, label);
      byKey.set(key, mergeReservation(byKey.get(key), entry));
    }
  }
  return { byKey, error };
}

/** Two entries for one label: any role of either may wear it, unless one of them keeps it from everybody. */
function mergeReservation(
  known: Reservation | undefined,
  entry: { roles: string[]; reason: string },
): Reservation {
  const roles = [...(known?.roles ?? []), ...entry.roles];
  return {
    roles,
    folded: new Set(roles.map(foldText)),
    keptBack: entry.roles.length === 0 || known?.keptBack === true,
    reason: entry.roles.length === 0 ? entry.reason : (known?.reason ?? entry.reason),
  };
}

/**
 * Why a label may not be worn under these rules, or null when it may. A label counts as allowed when the one it counts
 * as is allowed (07 where 7 is, if a leading zero counts for nothing). Reservations are judged with the roster.
 */
export function refuseLabel(rules: CompiledRuleSet, label: string): LabelRefusal | null {
  if (rules.allowed.has(label)) return null;
  const form = refuseForm(rules.ruleSet.labels, label);
  if (form !== null) return form;
  if (rules.allowedKeys.has(canonicalLabel(rules.ruleSet.labels, label))) return null;
  const list = rules.says === '' ? '' : ` (${rules.says})`;
  return { code: 'number-not-allowed', message: `${label} is not one of the allowed numbers${list}.` };
}
