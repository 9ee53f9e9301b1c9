import type { Garment } from '../roster/player';

/** A set of garments to start a division's kit from; every part of it can be changed later. */
export type StarterKit = { id: string; name: string; says: string; garments: readonly Garment[] };

/** Youth then adult sizes, smallest first, as most blanks are sold (common practice, no source). */
const sizes = [
  ['YXS', 'Youth extra small'],
  ['YS', 'Youth small'],
  ['YM', 'Youth medium'],
  ['YL', 'Youth large'],
  ['YXL', 'Youth extra large'],
  ['S', 'Adult small'],
  ['M', 'Adult medium'],
  ['L', 'Adult large'],
  ['XL', 'Adult extra large'],
  ['2XL', 'Adult double extra large'],
  ['3XL', 'Adult triple extra large'],
].map(([code = '', label = '']) => ({ code, label }));

/** Socks come in far fewer sizes than shirts (common practice, no source; the shoe sizes differ from maker to maker). */
const sockSizes = [
  { code: 'YS', label: 'Youth small' },
  { code: 'YL', label: 'Youth large' },
  { code: 'S', label: 'Adult small' },
  { code: 'L', label: 'Adult large' },
];

const garment = (
  code: string,
  name: string,
  worn: Garment['worn'],
  printed: { numbered: boolean; named: boolean },
  offered: Garment['sizes'] = sizes,
): Garment => ({ code, name, worn, ...printed, sizes: offered });

const both = { numbered: true, named: true };
const plain = { numbered: false, named: false };
const shorts = garment('shorts', 'Shorts', 'home and away', plain);

/** The kits a newcomer can start from: our own defaults, all of them to be changed. */
export const starterKits: readonly StarterKit[] = [
  {
    id: 'jersey-and-shorts',
    name: 'Jersey and shorts',
    says: 'One jersey with number and name, worn home and away, and plain shorts',
    garments: [garment('jersey', 'Jersey', 'home and away', both), shorts],
  },
  {
    id: 'two-jerseys-and-shorts',
    name: 'Two jerseys and shorts',
    says: 'A home and an away jersey, each with number and name, and plain shorts',
    garments: [
      garment('home-jersey', 'Home jersey', 'home', both),
      garment('away-jersey', 'Away jersey', 'away', both),
      shorts,
    ],
  },
  {
    id: 'shirt-shorts-and-socks',
    name: 'Shirt, shorts and socks',
    says: 'A shirt and shorts with a number, socks without; a name on the shirt only',
    garments: [
      garment('shirt', 'Shirt', 'home and away', both),
      garment('shorts', 'Shorts', 'home and away', { numbered: true, named: false }),
      garment('socks', 'Socks', 'home and away', plain, sockSizes),
    ],
  },
  {
    id: 'shirt',
    name: 'Shirt only',
    says: 'One shirt with a number and no name',
    garments: [garment('shirt', 'Shirt', 'home and away', { numbered: true, named: false })],
  },
];

/** The starter kit with this id; undefined when there is none. */
export const findStarterKit = (id: string): StarterKit | undefined =>
  starterKits.find((kit) => kit.id === id);
