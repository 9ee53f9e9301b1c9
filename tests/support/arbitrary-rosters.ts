import fc from 'fast-check';
import type { RosterLine } from '@/lib/domain/roster/player';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { makeRuleSet } from '../factories/rule-set';

/** Text of every kind: plain, any Unicode, lone surrogates, right-to-left, joined emoji, long. */
export const anyText = fc.oneof(
  fc.string({ maxLength: 20 }),
  fc.string({ unit: 'grapheme', maxLength: 20 }),
  fc.string({ unit: 'binary', maxLength: 20 }),
  fc.string({
    unit: fc.integer({ min: 0, max: 0xffff }).map((unit) => String.fromCharCode(unit)),
    maxLength: 8,
  }),
  fc.constantFrom(
    '',
    ' ',
    '\u200f',
    'مريم',
    'e\u0301',
    'e\u200b\u0301',
    '👩‍👩‍👧',
    '=1+1',
    '٧',
    '７',
    'Ñ'.repeat(80),
    '__proto__',
  ),
);

const numberText = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: 0, max: 30 }).map(String) },
  { weight: 2, arbitrary: fc.constantFrom('0', '00', '07', '000', '7.0', '#5', '', '٧') },
  { weight: 1, arbitrary: anyText },
);

export const rosterLine: fc.Arbitrary<RosterLine> = fc.record({
  name: fc.oneof(fc.constantFrom('Calloway, Ines', 'Pip Dunmore', 'Al Brook', 'Brook, Ann', ''), anyText),
  nameOnBack: fc.oneof(fc.constantFrom('BROOK', 'CALLOWAY', 'DUNMORE-ELLERY', ''), anyText),
  number: numberText,
  role: fc.oneof(fc.constantFrom('', 'goalkeeper', 'GOALKEEPER ', 'captain'), anyText),
  sizes: fc.oneof(
    fc.constantFrom<Record<string, string>>({}, { jersey: 'YM' }, { jersey: '2XL' }),
    fc.dictionary(fc.constantFrom('jersey', 'shorts', 'constructor'), anyText),
  ),
});

export const roster = fc.array(rosterLine, { maxLength: 14 });

const weight = fc.constantFrom<RuleSet['sizes']['weight']>('blocker', 'caution', 'off');

/** Rule sets over the whole shape, most of them sensible. */
export const ruleSet: fc.Arbitrary<RuleSet> = fc
  .record({
    labels: fc.record({
      allowed: fc.constantFrom(
        '0, 00, 1-99',
        '0, 00, 1-5, 10-15, 20-25',
        '1-20',
        '0-12, 07',
        '4-15',
        '00, 1-999',
        'x',
      ),
      digits: fc.constantFrom(null, '012345', '7'),
      mostDigits: fc.integer({ min: 1, max: 3 }),
      leadingZeros: fc.constantFrom<RuleSet['labels']['leadingZeros']>(
        'refused',
        'same as without',
        'allowed',
      ),
      zeroAndDoubleZero: fc.constantFrom<RuleSet['labels']['zeroAndDoubleZero']>(
        'both and different',
        'not both',
        'one value',
        'neither',
      ),
      weight,
    }),
    uniqueness: fc.record({ within: fc.constantFrom<'team' | 'none'>('team', 'none'), weight }),
    reserved: fc.constantFrom<RuleSet['reserved']>(
      [],
      [{ labels: '1', roles: ['goalkeeper'], reason: 'kept for goalkeepers' }],
      [
        { labels: '3, 20-22', roles: [], reason: 'kept back' },
        { labels: '0', roles: ['captain'], reason: 'kept for captains' },
      ],
      [{ labels: 'nonsense', roles: [], reason: 'nobody can read this' }],
    ),
    reservedWeight: weight,
    roster: fc.record({
      least: fc.integer({ min: 0, max: 9 }),
      most: fc.integer({ min: 1, max: 9 }),
      weight,
    }),
    names: fc.record({
      onBack: fc.constantFrom<RuleSet['names']['onBack']>('wanted', 'allowed', 'not allowed'),
      mostLetters: fc.integer({ min: 1, max: 12 }),
      letters: fc.constantFrom<RuleSet['names']['letters']>('any', 'latin'),
      sharedSurnameNeedsInitial: fc.boolean(),
      weight,
    }),
    sizes: fc.record({ weight }),
  })
  .map(makeRuleSet);
