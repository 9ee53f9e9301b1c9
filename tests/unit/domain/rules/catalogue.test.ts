import { describe, expect, it } from 'vitest';
import { findCataloguePreset, listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { settledParts } from '@/lib/domain/rules/catalogue/catalogue-preset';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import { listRuleSetProblems } from '@/lib/domain/rules/list-rule-set-problems';
import { citationSchema, ruleSetSchema } from '@/lib/domain/rules/rule-set';
import { makeRuleSet } from '../../../factories/rule-set';

const presets = listCataloguePresets();

describe('the rule catalogue', () => {
  it('has at least four codes of at least three sports, each under an id of its own', () => {
    expect(presets.length).toBeGreaterThanOrEqual(4);
    expect(new Set(presets.map(({ sport }) => sport)).size).toBeGreaterThanOrEqual(3);
    expect(new Set(presets.map(({ id }) => id)).size).toBe(presets.length);
    expect(findCataloguePreset('basketball-nfhs')?.sport).toBe('basketball');
    expect(findCataloguePreset('constructor')).toBeUndefined();
  });

  it.each(presets)('$id is a sound rule set', ({ ruleSet }) => {
    expect(ruleSetSchema.parse(ruleSet)).toEqual(ruleSet);
    expect(listRuleSetProblems(ruleSet)).toEqual([]);
  });

  it.each(presets)(
    '$id cites a source or says that it is open for every part',
    ({ citations, open, ruleSet }) => {
      for (const { settles: _s, says, ...citation } of citations) {
        citationSchema.parse(citation);
        expect(says).toMatch(/\.$/);
      }
      expect(ruleSet.citations).toHaveLength(citations.length);
      const settled = new Set(citations.flatMap(({ settles }) => settles));
      const custom = citations.filter(({ known }) => known === 'common practice');
      expect(open.length).toBeGreaterThanOrEqual(settledParts.length - settled.size - custom.length);
      expect(open.every((sentence) => sentence.endsWith('.'))).toBe(true);
    },
  );

  it.each(presets)('$id names no address and tells the league to check its book', (preset) => {
    expect(JSON.stringify(preset)).not.toMatch(/https?:|www\./);
    expect(preset.checkYourBook).toMatch(/^Check the current .* before you rely on this/);
  });

  it('leaves what no source says neutral: no roster limits, names let in', () => {
    for (const { ruleSet } of presets) {
      expect(ruleSet.roster).toMatchObject({ least: 0, most: 200, requiredRoles: [] });
      expect(ruleSet.names.onBack).toBe('allowed');
    }
  });
});

describe('describeRuleSet', () => {
  it('says the rules as a coordinator would', () => {
    const rules = makeRuleSet({
      labels: {
        allowed: '0-5, 00',
        digits: '012345',
        digitsReason: 'shown on hands',
        zeroAndDoubleZero: 'not both',
      },
      reserved: [{ labels: '3', roles: [], reason: 'kept back' }],
      roster: { least: 8, most: 12, requiredRoles: [{ role: 'captain', least: 1 }] },
      names: { onBack: 'wanted', mostLetters: 11, letters: 'latin', sharedSurnameNeedsInitial: true },
      sizes: { weight: 'off' },
    });
    expect(describeRuleSet(rules)).toEqual([
      'Players wear 0, 00, 1–5.',
      'Only the digits 0–5: shown on hands.',
      'A leading zero, as in 07, is refused.',
      '0 and 00 may not both be on one roster.',
      'No two players of a team wear the same number.',
      '3 is for nobody: kept back.',
      'A roster holds 8 to 12 players.',
      'At least 1 player with the role captain.',
      'Every player needs a name on the back, at most 11 Latin letters. This only cautions.',
      'Two players with the same name on the back each need an initial.',
      'Sizes are not checked.',
    ]);
  });
});

describe('listRuleSetProblems', () => {
  const problems = (changes: Parameters<typeof makeRuleSet>[0]) =>
    listRuleSetProblems(makeRuleSet(changes)).map(({ part, message }) => `${part}: ${message}`);

  it('finds nothing in a sound rule set', () => {
    expect(problems({})).toEqual([]);
  });

  it.each([
    [{ labels: { allowed: '9-3' } }, 'labels: “9-3” runs backwards. Write 3-9.'],
    [
      { labels: { allowed: '6-9', digits: '012345' } },
      'labels: No number is left to wear: the digits, zeros and number of digits refuse the whole list.',
    ],
    [
      { reserved: [{ labels: 'x', roles: [], reason: 'y' }] },
      'reserved: “x” is neither a number nor a range. Write it like 7, 00 or 10-15.',
    ],
    [{ roster: { least: 9, most: 8 } }, "roster: At least 9 players can't be fewer than at most 8."],
    [
      { roster: { most: 1, requiredRoles: [{ role: 'libero', least: 2 }] } },
      'roster: The roles need 2 players, and a roster holds at most 1.',
    ],
  ])('tells %o', (changes, sentence) => {
    expect(problems(changes)).toEqual([sentence]);
  });
});
