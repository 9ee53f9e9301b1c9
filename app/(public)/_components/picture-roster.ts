import type { Kit } from '@/lib/domain/kit/kit';
import type { RosterLine } from '@/lib/domain/roster/player';
import type { RuleSet } from '@/lib/domain/rules/rule-set';

/** The rules of the pictures: numbers whose digits an official can signal with one hand. An example of our own. */
export const pictureRules: RuleSet = {
  name: 'Digits 0–5',
  sport: 'Basketball',
  labels: {
    allowed: '0, 00, 1-55',
    digits: '012345',
    digitsReason: 'officials signal numbers with the fingers of one hand',
    mostDigits: 2,
    leadingZeros: 'refused',
    zeroAndDoubleZero: 'not both',
    weight: 'blocker',
  },
  uniqueness: { within: 'team', weight: 'blocker' },
  reserved: [{ labels: '23, 40', roles: [], reason: 'last worn by players who may return' }],
  reservedWeight: 'blocker',
  roster: { least: 1, most: 15, requiredRoles: [], weight: 'off' },
  names: {
    onBack: 'wanted',
    mostLetters: 9,
    letters: 'latin',
    sharedSurnameNeedsInitial: true,
    weight: 'caution',
  },
  sizes: { weight: 'off' },
  citations: [],
};

const line = (name: string, nameOnBack: string, number: string): RosterLine => ({
  name,
  nameOnBack,
  number,
  role: '',
  sizes: {},
});

/** An invented roster with the mistakes people make. */
export const pictureRoster: readonly RosterLine[] = [
  line('Wren Adisa', 'ADISA', '4'),
  line('Tam Brookhollow', 'BROOKHOLLOW', '10'),
  line('Ines Calloway', 'CALLOWAY', '14'),
  line('Pip Dunmore', 'DUNMORE', '14'),
  line('Jonah Ellery', 'ELLERY', '26'),
  line('Lumi Farrow', 'FARROW', '0'),
  line('Osei Grantley', 'GRANTLEY', '33'),
  line('Kit Ivers', 'IVERS', '21'),
  line('Ana Jessop', 'JESSOP', '11'),
  line('Seb Kirrane', 'KIRRANE', '52'),
];

const kit = (body: string, sleeves: string, number: string): Kit => ({
  name: '',
  body,
  sleeves,
  number,
  outline: null,
});

/** Eight invented teams' colours. */
export const pictureKits: readonly { kit: Kit; number: string }[] = [
  { kit: kit('#14375e', '#14375e', '#ffffff'), number: '12' },
  { kit: kit('#d8dde1', '#2f6f73', '#17393b'), number: '4' },
  { kit: kit('#1f6a3a', '#f4f1e8', '#ffffff'), number: '33' },
  { kit: kit('#7a2a6a', '#d3b3cd', '#ffffff'), number: '5' },
  { kit: kit('#c4521b', '#1d1a16', '#ffffff'), number: '0' },
  { kit: kit('#e8d6a0', '#7a5a1c', '#1d1a16'), number: '21' },
  { kit: kit('#1d1a16', '#f4f1e8', '#ffffff'), number: '14' },
  { kit: kit('#f5f2ea', '#b02a22', '#b02a22'), number: '50' },
];
