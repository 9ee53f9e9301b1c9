import { makeKit } from './invent';
import type { DemoLeague, DemoTeam } from './scenario';

const sizes = [
  { code: '128', label: 'Height 128 cm' },
  { code: '140', label: 'Height 140 cm' },
  { code: '152', label: 'Height 152 cm' },
  { code: '164', label: 'Height 164 cm' },
  { code: 'S', label: 'Adult S' },
  { code: 'M', label: 'Adult M' },
  { code: 'L', label: 'Adult L' },
];
const garments = [
  { code: 'shirt', name: 'Shirt', worn: 'home and away' as const, numbered: true, named: true, sizes },
  { code: 'shorts', name: 'Shorts', worn: 'home' as const, numbered: true, named: false, sizes },
];
const white = makeKit('white', 'white', 'black');
const team = (
  name: string,
  home: DemoTeam['home'],
  story: DemoTeam['story'],
  players: number,
  away: DemoTeam['away'] = white,
): DemoTeam => ({
  name,
  home,
  away,
  story,
  players,
});

/** A football league of 12 teams, so that a second tenant is there to be kept apart. */
export const pellbrookValley: DemoLeague = {
  slug: 'pellbrook-valley',
  name: 'Pellbrook Valley Football League',
  sport: 'football',
  timeZone: 'Europe/London',
  unit: 'mm',
  paper: 'A4',
  currency: 'GBP',
  shipTo: 'The Pavilion, Mill Lane, Pellbrook',
  ruleSets: [{ key: 'squad', name: 'Squad numbers 1–99', preset: 'football-uefa-2024' }],
  divisions: [
    {
      name: 'Valley Juniors',
      ageBand: 'under 13',
      level: 'juniors',
      least: 11,
      most: 18,
      ruleSet: 'squad',
      garments,
      teams: [
        team('Alders', makeKit('green', 'green', 'white'), 'signed off', 15),
        team('Brambles', makeKit('plum', 'black', 'white'), 'signed off', 14),
        team('Hawthorns', makeKit('red', 'white', 'white'), 'two share a number', 15),
        team('Larches', makeKit('orange', 'orange', 'black'), 'collecting', 9),
        team('Rowans', makeKit('maroon', 'sky', 'white'), 'submitted', 14),
        team('Sallows', makeKit('gold', 'green', 'green'), 'no roster', 0, makeKit('black', 'black', 'gold')),
      ],
    },
    {
      name: 'Valley First',
      ageBand: 'adult',
      level: 'first',
      least: 11,
      most: 20,
      ruleSet: 'squad',
      garments,
      teams: [
        team('Beechers', makeKit('bronze', 'sand', 'white'), 'batch on press', 16),
        team('Elmstead', makeKit('navy', 'navy', 'sky'), 'batch on press', 16),
        team('Hollins Wood', makeKit('green', 'red', 'white'), 'sizes missing', 15),
        team('Millrace', makeKit('royal', 'white', 'white'), 'returned', 16),
        team('Osiers', makeKit('slate', 'gold', 'gold'), 'signed off', 15),
        team('Withy Bridge', makeKit('black', 'white', 'white'), 'submitted', 16),
      ],
    },
  ],
};
