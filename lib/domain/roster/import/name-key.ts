import { foldText } from '../../text/normalise-text';

/** Letters that are no letter with an accent to Unicode, but are written without one where a keyboard lacks them. */
// prettier-ignore
const plainLetters: Record<string, string> = {
  ł: 'l', ø: 'o', đ: 'd', ð: 'd', ß: 'ss', æ: 'ae', œ: 'oe', þ: 'th', ı: 'i', ħ: 'h',
};

/** Accents and points whose absence doesn't make another name: Latin, Greek and Cyrillic accents, Hebrew and Arabic points. */
const accents = /[\u0300-\u036F\u0591-\u05C7\u0610-\u061A\u064B-\u065F\u0670]/g;

/**
 * The form in which two files write one person's name alike: "Dunmore, Pip" turned round, lower case, without accents,
 * hyphens, apostrophes and full stops. Vowel signs of Indic and other scripts stay, since without them names differ.
 */
export function nameKey(name: string): string {
  const folded = foldText(name);
  const comma = folded.search(/[,،，]/);
  const turned = comma < 0 ? folded : `${folded.slice(comma + 1)} ${folded.slice(0, comma)}`;
  return turned
    .normalize('NFD')
    .replace(accents, '')
    .replace(/[łøđðßæœþıħ]/g, (letter) => plainLetters[letter] ?? letter)
    .replace(/['’‘`´.]/g, '')
    .replace(/[^\p{L}\p{M}\p{N}]+/gu, ' ')
    .trim();
}

/** The same words in any order: names that may be one person's when one of them was written last name first. */
export const nameWordsKey = (name: string): string => nameKey(name).split(' ').sort().join(' ');
