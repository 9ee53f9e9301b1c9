import { listGraphemes } from './graphemes';

const longestQuote = 30;

/** A piece of what somebody typed, in quotation marks, cut to 30 letters with an ellipsis so a sentence stays short. */
export function quoteText(text: string): string {
  if (text.length <= longestQuote) return `“${text}”`;
  const letters = listGraphemes(text);
  return letters.length <= longestQuote ? `“${text}”` : `“${letters.slice(0, longestQuote - 1).join('')}…”`;
}

/** Words joined the way a sentence does: "a", "a and b", "a, b and c". An empty list gives an empty text. */
export function joinWords(words: readonly string[], conjunction: 'and' | 'or' = 'and'): string {
  const last = words.at(-1) ?? '';
  if (words.length < 2) return last;
  return `${words.slice(0, -1).join(', ')} ${conjunction} ${last}`;
}

/** The text with its first letter as a capital. */
export const capitalise = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
