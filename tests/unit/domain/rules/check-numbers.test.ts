import { describe, expect, it } from 'vitest';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { makeLine, makeLines, makeRuleSet, type RuleSetChanges } from '../../../factories/rule-set';

const signals: RuleSetChanges = {
  labels: {
    allowed: '0, 00, 1-5, 10-15, 20-25',
    digits: '012345',
    digitsReason: 'officials show digits on their hands.',
    zeroAndDoubleZero: 'not both',
  },
};
const check = (changes: RuleSetChanges, ...numbers: string[]) =>
  checkRoster(makeRuleSet(changes), makeLines(...numbers), []).findings;

describe('numbers that cannot be worn', () => {
  it('asks for a missing number by name and offers the lowest free ones', () => {
    expect(check({}, '1', '')).toEqual([
      {
        code: 'number-missing',
        severity: 'blocker',
        row: 1,
        field: 'number',
        message: 'Dunbmore has no number yet.',
        suggestions: ['2', '3', '4'],
      },
    ]);
  });

  it('quotes an unreadable number and offers what it found inside, if free', () => {
    expect(check({}, '9', '7 or 9')).toMatchObject([
      {
        code: 'number-unreadable',
        message: '“7 or 9” holds more than one number. Write digits only, such as 7 or 00.',
        suggestions: ['7'],
      },
    ]);
  });

  it.each([
    [
      '26',
      'digit-not-allowed',
      '26 has the digit 6, and only 0–5 are allowed: officials show digits on their hands.',
    ],
    ['103', 'too-many-digits', '103 has 3 digits, and at most 2 digits are allowed.'],
    ['05', 'leading-zero', '05 starts with a zero, and a leading zero is not allowed.'],
    ['33', 'number-not-allowed', '33 is not one of the allowed numbers (0, 00, 1–5, 10–15, 20–25).'],
  ])('tells for %s the most telling reason only: %s', (number, code, message) => {
    expect(check(signals, number)).toMatchObject([{ code, message, row: 0, field: 'number' }]);
  });

  it('offers the nearest free allowed labels by value, lower first when as near, three at most', () => {
    expect(check(signals, '26', '24')[0]?.suggestions).toEqual(['25', '23', '22']);
    expect(check({ labels: { allowed: '1-99' } }, '50', '50')[0]?.suggestions).toEqual(['49', '51', '48']);
  });

  it('offers only one of two labels that count as the same', () => {
    const rules: RuleSetChanges = { labels: { allowed: '0, 00, 1-3', zeroAndDoubleZero: 'one value' } };
    expect(check(rules, '1', '2', '3', '4').at(-1)?.suggestions).toEqual(['0']);
  });

  it('weighs what the rule set says and is silent when the rule is off', () => {
    expect(check({ labels: { weight: 'caution' } }, '100')).toMatchObject([{ severity: 'caution' }]);
    expect(check({ labels: { weight: 'off' } }, '100', '', 'seven')).toEqual([]);
  });

  it('reports allowed numbers that cannot be read once, and does not call every number wrong', () => {
    expect(check({ labels: { allowed: 'all' } }, '7', '8')).toMatchObject([
      { code: 'number-not-allowed', row: null, field: 'roster', severity: 'blocker' },
    ]);
  });
});

describe('repeated numbers', () => {
  it('tells each player whose number it also is', () => {
    const findings = check({}, '14', '3', '14');
    expect(findings.map(({ row, message }) => [row, message])).toEqual([
      [0, "14 is also Duncmore's."],
      [2, "14 is also Dunamore's."],
    ]);
  });

  it('names three players at most', () => {
    expect(check({}, '5', '5', '5', '5', '5', '5')[0]?.message).toBe(
      "5 is also Dunbmore's, Duncmore's, Dundmore's and 2 others.",
    );
  });

  it('says that two labels count as one where they do', () => {
    const rules: RuleSetChanges = { labels: { leadingZeros: 'same as without' } };
    expect(check(rules, '07', '7').map(({ message }) => message)).toEqual([
      "07 counts as the same number as Dunbmore's.",
      "7 counts as the same number as Dunamore's.",
    ]);
    expect(check({ labels: { zeroAndDoubleZero: 'one value' } }, '0', '00')).toHaveLength(2);
  });

  it('finds 7.0, No. 7 and ٧ to be one number', () => {
    expect(check({}, '7.0', 'No. 7', '٧').map(({ code }) => code)).toEqual(Array(3).fill('number-repeated'));
  });

  it('lets players share a number where the rules do', () => {
    expect(check({ uniqueness: { within: 'none' } }, '7', '7')).toEqual([]);
    expect(check({ uniqueness: { weight: 'off' } }, '7', '7')).toEqual([]);
  });

  it('uses given names when two players have one surname, and rows when there is no name', () => {
    const players = [
      makeLine({ name: 'Al Brook', number: '7' }),
      makeLine({ name: 'Brook, Ann', number: '7' }),
      makeLine({ name: '', number: '7' }),
    ];
    const { findings } = checkRoster(makeRuleSet(), players, []);
    const repeated = findings.filter(({ code }) => code === 'number-repeated');
    expect(repeated.map(({ message }) => message)).toEqual([
      "7 is also Ann Brook's and row 3's.",
      "7 is also Al Brook's and row 3's.",
      "7 is also Al Brook's and Ann Brook's.",
    ]);
  });
});

describe('0 and 00', () => {
  it('may not both be on a roster where the rules say so', () => {
    const findings = check(signals, '0', '00', '1');
    expect(findings.map(({ code, row, message }) => [code, row, message])).toEqual([
      ['zero-and-double-zero', 0, '0 and 00 may not both be on one roster, and Dunbmore wears 00.'],
      ['zero-and-double-zero', 1, '0 and 00 may not both be on one roster, and Dunamore wears 0.'],
    ]);
    expect(findings.flatMap(({ suggestions }) => suggestions)).not.toContain('0');
    expect(findings.flatMap(({ suggestions }) => suggestions)).not.toContain('00');
  });

  it('are two numbers where the rules say so, and neither is worn where they say that', () => {
    expect(check({}, '0', '00')).toEqual([]);
    expect(check({ labels: { zeroAndDoubleZero: 'neither' } }, '0', '00')).toMatchObject([
      { code: 'number-not-allowed', message: '0 is not allowed: neither 0 nor 00 is worn.' },
      { code: 'number-not-allowed', message: '00 is not allowed: neither 0 nor 00 is worn.' },
    ]);
  });

  it('are not offered to one player while the other is worn by another', () => {
    expect(check(signals, '00', '')[0]?.suggestions).toEqual(['1', '2', '3']);
  });
});

describe('numbers set aside', () => {
  const rules = makeRuleSet({
    labels: { allowed: '1-5' },
    reserved: [
      { labels: '1', roles: ['goalkeeper'], reason: 'The keeper wears it.' },
      { labels: '3', roles: [], reason: 'kept for next season' },
    ],
  });
  const checkOne = (number: string, role: string) =>
    checkRoster(rules, [makeLine({ number, role })], []).findings;

  it('are worn by the role they are for, whatever its case and spaces', () => {
    expect(checkOne('1', ' GoalKeeper ')).toEqual([]);
  });

  it('ask a player without a role for it', () => {
    expect(checkOne('1', ' ')).toMatchObject([
      {
        code: 'number-needs-role',
        field: 'role',
        message: '1 is only for the role goalkeeper: The keeper wears it. Give the role, or another number.',
        suggestions: ['goalkeeper'],
      },
    ]);
  });

  it('send another role elsewhere', () => {
    expect(checkOne('1', 'captain')).toMatchObject([
      { code: 'number-reserved', field: 'number', suggestions: ['2', '4', '5'] },
    ]);
  });

  it('are worn by nobody when no role is named', () => {
    expect(checkOne('3', 'goalkeeper')).toMatchObject([
      { code: 'number-reserved', message: '3 is kept back and nobody may wear it: kept for next season.' },
    ]);
  });

  it('are offered to the role they are for and to nobody else', () => {
    expect(checkOne('', 'goalkeeper')[0]?.suggestions).toEqual(['1', '2', '4']);
    expect(checkOne('', '')[0]?.suggestions).toEqual(['2', '4', '5']);
  });

  it('that cannot be read are reported once', () => {
    const broken = makeRuleSet({ reserved: [{ labels: '?', roles: [], reason: 'x' }] });
    expect(checkRoster(broken, makeLines('1', '2'), []).findings).toMatchObject([
      { code: 'number-reserved', row: null, field: 'roster' },
    ]);
  });
});
