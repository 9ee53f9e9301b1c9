import { buildPreset } from './build-preset';

/** Published codes of handball. */
export const handballPresets = [
  buildPreset({
    id: 'handball-ihf-2016',
    sport: 'handball',
    title: 'IHF, from 1 July 2016',
    summary: '1 to 99; a player keeps the number when changing between court and goal.',
    inForce: { from: '2016-07-01' },
    labels: { allowed: '1-99', zeroAndDoubleZero: 'neither' },
    citations: [
      {
        body: 'IHF',
        document: 'Rules of the Game',
        edition: '1 July 2016',
        rule: '4:7 to 4:9',
        known: 'quoted by others',
        settles: ['numbers', 'digits', 'number of digits', '0 and 00', 'repeated numbers'],
        says: 'Players wear visible numbers from 1 to 99, each player of a team another one.',
      },
    ],
  }),
];
