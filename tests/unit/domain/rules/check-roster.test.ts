import { describe, expect, it } from 'vitest';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { jersey, makeLine, makeLines, makeRuleSet, type RuleSetChanges } from '../../../factories/rule-set';

const say = (changes: RuleSetChanges, players: Parameters<typeof checkRoster>[1], garments = [jersey]) =>
  checkRoster(makeRuleSet(changes), players, garments).findings.map(({ row, code, message }) => [
    row,
    code,
    message,
  ]);

describe('the roster as a whole', () => {
  it('is told how many players are missing or too many', () => {
    expect(say({ roster: { least: 8 } }, makeLines('1', '2'), [])).toEqual([
      [null, 'roster-too-small', 'The roster has 2 players, and at least 8 are needed: add 6.'],
    ]);
    expect(say({ roster: { most: 1 } }, makeLines('1', '2'), [])).toEqual([
      [null, 'roster-too-large', 'The roster has 2 players, and at most 1 is allowed: take 1 off.'],
    ]);
    expect(say({ roster: { least: 1 } }, [], [])).toEqual([
      [null, 'roster-too-small', 'The roster is empty, and at least 1 is needed: add 1.'],
    ]);
  });

  it('needs its roles, compared without case', () => {
    const rules: RuleSetChanges = { roster: { requiredRoles: [{ role: 'Libero', least: 2 }] } };
    expect(say(rules, [makeLine({ role: ' LIBERO' })], [])).toEqual([
      [null, 'role-missing', 'The role Libero needs at least 2 players, and only 1 has it.'],
    ]);
    expect(say(rules, makeLines('1'), [])).toEqual([
      [null, 'role-missing', 'The role Libero needs at least 2 players, and no player has it.'],
    ]);
  });
});

describe('names of players', () => {
  it('are needed for the bag label, whatever the rules weigh', () => {
    const off: RuleSetChanges = { names: { weight: 'off' } };
    expect(say(off, [makeLine({ name: ' \u200f' })], [])).toEqual([
      [0, 'player-name-missing', "Row 1 has no player's name. The bag label needs one."],
    ]);
  });

  it('are a caution when they come twice, also turned round, and never a blocker', () => {
    const players = [
      makeLine({ name: 'Calloway, Ines', number: '1' }),
      makeLine({ name: 'INES  CALLOWAY', number: '2' }),
    ];
    const { findings, summary } = checkRoster(makeRuleSet(), players, []);
    expect(findings.map(({ row, code, severity }) => [row, code, severity])).toEqual([
      [0, 'player-repeated', 'caution'],
      [1, 'player-repeated', 'caution'],
    ]);
    expect(summary).toEqual({ players: 2, blockers: 0, cautions: 2, notes: 0, clean: 0 });
  });

  it('of two people with a junior are not the same', () => {
    expect(
      say(
        {},
        [makeLine({ name: 'Al Brook', number: '1' }), makeLine({ name: 'Al Brook Jr', number: '2' })],
        [],
      ),
    ).toEqual([]);
  });
});

describe('names on the back', () => {
  const suggest = (changes: RuleSetChanges['names'], ...lines: Parameters<typeof makeLine>[0][]) =>
    checkRoster(
      makeRuleSet({ names: changes ?? {} }),
      lines.map((line, i) => makeLine({ number: String(i + 1), ...line })),
      [],
    )
      .findings.filter(({ field }) => field === 'nameOnBack')
      .map(({ code, suggestions }) => [code, suggestions]);

  it('that are wanted are asked for and offered from the surname', () => {
    expect(suggest({ onBack: 'wanted' }, { nameOnBack: '', name: 'Pip van der Brook' })).toEqual([
      ['name-on-back-missing', ['VAN DER BROOK']],
    ]);
    expect(suggest({ onBack: 'allowed' }, { nameOnBack: '' })).toEqual([]);
  });

  it('that are wanted are not offered as another player wears them where that needs an initial', () => {
    const rules = { onBack: 'wanted', sharedSurnameNeedsInitial: true } as const;
    expect(
      suggest(rules, { name: 'Al Brook', nameOnBack: 'BROOK' }, { name: 'Ann Brook', nameOnBack: '' }),
    ).toEqual([['name-on-back-missing', ['A BROOK', 'AN BROOK', 'ANN BROOK']]]);
  });

  it('are sent back where none is worn', () => {
    expect(say({ names: { onBack: 'not allowed' } }, [makeLine()], [])).toEqual([
      [0, 'name-on-back-not-wanted', 'No names are worn on the back here. Take “CALLOWAY” off.'],
    ]);
  });

  it('are counted as a reader counts letters', () => {
    expect(suggest({ mostLetters: 3 }, { nameOnBack: 'E\u0301E\u0301E\u0301' })).toEqual([]);
    expect(say({ names: { mostLetters: 8 } }, [makeLine({ nameOnBack: 'BROOKHOLLOW' })], [])).toEqual([
      [0, 'name-too-long', '“BROOKHOLLOW” is 11 letters long, and at most 8 may be worn.'],
    ]);
  });

  it('that are too long get shorter forms that fit', () => {
    expect(suggest({ mostLetters: 8 }, { nameOnBack: 'BROOKHOLLOW' })).toEqual([
      ['name-too-long', ['BROOKHO.']],
    ]);
    expect(suggest({ mostLetters: 9 }, { nameOnBack: 'BROOK-HOLLOW' })).toEqual([
      ['name-too-long', ['B HOLLOW', 'BROOK H.', 'HOLLOW']],
    ]);
  });

  it('in Latin letters may have marks, hyphens, apostrophes and full stops, and nothing else', () => {
    const latin = { letters: 'latin' } as const;
    expect(suggest(latin, { nameOnBack: "O'BRÓOK-ŁANE ST. Ñ" }, { nameOnBack: 'N\u0303ANDU’' })).toEqual([]);
    expect(suggest(latin, { nameOnBack: 'O´BROOK_2' })).toEqual([['name-letters', ["O'BROOK"]]]);
    expect(suggest(latin, { nameOnBack: 'ＢＲＯＯＫ' }, { nameOnBack: 'مريم' })).toEqual([
      ['name-letters', []],
    ]);
    expect(say({ names: latin }, [makeLine({ nameOnBack: 'BR00K' })], [])).toEqual([
      [
        0,
        'name-letters',
        '“BR00K” holds “0”. Only Latin letters, spaces, hyphens, apostrophes and full stops may be worn.',
      ],
    ]);
  });

  it('that two players share get an initial each, as many letters as it takes', () => {
    const shared = { sharedSurnameNeedsInitial: true };
    expect(
      suggest(
        shared,
        { name: 'Al Brook', nameOnBack: 'BROOK' },
        { name: 'Brook, Ann', nameOnBack: 'Brook ' },
      ),
    ).toEqual([
      ['surname-needs-initial', ['AL BROOK']],
      ['surname-needs-initial', ['An Brook', 'Ann Brook']],
    ]);
    expect(
      suggest(shared, { name: 'Brook', nameOnBack: 'BROOK' }, { name: '', nameOnBack: 'BROOK' }).slice(0, 1),
    ).toEqual([['surname-needs-initial', []]]);
    expect(
      suggest(
        { ...shared, mostLetters: 8 },
        { name: 'Al Brookhollow', nameOnBack: 'BROOKHO.' },
        { name: 'Bo Brookhollow', nameOnBack: 'BROOKHO.' },
      ),
    ).toEqual([
      ['surname-needs-initial', ['A BROOK.']],
      ['surname-needs-initial', ['B BROOK.']],
    ]);
  });
});

describe('sizes', () => {
  it('are asked for of every garment, and a garment nobody offers is not looked at', () => {
    expect(say({}, [makeLine({ sizes: { jersey: ' ', cap: 'XS' } })])).toEqual([
      [0, 'size-missing', 'Jersey has no size yet.'],
    ]);
    expect(say({}, [makeLine({ sizes: { jersey: 'YM', cap: 'XS' } })])).toEqual([]);
    expect(say({}, [makeLine()], [{ ...jersey, code: 'constructor' }])).toHaveLength(1);
  });

  it('that are not offered get the nearest that are, the larger first', () => {
    const suggest = (size: string) =>
      checkRoster(makeRuleSet(), [makeLine({ sizes: { jersey: size } })], [jersey]).findings[0]?.suggestions;
    expect(suggest('youth  medium')).toEqual(['YM']);
    expect(suggest('ys')).toEqual(['YS']);
    expect(suggest('YXL')).toEqual(['YL', 'YM']);
    expect(suggest('Adult XL')).toEqual(['AS']);
    expect(suggest('banana')).toEqual([]);
    expect(say({}, [makeLine({ sizes: { jersey: 'XXL' } })])).toEqual([
      [0, 'size-not-offered', 'Jersey is not offered in “XXL”, but in YS, YM, YL and AS.'],
    ]);
  });

  it('between two offered sizes go up', () => {
    const garment = { ...jersey, sizes: ['8', '12'].map((code) => ({ code, label: code })) };
    expect(
      checkRoster(makeRuleSet(), [makeLine({ sizes: { jersey: '10' } })], [garment]).findings[0]?.suggestions,
    ).toEqual(['12', '8']);
  });
});

it('findings come with the roster first, then by row, field and code', () => {
  const players = [
    makeLine({ name: 'Al', nameOnBack: '', number: '1', role: '', sizes: {} }),
    makeLine({ name: '', nameOnBack: 'BROOKHOLLOW7', number: '1', role: 'x', sizes: {} }),
  ];
  const rules: RuleSetChanges = {
    roster: { least: 3, requiredRoles: [{ role: 'captain', least: 1 }] },
    names: { onBack: 'wanted', mostLetters: 5, letters: 'latin' },
    reserved: [{ labels: '1', roles: ['goalkeeper'], reason: 'kept' }],
  };
  const shorts = { ...jersey, code: 'apron', name: 'Apron' };
  const { findings } = checkRoster(makeRuleSet(rules), players, [jersey, shorts]);
  expect(findings.map(({ row, field, code, garment }) => [row, field, garment ?? code])).toEqual([
    [null, 'roster', 'roster-too-small'],
    [null, 'roster', 'role-missing'],
    [0, 'nameOnBack', 'name-on-back-missing'],
    [0, 'number', 'number-repeated'],
    [0, 'role', 'number-needs-role'],
    [0, 'sizes', 'jersey'],
    [0, 'sizes', 'apron'],
    [1, 'name', 'player-name-missing'],
    [1, 'nameOnBack', 'name-too-long'],
    [1, 'nameOnBack', 'name-letters'],
    [1, 'number', 'number-repeated'],
    [1, 'number', 'number-reserved'],
    [1, 'sizes', 'jersey'],
    [1, 'sizes', 'apron'],
  ]);
});
