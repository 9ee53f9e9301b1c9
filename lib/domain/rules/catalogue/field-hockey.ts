import { buildPreset } from './build-preset';

/** Published codes of field hockey. */
export const fieldHockeyPresets = [
  buildPreset({
    id: 'field-hockey-nfhs',
    sport: 'field hockey',
    title: 'NFHS high school field hockey',
    summary: '00 and 0 to 99, at most two digits; 0 and 00 may not both be on one roster.',
    labels: { allowed: '00, 0-99', zeroAndDoubleZero: 'not both' },
    citations: [
      {
        body: 'NFHS',
        document: 'Field Hockey Rules Book',
        edition: 'A copy of the 2010s, repeated for goalkeepers in 2023',
        rule: 'Uniform rule',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', '0 and 00', 'repeated numbers'],
        says: 'Two digits at most from 00 to 99, no number twice, and 0 and 00 count as a repeat.',
      },
    ],
  }),
];
