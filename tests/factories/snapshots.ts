import { createHash } from 'node:crypto';
import { assignBagCodes } from '@/lib/domain/batch/bag-code';
import type { BatchSnapshot, SnapshotPlayer, SnapshotTeam } from '@/lib/domain/batch/batch-snapshot';
import type { Kit } from '@/lib/domain/kit/kit';
import type { Garment } from '@/lib/domain/roster/player';

/** SHA-256 of a text, as the product hands it to `assignBagCodes`. */
export const hashOf = (text: string): Uint8Array => createHash('sha256').update(text).digest();

const youthRun = [
  ['YXS', 'Youth extra small'],
  ['YS', 'Youth small'],
  ['YM', 'Youth medium'],
  ['YL', 'Youth large'],
  ['AS', 'Adult small'],
  ['AM', 'Adult medium'],
] as const;

export function makeGarment(overrides: Partial<Garment> = {}): Garment {
  return {
    code: 'jersey',
    name: 'Jersey',
    worn: 'home and away',
    numbered: true,
    named: true,
    sizes: youthRun.map(([code, label]) => ({ code, label })),
    ...overrides,
  };
}

const shorts = makeGarment({
  code: 'shorts',
  name: 'Shorts',
  worn: 'home',
  numbered: false,
  named: false,
});

const otterHome: Kit = {
  name: 'navy',
  body: '#14375e',
  sleeves: '#c9d6e2',
  number: '#ffffff',
  outline: null,
};
const otterAway: Kit = {
  name: 'white',
  body: '#ffffff',
  sleeves: '#14375e',
  number: '#14375e',
  outline: '#c9d6e2',
};
const heronHome: Kit = {
  name: 'silver and teal',
  body: '#d9dee3',
  sleeves: '#2f6f73',
  number: '#163a3d',
  outline: null,
};

const surnames = [
  'Adisa',
  'Brookhollow',
  'Calloway',
  'Dunmore',
  'Ellery',
  'Farrow',
  'Grantley',
  'Hollin',
  'Ivers',
  'Jessop',
  'Kirrane',
  'Lorrimer',
  'Nguyễn',
  'Ødegaard-Maré',
  'Şimşekoğlu',
  'Třebízská',
  'O’Dunnavan',
  'Pellwright',
  'Quillfeather',
  'Rosengarden',
];
const givenNames = [
  'Wren',
  'Tam',
  'Ines',
  'Pip',
  'Jonah',
  'Lumi',
  'Osei',
  'Mara',
  'Kit',
  'Ana',
  'Seb',
  'Rún',
];
const labels = ['4', '10', '14', '0', '00', '33', '5', '21', '11', '52', '3', '23', '1', '2', '12', '45'];

const pick = <T>(items: readonly T[], at: number): T => {
  const item = items[at % items.length];
  if (item === undefined) throw new Error('nothing to pick from');
  return item;
};

export function makePlayer(at: number, overrides: Partial<SnapshotPlayer> = {}): SnapshotPlayer {
  const surname = pick(surnames, at);
  return {
    id: `player-${String(at).padStart(4, '0')}`,
    bagCode: '',
    name: `${surname}, ${pick(givenNames, at * 5 + Math.floor(at / 20))}`,
    nameOnBack: surname.toLocaleUpperCase('en'),
    number: pick(labels, at),
    role: '',
    sizes: { jersey: pick(youthRun, at * 3 + 1)[0], shorts: pick(youthRun, at * 2 + 2)[0] },
    ...overrides,
  };
}

export function makeTeam(overrides: Partial<SnapshotTeam> = {}): SnapshotTeam {
  return {
    id: 'team-otters',
    name: 'Otters',
    slug: 'otters',
    division: 'U12 Mixed',
    kits: { home: otterHome, away: otterAway },
    garments: [makeGarment(), shorts],
    players: [],
    ...overrides,
  };
}

/** A snapshot around these teams; players without a bag code get theirs as in a real release. */
export function makeSnapshotOf(
  teams: readonly SnapshotTeam[],
  overrides: Partial<BatchSnapshot['batch']> = {},
): BatchSnapshot {
  const ids = teams.flatMap((team) => team.players.map((player) => player.id));
  const codes = assignBagCodes(ids, (text) => hashOf(`batch-7/${text}`));
  return {
    format: 'raglan-batch',
    formatVersion: 1,
    batch: {
      code: 'B-07',
      league: 'Tern Estuary Basketball League',
      season: 'Autumn 2027',
      shop: 'the press room at Quay Street',
      promisedOn: '2027-10-01',
      releasedAt: '2027-09-17T08:12:00.000Z',
      timeZone: 'Europe/Dublin',
      paper: 'A4',
      ...overrides,
    },
    teams: teams.map((team) => ({
      ...team,
      players: team.players.map((player) => ({
        ...player,
        bagCode: player.bagCode || (codes.get(player.id) ?? ''),
      })),
    })),
  };
}

const playersFrom = (first: number, count: number): SnapshotPlayer[] =>
  Array.from({ length: count }, (_, at) => makePlayer(first + at));

/** Two invented teams with 24 players: one with two kits, one with a home kit only, a size and a number missing. */
export function makeTwoTeams(overrides: Partial<BatchSnapshot['batch']> = {}): BatchSnapshot {
  const otters = playersFrom(0, 12).map((player, at) =>
    at === 7 ? { ...player, sizes: { shorts: 'YM' } } : player,
  );
  const herons = playersFrom(12, 12).map((player, at) => (at === 3 ? { ...player, number: '' } : player));
  return makeSnapshotOf(
    [
      makeTeam({ players: otters }),
      makeTeam({
        id: 'team-herons',
        name: 'Herons',
        slug: 'herons',
        kits: { home: heronHome, away: null },
        players: herons,
      }),
    ],
    overrides,
  );
}

/** Fourteen teams with 12 players each and three pieces a player: 504 garments. */
export function makeLargeBatch(): BatchSnapshot {
  const hues = ['#14375e', '#7a1f2b', '#1f5b3a', '#e2b100', '#2b2b2b', '#5b2a6e', '#c4501b'];
  return makeSnapshotOf(
    Array.from({ length: 14 }, (_, at) =>
      makeTeam({
        id: `team-${at}`,
        name: `Club ${String.fromCharCode(65 + at)}`,
        slug: `club-${at}`,
        division: at < 7 ? 'U10 Mixed' : 'U12 Mixed',
        kits: { home: { ...otterHome, name: `colour ${at % 7}`, body: pick(hues, at) }, away: otterAway },
        players: playersFrom(at * 12, 12),
      }),
    ),
  );
}

/** Names and labels that break careless programs: long, short, empty, other scripts, marks, formulas, markup. */
export const hostileNames = [
  'Li, X',
  'Overmarshwaterlandingbridgekeeperstonehouseandunderhillfieldsmeadowgatewatcherlongshoreferrymansterncastlewrightson',
  'de la Peña y Fernández-Arróyabe Villaverde del Monte Sagrado, María de los Ángeles Guadalupe Esperanza del Carmen',
  'Đặng Thị Quỳnh-Như Nguyễn Phương',
  'Παπαδοπούλου, Ειρήνη',
  'Щербакова, Ольга',
  'לוי, עמית',
  'سهيل الوادي',
  'علی‌رضا (Ali)',
  '=HYPERLINK("a";"b")',
  '@SUM(1+1)',
  '<b>Bold</b> & "quoted"',
  'e\u0301\u0323cole combine\u0301e',
  '\u202eright to left\u202c',
  'ქართველიშვილი',
  'Pip 🏀 Star',
  'Line\nbreak\tand tab',
  'ﬁne Ǆ ligatures',
] as const;

/** A team of those names; garments and sizes are as awkward as the names. */
export function makeHostileBatch(overrides: Partial<BatchSnapshot['batch']> = {}): BatchSnapshot {
  const garments = [
    makeGarment({ name: 'Reversible practice jersey with long tail' }),
    shorts,
    makeGarment({
      code: 'warm-up',
      name: 'Warm-up top',
      numbered: false,
      sizes: [{ code: '2XL-Tall+5cm', label: 'Very tall' }],
    }),
    makeGarment({ code: 'socks', name: 'Socks', numbered: false, named: false, worn: 'home' }),
    makeGarment({ code: 'bag', name: 'Kit bag', numbered: true, named: true, worn: 'away' }),
  ];
  const sizes = [
    { jersey: 'YM', shorts: 'YL', 'warm-up': '2XL-Tall+5cm', socks: 'AS', bag: '' },
    { jersey: 'one size fits most', shorts: '' },
    { jersey: 'YS', 'old-cap': 'M' },
  ];
  const numbers = ['7', '00', '', '123', 'GK', '٧', '12345678901234567890', '07'];
  const players = hostileNames.map((name, at) =>
    makePlayer(at, {
      name,
      nameOnBack: at % 4 === 2 ? '' : name.toLocaleUpperCase('en').slice(0, 60),
      number: pick(numbers, at),
      sizes: { ...pick(sizes, at) },
    }),
  );
  return makeSnapshotOf(
    [
      makeTeam({
        name: 'The Very Long Named Estuary and Upper Marshes Wading Birds Athletic and Social Club',
        slug: '../../etc/Otters & Sons',
        garments,
        players,
      }),
      makeTeam({ id: 'team-empty', name: 'Herons', slug: 'herons', players: [] }),
    ],
    overrides,
  );
}
