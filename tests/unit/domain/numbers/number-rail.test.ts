import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { listAllowedLabels } from '@/lib/domain/numbers/allowed-labels';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import { readNumber } from '@/lib/domain/numbers/label';
import { canonicalLabel } from '@/lib/domain/numbers/label-rules';
import { makeLines, makeRuleSet } from '../../../factories/rule-set';
import { roster, ruleSet } from '../../../support/arbitrary-rosters';

const digits = makeRuleSet({
  labels: {
    allowed: '0, 00, 1-5, 10-15, 20-25, 30-35, 40-45, 50-55',
    digits: '012345',
    zeroAndDoubleZero: 'not both',
  },
  reserved: [
    { labels: '23', roles: [], reason: 'Kept for next season.' },
    { labels: '40', roles: ['captain'], reason: 'worn by captains' },
  ],
});
const entryOf = (label: string, numbers: string[], rules = digits) =>
  buildNumberRail(rules, makeLines(...numbers)).find((entry) => entry.label === label);

describe('buildNumberRail', () => {
  it('starts with 00 and ends with the row of ten that holds the highest allowed number', () => {
    const labels = buildNumberRail(digits, []).map((entry) => entry.label);
    expect(labels.slice(0, 3)).toEqual(['00', '0', '1']);
    expect(labels.at(-1)).toBe('59');
    expect(labels).toHaveLength(61);
  });

  it('goes past 99 only when the rules do', () => {
    expect(buildNumberRail(makeRuleSet(), []).at(-1)?.label).toBe('99');
    const long = makeRuleSet({ labels: { allowed: '1-120', mostDigits: 3 } });
    expect(buildNumberRail(long, []).at(-1)?.label).toBe('129');
  });

  it('shows a number a player wears although the rules end before it', () => {
    expect(entryOf('77', ['77'])).toMatchObject({ state: 'refused', rows: [0] });
  });

  it('says of every state why it is so', () => {
    expect(entryOf('12', [])).toEqual({ label: '12', state: 'free', rows: [], reason: '12 is free.' });
    expect(entryOf('12', ['12'])).toMatchObject({ state: 'taken', reason: '12 is worn by Dunamore.' });
    expect(entryOf('12', ['12', '3', '12'])).toEqual({
      label: '12',
      state: 'twice',
      rows: [0, 2],
      reason: '12 is worn by Dunamore and Duncmore.',
    });
    expect(entryOf('23', [])).toMatchObject({
      state: 'kept back',
      reason: '23 is kept back: Kept for next season.',
    });
    expect(entryOf('40', [])?.reason).toBe('40 is kept for the role captain: worn by captains.');
    expect(entryOf('26', [])).toMatchObject({
      state: 'refused',
      reason: '26 has the digit 6, and only 0–5 are allowed.',
    });
  });

  it('refuses 00 while 0 is worn where both may not be', () => {
    expect(entryOf('00', ['0'])).toMatchObject({ state: 'refused', rows: [] });
    expect(entryOf('00', ['0', '00'])).toMatchObject({ state: 'twice', rows: [1] });
  });

  it('counts 00 as taken by 0 where they are one value', () => {
    const rules = makeRuleSet({ labels: { zeroAndDoubleZero: 'one value' } });
    expect(entryOf('00', ['0'], rules)).toMatchObject({ state: 'taken', rows: [0] });
  });

  it('calls a number taken, not twice, where players may share it', () => {
    const rules = makeRuleSet({ uniqueness: { within: 'none' } });
    expect(entryOf('12', ['12', '12'], rules)).toMatchObject({ state: 'taken', rows: [0, 1] });
  });

  it('splits every roster into allowed and refused labels, shows each label once and loses no readable number', () => {
    fc.assert(
      fc.property(ruleSet, roster, (rules, players) => {
        const rail = buildNumberRail(rules, players);
        const labels = rail.map((entry) => entry.label);
        expect(new Set(labels).size).toBe(labels.length);
        const allowed = new Set(listAllowedLabels(rules));
        const keys = [...allowed].map((label) => canonicalLabel(rules.labels, label));
        for (const { label, state, reason } of rail) {
          if (state === 'free' || state === 'kept back')
            expect(keys).toContain(canonicalLabel(rules.labels, label));
          if (allowed.has(label) && state === 'refused') expect(reason).toContain('may not both');
        }
        for (const label of allowed) expect(labels).toContain(label);
        players.forEach((player, row) => {
          if (readNumber(player.number).ok) expect(rail.some((entry) => entry.rows.includes(row))).toBe(true);
        });
      }),
    );
  });
});
