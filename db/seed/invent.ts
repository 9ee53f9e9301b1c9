import { createHash } from 'node:crypto';
import type { Kit } from '@/lib/domain/kit/kit';

// Everything here is invented. The same words always give the same ids, names and numbers.

/** A UUID that follows from its words alone, so that the demo has the same ids on every machine. */
export function makeId(...words: (string | number)[]): string {
  const hex = createHash('sha256')
    .update(`raglan-demo/${words.join('/')}`)
    .digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}

/** A whole number from 0 up to but not including `below` that follows from its words alone. */
export function pickNumber(below: number, ...words: (string | number)[]): number {
  return createHash('sha256').update(words.join('/')).digest().readUInt32BE(0) % below;
}

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
  'Noor',
  'Ebba',
  'Tove',
  'Rafi',
  'Zoë',
  'Ilse',
  'Bram',
  'Dilys',
  'Emre',
  'Fenna',
  'Gus',
  'Hana',
  'Ivo',
  'Juno',
  'Kaja',
  'Leif',
  'Mina',
  'Nils',
  'Odile',
  'Petra',
  'Quin',
  'Rhea',
  'Siân',
  'Timo',
  'Una',
  'Vito',
  'Willa',
  'Yara',
  'Zeke',
  'Anouk',
  'Bodil',
  'Cato',
  'Dara',
  'Eiril',
  'Femi',
  'Greta',
  'Hugo',
];
const familyNames = [
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
  'Lowmoor',
  'Marwood',
  'Netherby',
  'Okonedo',
  'Pellow',
  'Quarrie',
  'Rushmere',
  'Sandhurst',
  'Tarrant',
  'Underhay',
  'Venning',
  'Wexcombe',
  'Yelland',
  'Ashdene',
  'Birkett',
  'Coldwell',
  'Driscoe',
  'Eastlake',
  'Fernsby',
  'Gorringe',
  'Haverley',
  'Inskip',
  'Jermyn',
  'Kettley',
  'Larkham',
  'Møller',
  'Nwosu',
  'Ormsby',
  'Peña',
  'Quennell',
  'Ravensby',
  'Şimşek',
  'Thornley',
  'Uvarova',
  'Vickary',
  'Wójcik',
  'Zellweg',
  'Averill',
  'Bramhope',
  'Cressing',
  'Dalby',
  'Elwick',
  'Foxcote',
  'Garsdale',
  'Hinton',
  'Ilmer',
  'Jollye',
  'Kersal',
  'Lydgate',
];

/** An invented player of a team: family and given name, unlike any other in that team. */
export function inventPlayer(team: string, index: number): { family: string; given: string } {
  const start = pickNumber(familyNames.length, 'family', team);
  const first = pickNumber(givenNames.length, 'given', team);
  return {
    // Both steps share no factor with the length of their list, so names in one team do not repeat.
    family: familyNames[(start + index * 7) % familyNames.length] ?? 'Adisa',
    given: givenNames[(first + index * 11) % givenNames.length] ?? 'Wren',
  };
}

const cloth = {
  navy: '#14375e',
  silver: '#d9dee3',
  teal: '#2e6f73',
  green: '#1e6b3a',
  chalk: '#f2efe8',
  plum: '#7a2a6c',
  lilac: '#cfb0cf',
  orange: '#c9531d',
  black: '#1d1a16',
  sand: '#e8d8a4',
  bronze: '#7a5a1e',
  red: '#b3241f',
  sky: '#8fc1e3',
  royal: '#2146a0',
  gold: '#e2a81f',
  maroon: '#6b1626',
  mint: '#b9e0cd',
  slate: '#4c5a67',
  white: '#ffffff',
} as const;
type Cloth = keyof typeof cloth;

/** A kit in named demo colours. */
export const makeKit = (body: Cloth, sleeves: Cloth, number: Cloth, outline: Cloth | null = null): Kit => ({
  name: body,
  body: cloth[body],
  sleeves: cloth[sleeves],
  number: cloth[number],
  outline: outline && cloth[outline],
});
