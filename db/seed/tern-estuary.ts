import { makeKit } from './invent';
import type { DemoDivision, DemoLeague, DemoTeam } from './scenario';

const youthSizes = [
  { code: 'YXS', label: 'Youth XS' },
  { code: 'YS', label: 'Youth S' },
  { code: 'YM', label: 'Youth M' },
  { code: 'YL', label: 'Youth L' },
  { code: 'YXL', label: 'Youth XL' },
];
const adultSizes = [
  { code: 'AS', label: 'Adult S' },
  { code: 'AM', label: 'Adult M' },
  { code: 'AL', label: 'Adult L' },
  { code: 'AXL', label: 'Adult XL' },
  { code: 'A2XL', label: 'Adult 2XL' },
];

const jerseyAndShorts = (sizes: typeof youthSizes) => [
  { code: 'jersey', name: 'Jersey', worn: 'home' as const, numbered: true, named: true, sizes },
  { code: 'shorts', name: 'Shorts', worn: 'home' as const, numbered: false, named: false, sizes },
];

const pale = makeKit('chalk', 'chalk', 'black');
const dark = makeKit('black', 'slate', 'white');
const team = (
  name: string,
  home: DemoTeam['home'],
  story: DemoTeam['story'],
  players: number,
  away: DemoTeam['away'] = pale,
): DemoTeam => ({
  name,
  home,
  away,
  story,
  players,
});

const divisions: DemoDivision[] = [
  {
    name: 'U12 Mixed',
    ageBand: 'under 12',
    level: 'development',
    least: 8,
    most: 12,
    ruleSet: 'digits',
    garments: jerseyAndShorts(youthSizes),
    teams: [
      team('Otters', makeKit('navy', 'navy', 'white'), 'signed off', 12),
      team(
        'Herons',
        makeKit('silver', 'teal', 'black'),
        'two share a number',
        11,
        makeKit('teal', 'silver', 'white'),
      ),
      team('Lapwings', makeKit('green', 'chalk', 'white'), 'sizes missing', 12),
      team(
        'Avocets',
        makeKit('black', 'white', 'white'),
        'signed off',
        12,
        makeKit('white', 'black', 'black'),
      ),
      team('Dunlins', makeKit('sand', 'bronze', 'black'), 'collecting', 6, dark),
      team('Pipits', makeKit('sky', 'navy', 'navy'), 'submitted', 12, dark),
      team('Shelducks', makeKit('orange', 'black', 'white'), 'batch on press', 12),
      team('Wagtails', makeKit('royal', 'gold', 'white'), 'batch on press', 12),
    ],
  },
  {
    name: 'U14 Girls',
    ageBand: 'under 14',
    level: 'league',
    least: 8,
    most: 14,
    ruleSet: 'digits',
    garments: jerseyAndShorts(youthSizes),
    teams: [
      team('Foxgloves', makeKit('plum', 'lilac', 'white'), 'collecting', 7),
      team('Kestrels', makeKit('orange', 'black', 'black', 'white'), 'digit above five', 12),
      team('Sandpipers', makeKit('sand', 'bronze', 'black'), 'name too long', 14, dark),
      team('Curlews', makeKit('teal', 'teal', 'white'), 'signed off', 14),
      team('Samphires', makeKit('mint', 'green', 'black'), 'signed off', 14, dark),
      team('Swallows', makeKit('royal', 'royal', 'white'), 'batch on press', 14),
      team('Whimbrels', makeKit('maroon', 'sand', 'white'), 'submitted', 13),
      team('Yarrows', makeKit('gold', 'black', 'black'), 'no roster', 0, dark),
    ],
  },
  {
    name: 'U16 Boys',
    ageBand: 'under 16',
    level: 'league',
    least: 8,
    most: 15,
    ruleSet: 'digits',
    garments: jerseyAndShorts(adultSizes),
    teams: [
      team('Badgers', makeKit('black', 'chalk', 'white'), 'batch received', 15),
      team('Plovers', makeKit('chalk', 'red', 'red'), 'no roster', 0, makeKit('red', 'chalk', 'white')),
      team('Godwits', makeKit('maroon', 'maroon', 'gold'), 'batch received', 15),
      team('Hares', makeKit('bronze', 'sand', 'white'), 'returned', 14),
      team('Merlins', makeKit('slate', 'black', 'white'), 'signed off', 15),
      team('Oystercatchers', makeKit('black', 'white', 'orange'), 'in the held batch', 14),
      team('Stoats', makeKit('chalk', 'bronze', 'black'), 'in the held batch', 15, dark),
      team('Teals', makeKit('teal', 'green', 'white'), 'collecting', 11),
    ],
  },
  {
    name: 'Open Women',
    ageBand: 'adult',
    level: 'open',
    least: 8,
    most: 15,
    ruleSet: 'any number',
    garments: jerseyAndShorts(adultSizes),
    teams: [
      team('Gannetries', makeKit('navy', 'sky', 'white'), 'batch received', 15),
      team('Marram', makeKit('green', 'green', 'gold'), 'signed off', 15),
      team('Quaysiders', makeKit('red', 'black', 'white'), 'too few players', 6),
      team('Saltmarsh', makeKit('slate', 'slate', 'sand'), 'submitted', 15),
      team('Sedges', makeKit('mint', 'teal', 'black'), 'collecting', 10, dark),
      team('Skerries', makeKit('royal', 'white', 'white'), 'zero and double zero', 15),
      team('Thrift', makeKit('lilac', 'plum', 'plum'), 'cautions', 15, dark),
      team('Wrack', makeKit('bronze', 'black', 'white'), 'no roster', 0),
    ],
  },
];

/** A basketball league of 32 teams in every state that the product knows. */
export const ternEstuary: DemoLeague = {
  slug: 'tern-estuary',
  name: 'Tern Estuary Basketball League',
  sport: 'basketball',
  timeZone: 'America/New_York',
  unit: 'in',
  paper: 'Letter',
  currency: 'USD',
  shipTo: 'Estuary Hall, 4 Quay Walk, Ternmouth',
  ruleSets: [
    { key: 'digits', name: 'Digits 0–5', preset: 'basketball-nfhs' },
    { key: 'any number', name: 'Any number to 99', preset: 'basketball-fiba-2014' },
  ],
  divisions,
};
