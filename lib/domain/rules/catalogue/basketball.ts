import { buildPreset } from './build-preset';

const fiba = { body: 'FIBA', document: 'Official Basketball Rules' } as const;
const nfhs = { body: 'NFHS', document: 'Basketball Rules Book' } as const;

/** Published codes of basketball. */
export const basketballPresets = [
  buildPreset({
    id: 'basketball-fiba-2014',
    sport: 'basketball',
    title: 'FIBA, from 1 October 2014',
    summary: '0, 00 and 1 to 99; 0 and 00 are two different numbers, 101 numbers in all.',
    inForce: { from: '2014-10-01' },
    labels: { allowed: '0, 00, 1-99', zeroAndDoubleZero: 'both and different' },
    citations: [
      {
        ...fiba,
        edition: 'In force from 1 October 2014',
        rule: 'Art. 4.3.2',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', '0 and 00', 'repeated numbers'],
        says: 'Players wear 0, 00 or 1 to 99, no two of a team the same; 0 and 00 count as two numbers.',
      },
      {
        ...fiba,
        edition: '2020, 2022 and 2024',
        rule: 'Art. 4.3.2',
        known: 'from memory',
        settles: ['numbers'],
        says: 'Later editions keep the same numbers.',
      },
    ],
  }),
  buildPreset({
    id: 'basketball-nfhs',
    sport: 'basketball',
    title: 'NFHS high school, digits 0–5',
    summary: '0, 00, 1–5, 10–15 and so on to 50–55; 0 and 00 may not both be on one roster.',
    labels: {
      allowed: '0, 00, 1-5, 10-15, 20-25, 30-35, 40-45, 50-55',
      digits: '012345',
      digitsReason: 'officials show the digits on the fingers of two hands',
      zeroAndDoubleZero: 'not both',
    },
    citations: [
      {
        ...nfhs,
        edition: 'Number list as quoted in 2019',
        rule: '3-4-3',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', 'leading zeros', '0 and 00', 'repeated numbers'],
        says: 'The legal numbers are listed one by one, use digits up to 5, and 0 and 00 are not on one roster together.',
      },
    ],
  }),
  buildPreset({
    id: 'basketball-ncaa-2023',
    sport: 'basketball',
    title: 'NCAA, from 2023-24',
    summary: '0 or 00 to 99; whether one roster may hold both 0 and 00 is not clear.',
    labels: { allowed: '0, 00, 1-99', zeroAndDoubleZero: 'not both' },
    citations: [
      {
        body: 'NCAA',
        document: 'Basketball Rules',
        edition: '2023-24 onwards',
        rule: '1-22',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits'],
        says: 'Numbers run from 0 or 00 to 99; before, only digits up to 5 were worn.',
      },
    ],
    open: {
      '0 and 00':
        'Whether 0 and 00 may both be on one roster is not clear: the preset takes the stricter reading.',
    },
  }),
];
