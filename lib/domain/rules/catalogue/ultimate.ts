import { buildPreset } from './build-preset';

/** Published codes of ultimate. */
export const ultimatePresets = [
  buildPreset({
    id: 'ultimate-wfdf-2021',
    sport: 'ultimate',
    title: 'WFDF, 2021 to 2024',
    summary: '0 to 99; a leading zero makes no difference, so 1 and 01 are the same number.',
    labels: { allowed: '0-99', leadingZeros: 'same as without', zeroAndDoubleZero: 'one value' },
    citations: [
      {
        body: 'WFDF',
        document: 'Rules of Ultimate, Appendix',
        edition: '2021 to 2024',
        rule: 'App. C4',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', 'leading zeros', '0 and 00', 'repeated numbers'],
        says: 'A whole number from 0 to 99, another for each player of a team; one-digit numbers may carry a leading zero.',
      },
    ],
    doubts: ['The text in force from 2025 was not read again.'],
  }),
];
