const plain = /^[A-Za-z .'-]*$/;
const latin = /^(?:\p{Script=Latin}\p{M}*|[ \-'’.])*$/u;
const piece = /\p{Script=Latin}\p{M}*|[ \-'’.]/gu;

/** Marks that are typed for an apostrophe or a hyphen, with what they stand for. */
const standIns: Record<string, string> = {
  '`': "'",
  '´': "'",
  ʼ: "'",
  ʹ: "'",
  '‘': "'",
  '′': "'",
  '‐': '-',
  '‑': '-',
  '–': '-',
  '—': '-',
  _: ' ',
};

/**
 * Whether a text holds Latin letters only (Unicode script Latin with its marks), spaces, hyphens, apostrophes and full
 * stops, after composing (NFC). An empty text does.
 */
export const isLatinText = (text: string): boolean => plain.test(text) || latin.test(text.normalize('NFC'));

/** The characters of a text that are none of these, each once, in order. */
export const listNonLatin = (text: string): string[] => [
  ...new Set(text.normalize('NFC').replace(piece, '')),
];

/** The text with stand-ins for apostrophe and hyphen put right and everything else that is not Latin left out. */
export function keepLatin(text: string): string {
  const put = text
    .normalize('NFC')
    .replace(/[^\p{L}\p{M}\p{N} ]|\u02b9|\u02bc/gu, (mark) => standIns[mark] ?? mark);
  const kept = put.normalize('NFKC').match(piece) ?? [];
  return kept.join('').replace(/ +/g, ' ').trim();
}
