import { canonicalLabel } from '../../numbers/label-rules';
import { foldText } from '../../text/normalise-text';
import { type RosterContext } from './roster-context';

const mostSuggestions = 3;
/** Without a number to be near to, offers count up from 1: players rarely wish for 0. Common practice, no source. */
const belowOne = 0.5;

/**
 * Whether a label would leave this row without any number finding: allowed, not worn by another row, kept for no
 * other role, and not the second of 0 and 00 where both may not be worn.
 */
export function isFreeFor(context: RosterContext, row: number, label: string): boolean {
  const { rules, players } = context;
  const key = canonicalLabel(rules.ruleSet.labels, label);
  if (!rules.allowedKeys.has(key)) return false;
  if (rules.unique && isWornByOther(context, row, key)) return false;
  if (rules.ruleSet.labels.zeroAndDoubleZero === 'not both') {
    if (key === '0' && isWornByOther(context, row, '00')) return false;
    if (key === '00' && isWornByOther(context, row, '0')) return false;
  }
  const reservation = rules.reserved.get(key);
  if (reservation === undefined) return true;
  return !reservation.keptBack && reservation.folded.has(foldText(players[row]?.role ?? ''));
}

const isWornByOther = (context: RosterContext, row: number, key: string): boolean =>
  (context.rowsByKey.get(key) ?? []).some((other) => other !== row);

/**
 * Up to three labels that are free for a row, nearest by value to `near`, the lower first when two are as near, and only
 * one of labels that count as the same. With `near` null the lowest from 1 up, then 0 and 00.
 */
export function suggestFreeLabels(context: RosterContext, row: number, near: string | null): string[] {
  const { labels, ruleSet } = context.rules;
  const target = near === null ? belowOne : Number(near);
  const found: string[] = [];
  const keys = new Set<string>();
  let below = labels.length - 1;
  while (below >= 0 && Number(labels[below]) > target) below -= 1;
  let above = below + 1;
  while (found.length < mostSuggestions && (below >= 0 || above < labels.length)) {
    const low = labels[below];
    const high = labels[above];
    const nearer = near !== null && target - Number(low) <= Number(high) - target;
    const takeLow = low !== undefined && (high === undefined || nearer);
    const label = takeLow ? low : high;
    if (takeLow) below -= 1;
    else above += 1;
    if (label === undefined) continue;
    const key = canonicalLabel(ruleSet.labels, label);
    if (keys.has(key) || !isFreeFor(context, row, label)) continue;
    keys.add(key);
    found.push(label);
  }
  return found;
}

/** Of the labels found inside something unreadable, those that are free for the row, at most three. */
export function suggestParts(context: RosterContext, row: number, parts: readonly string[]): string[] {
  const { allowed } = context.rules;
  return [...new Set(parts)]
    .filter((label) => allowed.has(label) && isFreeFor(context, row, label))
    .slice(0, mostSuggestions);
}
