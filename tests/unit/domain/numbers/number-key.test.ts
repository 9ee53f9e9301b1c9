import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberKey } from '@/lib/domain/numbers/number-key';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { makeLine, makeRuleSet } from '../../../factories/rule-set';
import { anyText, ruleSet } from '../../../support/arbitrary-rosters';

describe('numberKey', () => {
  it('tells 07 from 7 and 00 from 0 unless the rules say they are the same', () => {
    const apart = makeRuleSet();
    expect(['07', '7', '00', '0'].map((text) => numberKey(apart, text))).toEqual(['07', '7', '00', '0']);
    const same = makeRuleSet({
      labels: { leadingZeros: 'same as without', zeroAndDoubleZero: 'one value' },
    });
    expect(['07', '7', '00', '0'].map((text) => numberKey(same, text))).toEqual(['7', '7', '0', '0']);
  });

  it('reads the number first', () => {
    expect(numberKey(makeRuleSet(), 'No. 7')).toBe(numberKey(makeRuleSet(), '７'));
  });

  it('is null for a blank and for what cannot be read', () => {
    expect(numberKey(makeRuleSet(), ' ')).toBeNull();
    expect(numberKey(makeRuleSet(), '7 or 9')).toBeNull();
  });

  it.each([
    { within: 'none', weight: 'blocker' },
    { within: 'team', weight: 'caution' },
    { within: 'team', weight: 'off' },
  ] as const)('is null where a repeated number may be signed off: %o', (uniqueness) => {
    expect(numberKey(makeRuleSet({ uniqueness }), '7')).toBeNull();
  });

  it('is the same for two numbers exactly when the check blocks them as repeated', () => {
    const number = fc.oneof(fc.constantFrom('0', '00', '000', '7', '07', '007', '7.0', '٧'), anyText);
    fc.assert(
      fc.property(ruleSet, number, number, (rules, a, b) => {
        const key = numberKey(rules, a);
        const players = [makeLine({ name: 'One', number: a }), makeLine({ name: 'Two', number: b })];
        const repeated = checkRoster(rules, players, []).findings.some(
          ({ code, severity }) => code === 'number-repeated' && severity === 'blocker',
        );
        expect(repeated).toBe(key !== null && key === numberKey(rules, b));
      }),
    );
  });
});
