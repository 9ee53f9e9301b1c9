import { rankSize, readSize } from '../../rules/checks/read-size';
import { foldText } from '../../text/normalise-text';
import type { Garment } from '../player';

/** Without spaces, full stops and brackets, and with one kind of dash: "9 – 10" and "9/10" are "9-10". */
const bare = (text: string): string =>
  foldText(text)
    .replace(/[\u2010-\u2015\u2212/]/g, '-')
    .replace(/[\s._()[\]'’]/g, '');

/** How a size ranks, also when the words stand the other way round: "medium (youth)". */
function rankWords(text: string): string | null {
  const turned = text
    .split(/[\s()[\],]+/)
    .reverse()
    .join(' ');
  const rank = rankSize(text) ?? rankSize(turned);
  return rank === null || rank.group === 'number' ? null : `${rank.group} ${rank.rank}`;
}

/**
 * The code of the offered size that a person meant, or null: its code or label whatever the case, spaces and dashes,
 * or the same size in words ("Youth medium" for YM, "XXL" for 2XL). A text that could be two of the sizes offered is
 * nobody's guess: null.
 */
export function findSize(garment: Garment, text: string): string | null {
  const named = readSize(garment, text);
  if (named !== null) return named;
  const wanted = bare(text);
  if (wanted === '') return null;
  const same = garment.sizes.filter(({ code, label }) => bare(code) === wanted || bare(label) === wanted);
  const rank = rankWords(text);
  const found =
    same.length > 0 || rank === null
      ? same
      : garment.sizes.filter(({ code, label }) => (rankWords(code) ?? rankWords(label)) === rank);
  return found.length === 1 ? (found[0]?.code ?? null) : null;
}
