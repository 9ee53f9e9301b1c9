import { buildPreset } from './build-preset';

const uefa = { body: 'UEFA', document: 'UEFA Equipment Regulations', edition: '1 June 2024' } as const;

/** Published codes of association football. The Laws of the Game leave numbers to the competition. */
export const associationFootballPresets = [
  buildPreset({
    id: 'football-uefa-2024',
    sport: 'association football',
    title: 'UEFA equipment regulations 2024',
    summary: '1 to 99, with 1 only for a goalkeeper; names in Latin letters.',
    inForce: { from: '2024-06-01' },
    labels: { allowed: '1-99' },
    reserved: [{ labels: '1', roles: ['goalkeeper'], reason: 'the regulations keep it for goalkeepers' }],
    names: { letters: 'latin' },
    citations: [
      {
        ...uefa,
        rule: 'Art. 10 (numbers)',
        known: 'read',
        settles: ['numbers', 'digits', 'number of digits', 'numbers set aside'],
        says: 'Whole numbers up to 99; number 1 only for a goalkeeper.',
      },
      {
        ...uefa,
        rule: 'Article on names',
        known: 'read',
        settles: ['letters of names'],
        says: 'Names are in the Latin alphabet and agree with the player list.',
      },
    ],
    open: { '0 and 00': 'Zero is not mentioned in the passage known to us: the preset leaves 0 and 00 out.' },
    doubts: ['The longest name is not in the passage known to us: at most 40 letters are let in.'],
  }),
];
