const nd = /\p{Nd}/u;

/** The value 0–9 of one decimal digit of any script; Unicode keeps them in runs of ten that begin at zero. */
function readDigit(digit: string): string {
  const at = digit.codePointAt(0) ?? 0;
  let start = at;
  while (nd.test(String.fromCodePoint(start - 1))) start -= 1;
  return String((at - start) % 10);
}

/**
 * Text with the decimal digits of every script (Arabic, Devanagari, full-width and so on, Unicode category Nd) written
 * as 0–9 and other characters in compatibility form (NFKC). Fractions, superscripts and circled numbers are no decimal
 * digits; callers that must not read them look for \p{No} and \p{Nl} first.
 */
export const plainDigits = (text: string): string =>
  text.normalize('NFKC').replace(/(?![0-9])\p{Nd}/gu, readDigit);
