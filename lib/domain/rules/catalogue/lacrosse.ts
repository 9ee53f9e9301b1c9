import { buildPreset } from './build-preset';

/** Published codes of lacrosse. */
export const lacrossePresets = [
  buildPreset({
    id: 'lacrosse-nfhs-boys',
    sport: 'lacrosse',
    title: 'NFHS boys lacrosse',
    summary: '0 to 99; 00 and 01 to 09 are not legal.',
    labels: { allowed: '0-99', leadingZeros: 'refused' },
    citations: [
      {
        body: 'NFHS',
        document: 'Boys Lacrosse Rules Book',
        edition: 'A copy of 2022 to 2024',
        rule: '1-9-1g',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', 'leading zeros', '0 and 00', 'repeated numbers'],
        says: '0 to 99 are legal, 00 and 01 to 09 are not, and no number is worn twice.',
      },
    ],
  }),
];
