import { buildPreset } from './build-preset';

const nfhs = {
  body: 'NFHS',
  document: 'Softball Rules Book',
  edition: '2016 to 2019',
  rule: '3-2-2',
} as const;

/** Published codes of softball. */
export const softballPresets = [
  buildPreset({
    id: 'softball-nfhs',
    sport: 'softball',
    title: 'NFHS high school softball',
    summary: '0 and 00 are the same number; no number twice in a team.',
    labels: { allowed: '0, 00, 1-99', zeroAndDoubleZero: 'one value' },
    citations: [
      {
        ...nfhs,
        known: 'read',
        settles: ['0 and 00', 'repeated numbers'],
        says: 'No two players wear the same number, and 0 and 00 count as one.',
      },
      {
        ...nfhs,
        known: 'from memory',
        settles: ['numbers', 'digits', 'number of digits'],
        says: 'Numbers end at 99.',
      },
    ],
  }),
];
