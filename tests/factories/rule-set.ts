import type { Garment, RosterLine } from '@/lib/domain/roster/player';
import { ruleSetSchema, type RuleSet } from '@/lib/domain/rules/rule-set';

/** Changes to a rule set, part by part. */
export type RuleSetChanges = {
  [Part in keyof RuleSet]?: RuleSet[Part] extends unknown[] | string ? RuleSet[Part] : Partial<RuleSet[Part]>;
};

/** A valid rule set that lets nearly everything in, with the parts a test is about changed. */
export function makeRuleSet(changes: RuleSetChanges = {}): RuleSet {
  return ruleSetSchema.parse({
    name: 'Invented rules',
    sport: 'basketball',
    reservedWeight: 'blocker',
    reserved: changes.reserved ?? [],
    citations: [],
    labels: {
      allowed: '0, 00, 1-99',
      digits: null,
      digitsReason: '',
      mostDigits: 2,
      leadingZeros: 'refused',
      zeroAndDoubleZero: 'both and different',
      weight: 'blocker',
      ...changes.labels,
    },
    uniqueness: { within: 'team', weight: 'blocker', ...changes.uniqueness },
    roster: { least: 0, most: 200, requiredRoles: [], weight: 'blocker', ...changes.roster },
    names: {
      onBack: 'allowed',
      mostLetters: 40,
      letters: 'any',
      sharedSurnameNeedsInitial: false,
      weight: 'caution',
      ...changes.names,
    },
    sizes: { weight: 'caution', ...changes.sizes },
    ...(changes.reservedWeight === undefined ? {} : { reservedWeight: changes.reservedWeight }),
  });
}

/** A roster line that gives no finding under `makeRuleSet()` as long as its number and name are not repeated. */
export const makeLine = (line: Partial<RosterLine> = {}): RosterLine => ({
  name: 'Calloway, Ines',
  nameOnBack: 'CALLOWAY',
  number: '14',
  role: '',
  sizes: {},
  ...line,
});

/** One line for each number, each with a name of its own. */
export const makeLines = (...numbers: string[]): RosterLine[] =>
  numbers.map((number, i) => {
    const surname = `Dun${'abcdefghijklmnopqrstuvwxyz'.charAt(i % 26)}more`;
    return makeLine({ name: `${surname}, Pip`, nameOnBack: surname.toUpperCase(), number });
  });

/** A jersey offered in three youth sizes and one adult size. */
export const jersey: Garment = {
  code: 'jersey',
  name: 'Jersey',
  worn: 'home and away',
  numbered: true,
  named: true,
  sizes: [
    { code: 'YS', label: 'Youth small' },
    { code: 'YM', label: 'Youth medium' },
    { code: 'YL', label: 'Youth large' },
    { code: 'AS', label: 'Adult small' },
  ],
};
