import { type Garment } from '../../roster/player';
import { foldText } from '../../text/normalise-text';

/** The group a size belongs to; sizes of different groups are compared only when there is nothing nearer. */
type SizeRank = { group: string; rank: number };

/** Letter sizes in order, S at 0. Common practice, no source. */
const letters: Record<string, number> = { s: 0, small: 0, m: 1, medium: 1, l: 2, large: 2 };
const groups: Record<string, string> = {
  y: 'youth',
  youth: 'youth',
  child: 'youth',
  kids: 'youth',
  junior: 'youth',
  w: 'women',
  women: 'women',
  womens: 'women',
  ladies: 'women',
  a: 'adult',
  adult: 'adult',
  men: 'adult',
  mens: 'adult',
};

/** Where a size stands among its like: "YM", "youth medium", "XXL", "2XL", "Adult S", "32"; null when unknown. */
export function rankSize(text: string): SizeRank | null {
  const words = foldText(text)
    .replace(/['’]/g, '')
    .replace(/[^a-z0-9]+/g, ' ')
    .trim();
  const number = /^([0-9]{1,3})(?: ([0-9]{1,3}))?$/.exec(words);
  if (number) return { group: 'number', rank: Number(number[1]) };
  const [, prefix = '', rest = ''] =
    /^(youth|child|kids|junior|womens?|ladies|adult|mens?|[ywa](?! ?$))? ?(.*)$/.exec(words) ?? [];
  const shape = /^(?:([0-9]) ?|(x+) ?)?(?:(x|extra) ?)?(small|medium|large|s|m|l)$/.exec(rest);
  const base = shape === null ? undefined : letters[shape[4] ?? ''];
  if (shape === null || base === undefined) return null;
  const extras =
    (shape[1] === undefined ? 0 : Number(shape[1])) || (shape[2]?.length ?? 0) + (shape[3] ? 1 : 0);
  const step = base === 0 ? -extras : extras;
  return { group: groups[prefix] ?? 'adult', rank: base + step };
}

/**
 * The offered size that a text names: its code, or its code or label without regard to case and spaces. Null when it
 * names none. For reading files; the check itself wants the code.
 */
export function readSize(garment: Garment, text: string): string | null {
  const exact = garment.sizes.find((size) => size.code === text);
  if (exact) return exact.code;
  const wanted = foldText(text).replaceAll(' ', '');
  if (wanted === '') return null;
  const match = garment.sizes.find((size) =>
    [size.code, size.label].some((name) => foldText(name).replaceAll(' ', '') === wanted),
  );
  return match?.code ?? null;
}

/**
 * Up to two offered sizes nearest to what was written, the larger first when two are as near (a size that is between
 * two goes up: common practice, no source). Empty when the text is no size anybody knows.
 */
export function suggestSizes(garment: Garment, text: string): string[] {
  const named = readSize(garment, text);
  if (named !== null) return [named];
  const wanted = rankSize(text);
  if (wanted === null) return [];
  return garment.sizes
    .flatMap((size) => {
      const rank = rankSize(size.code) ?? rankSize(size.label);
      return rank === null || rank.group !== wanted.group ? [] : [{ code: size.code, rank: rank.rank }];
    })
    .sort((a, b) => Math.abs(a.rank - wanted.rank) - Math.abs(b.rank - wanted.rank) || b.rank - a.rank)
    .slice(0, 2)
    .map((size) => size.code);
}
