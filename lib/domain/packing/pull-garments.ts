import { noSize, type Piece } from './list-pieces';
import { orderSizes } from './order-sizes';

/** How many pieces of one size; `code` is `''` for pieces without a size, `known` false for one outside the run. */
type SizeCount = { code: string; label: string; count: number; known: boolean };

/** The pieces of one style in one colour. `sizes` holds the sizes wanted, in the order of the run, "no size" last. */
export type ColourPull = {
  colour: string;
  body: string;
  sleeves: string;
  sizes: SizeCount[];
  total: number;
};

/** One style of garment with its colours; `sizes` are the sizes wanted in any of them, in the order of the run. */
export type GarmentPull = {
  style: string;
  sizes: { code: string; label: string; known: boolean }[];
  colours: ColourPull[];
  total: number;
};

/**
 * What to take from the shelf: pieces counted by style (the garment's name), colour (the kit's name with the colours of
 * body and sleeves) and size. Styles stand in the order in which the pieces name them, colours by name. The counts add
 * up to the number of pieces: one without a size counts as "no size", one outside its run under the size as typed.
 */
export function pullGarments(pieces: readonly Piece[]): GarmentPull[] {
  return [...groupBy(pieces, (piece) => piece.garment.name)].map(([style, ofStyle]) => {
    const sizes = listSizes(ofStyle);
    const colours = [...groupBy(ofStyle, colourKey)]
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([, ofColour]) => countColour(ofColour, sizes));
    return { style, sizes, colours, total: ofStyle.length };
  });
}

const colourKey = ({ kit }: Piece): string =>
  [kit.name.trim(), kit.body, kit.sleeves].map((part) => part.toLowerCase()).join('\u0000');

function countColour(pieces: readonly Piece[], sizes: GarmentPull['sizes']): ColourPull {
  const kit = pieces[0]?.kit;
  return {
    colour: kit?.name.trim() ?? '',
    body: kit?.body.toLowerCase() ?? '',
    sleeves: kit?.sleeves.toLowerCase() ?? '',
    sizes: sizes
      .map((size) => ({ ...size, count: pieces.filter((piece) => piece.size === size.code).length }))
      .filter((size) => size.count > 0),
    total: pieces.length,
  };
}

/** The sizes these pieces ask for: those of the runs in order, then others as typed, then "no size". */
function listSizes(pieces: readonly Piece[]): GarmentPull['sizes'] {
  const runs = [...new Set(pieces.map((piece) => piece.garment))].map((garment) => garment.sizes);
  const wanted = new Set(pieces.map((piece) => piece.size));
  const labels = new Map(runs.flat().map((size) => [size.code, size.label]));
  const known = orderSizes(runs.map((run) => run.map((size) => size.code))).filter((code) =>
    wanted.has(code),
  );
  const others = [...wanted].filter((code) => code !== '' && !labels.has(code)).sort();
  return [
    ...known.map((code) => ({ code, label: labels.get(code) ?? code, known: true })),
    ...others.map((code) => ({ code, label: code, known: false })),
    ...(wanted.has('') ? [{ code: '', label: noSize, known: false }] : []),
  ];
}

function groupBy<T>(items: readonly T[], keyOf: (item: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}
