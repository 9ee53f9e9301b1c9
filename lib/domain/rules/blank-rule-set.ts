import type { RuleSet } from './rule-set';

/** A rule set of the league's own to start from: any number to 99, no two alike, nothing else decided yet. */
export const makeBlankRuleSet = (name: string, sport: string): RuleSet => ({
  name,
  sport,
  labels: {
    allowed: '0, 00, 1–99',
    digits: null,
    digitsReason: '',
    mostDigits: 2,
    leadingZeros: 'refused',
    zeroAndDoubleZero: 'both and different',
    weight: 'blocker',
  },
  uniqueness: { within: 'team', weight: 'blocker' },
  reserved: [],
  reservedWeight: 'blocker',
  roster: { least: 0, most: 200, requiredRoles: [], weight: 'blocker' },
  names: {
    onBack: 'allowed',
    mostLetters: 12,
    letters: 'any',
    sharedSurnameNeedsInitial: false,
    weight: 'caution',
  },
  sizes: { weight: 'caution' },
  citations: [],
});
