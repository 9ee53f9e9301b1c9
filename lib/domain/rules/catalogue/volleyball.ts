import { buildPreset } from './build-preset';

/** Published codes of volleyball. */
export const volleyballPresets = [
  buildPreset({
    id: 'volleyball-usav-2023',
    sport: 'volleyball',
    title: 'USA Volleyball, 2023-25',
    summary: '1 to 99, no number twice in a team.',
    labels: { allowed: '1-99', zeroAndDoubleZero: 'neither' },
    citations: [
      {
        body: 'USA Volleyball',
        document: 'Domestic Competition Regulations',
        edition: '2023-25',
        rule: '4.3.3',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', '0 and 00', 'repeated numbers'],
        says: 'Numbers run from 1 to 99 and no two players of a team wear the same.',
      },
    ],
  }),
  buildPreset({
    id: 'volleyball-nfhs-2028',
    sport: 'volleyball',
    title: 'NFHS high school, from 2028-29',
    summary: '0 to 99 without 00 and without a leading zero.',
    labels: { allowed: '0-99', leadingZeros: 'refused' },
    citations: [
      {
        body: 'NFHS',
        document: 'Volleyball Rules Book',
        edition: '2028-29 onwards',
        rule: '4-2-4',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', 'leading zeros', '0 and 00', 'repeated numbers'],
        says: 'A leading zero and 00 are no longer legal; a plain 0 still is.',
      },
    ],
    doubts: [
      'The day it takes effect in 2028 is not in the passage known to us; 00 was still legal in 2016-17.',
    ],
  }),
];
