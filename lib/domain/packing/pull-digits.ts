import type { KitKind } from '../kit/kit';
import type { Piece } from './list-pieces';

export type CharacterCount = { character: string; count: number };

/** The digits wanted in one colour with one outline; `outline` is null for digits of one layer. */
export type DigitPull = {
  number: string;
  outline: string | null;
  /** Who wears these digits on which kit, in the order of the batch. */
  wornBy: { team: string; kitKind: KitKind; colour: string }[];
  /** All ten digits, 0 to 9, with how many to take of each. */
  digits: CharacterCount[];
  /** Letters and other characters of labels that are not digits only, by code point. */
  others: CharacterCount[];
  pieces: number;
  /** Pieces that should have a number while the player has none. */
  withoutNumber: number;
  total: number;
};

/** Common practice, no source: whether one stock piece serves as 6 and as 9 depends on the digit style. */
export const sixAndNineNote =
  '6 and 9 are counted apart. One stock piece can serve both only if the style draws them alike.';

const tenDigits = [...'0123456789'];

/**
 * Which digits to take for the numbered pieces, by number colour and outline. Every character of a number is one
 * application, so the counts add up to the length of all labels in characters, blanks left out. Colours stand in the
 * order in which the pieces name them.
 */
export function pullDigits(pieces: readonly Piece[]): DigitPull[] {
  const groups = new Map<string, Piece[]>();
  for (const piece of pieces.filter(({ garment }) => garment.numbered)) {
    const key = `${piece.kit.number}/${piece.kit.outline ?? ''}`.toLowerCase();
    const group = groups.get(key);
    if (group) group.push(piece);
    else groups.set(key, [piece]);
  }
  return [...groups.values()].map(countDigits);
}

/** The characters of a label that are applied to a garment: all but white space. */
const listLabelCharacters = (label: string): string[] => [...label.replace(/\s/gu, '')];

function countDigits(pieces: readonly Piece[]): DigitPull {
  const counts = new Map<string, number>();
  for (const character of pieces.flatMap((piece) => listLabelCharacters(piece.number))) {
    counts.set(character, (counts.get(character) ?? 0) + 1);
  }
  const kit = pieces[0]?.kit;
  const others = [...counts.keys()]
    .filter((character) => !tenDigits.includes(character))
    .sort((a, b) => (a.codePointAt(0) ?? 0) - (b.codePointAt(0) ?? 0));
  const count = (character: string) => ({ character, count: counts.get(character) ?? 0 });
  return {
    number: kit?.number.toLowerCase() ?? '',
    outline: kit?.outline?.toLowerCase() ?? null,
    wornBy: listWearers(pieces),
    digits: tenDigits.map(count),
    others: others.map(count),
    pieces: pieces.length,
    withoutNumber: pieces.filter((piece) => listLabelCharacters(piece.number).length === 0).length,
    total: [...counts.values()].reduce((sum, n) => sum + n, 0),
  };
}

function listWearers(pieces: readonly Piece[]): DigitPull['wornBy'] {
  const wearers = new Map<string, DigitPull['wornBy'][number]>();
  for (const { team, kitKind, kit } of pieces) {
    wearers.set(`${team.id}/${kitKind}`, { team: team.name, kitKind, colour: kit.name.trim() });
  }
  return [...wearers.values()];
}
