import { describe, expect, it } from 'vitest';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { makeLine } from '../factories/rule-set';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: UEFA Equipment Regulations, edition of 1 June 2024, Art. 10 (numbers) and the article on names, read: whole
 * numbers up to 99; number 1 only for a goalkeeper; names in the Latin alphabet. Zero is not mentioned in it.
 */
const preset = 'football-uefa-2024';

describe('UEFA Equipment Regulations 2024, Art. 10', () => {
  it('lets a goalkeeper wear 1 to 99', () => {
    const legal = Array.from({ length: 99 }, (_, i) => String(i + 1));
    expect(listLegalAlone(preset, 'Goalkeeper')).toEqual(legal);
  });
  it('keeps 1, and only 1, from outfield players', () => {
    expect(judgeNumbers(preset, ['1'], 'defender')).toEqual(['number-reserved']);
    expect(judgeNumbers(preset, ['2', '10', '99'], 'defender')).toEqual([]);
  });
  it('asks for the role of a player who wears 1 without one', () => {
    expect(judgeNumbers(preset, ['1'])).toEqual(['number-needs-role']);
  });
  it.each(['100', '7.5', '007'])('does not let a player wear %s', (number) => {
    expect(judgeNumbers(preset, [number], 'defender')).toHaveLength(1);
  });
});

describe('UEFA Equipment Regulations 2024, article on names', () => {
  const judgeName = (nameOnBack: string): string[] => {
    const rules = findCataloguePreset(preset)?.ruleSet;
    if (rules === undefined) throw new Error('no preset');
    return checkRoster(rules, [makeLine({ nameOnBack })], []).findings.map(({ code }) => code);
  };
  it.each(['DUNMORE', 'ÅSBERG', 'ŁĄCKI', "O'BROOK"])('lets a player wear %s', (name) => {
    expect(judgeName(name)).toEqual([]);
  });
  it.each(['ΔΟΥΚΑΣ', 'БРУК', 'مريم'])('does not let a player wear %s', (name) => {
    expect(judgeName(name)).toEqual(['name-letters']);
  });
});
