import { tidyText } from './normalise-text';

/** A person's name taken apart; either part may be empty. */
export type PersonName = { given: string; surname: string };

/** Small words that belong to the surname after them (von, de la, bin); common practice, no source. */
const particles = new Set(
  'af al av bin binti da das de del della den der di dos du el ibn la las le lo los mac san st te ten ter van vom von y zu zum zur'.split(
    ' ',
  ),
);

/** What follows a surname without being one; common practice, no source. */
const suffixes = new Set(['jr', 'jnr', 'sr', 'snr', 'ii', 'iii', 'iv']);

const bare = (word: string): string => word.replace(/[.,]/g, '').toLowerCase();

/**
 * Takes a name apart by rule of thumb: "Dunmore, Pip" at its first comma, "Pip van der Dunmore" before the last word
 * and the particles in front of it; Jr, Sr, II, III and IV are left off. A single word is a surname. It is a guess,
 * fit for a suggestion or for naming somebody in a sentence, never for changing what was typed.
 */
export function splitPersonName(name: string): PersonName {
  const tidy = tidyText(name);
  const comma = tidy.search(/[,،，]/);
  if (comma >= 0) {
    const before = tidy.slice(0, comma).trim();
    const after = tidy
      .slice(comma + 1)
      .replace(/[,،，]/g, ' ')
      .trim();
    if (suffixes.has(bare(after))) return splitPersonName(before);
    return before === '' ? splitWords(after) : { given: after, surname: withoutSuffix(before) };
  }
  return splitWords(tidy);
}

function splitWords(name: string): PersonName {
  const words = withoutSuffix(name).split(' ');
  let from = words.length - 1;
  while (from > 1 && particles.has(bare(words[from - 1] ?? ''))) from -= 1;
  return { given: words.slice(0, from).join(' '), surname: words.slice(from).join(' ') };
}

function withoutSuffix(name: string): string {
  const words = name.split(' ');
  return words.length > 1 && suffixes.has(bare(words.at(-1) ?? '')) ? words.slice(0, -1).join(' ') : name;
}
