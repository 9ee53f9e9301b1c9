import { buildPreset } from './build-preset';

const iff = { body: 'IFF', document: 'Rules of the Game', edition: '2022', rule: '401' } as const;

/** Published codes of floorball. */
export const floorballPresets = [
  buildPreset({
    id: 'floorball-iff-2022',
    sport: 'floorball',
    title: 'IFF, 2022',
    summary: '1 to 99, with 1 only for a goalkeeper.',
    labels: { allowed: '1-99', zeroAndDoubleZero: 'neither' },
    reserved: [{ labels: '1', roles: ['goalkeeper'], reason: 'a field player may not wear 1' }],
    citations: [
      {
        ...iff,
        known: 'quoted by others',
        settles: [
          'numbers',
          'digits',
          'number of digits',
          '0 and 00',
          'repeated numbers',
          'numbers set aside',
        ],
        says: 'Whole numbers from 1 to 99, no two of a team the same; 1 is not for field players.',
      },
    ],
  }),
];
