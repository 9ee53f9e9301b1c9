const ascii = /^[\x21-\x7e]+(?: [\x21-\x7e]+)*$/;
/** ASCII and the ready-made Latin letters: composed already, nothing invisible among them. */
const plain = /^[\x21-\x7e\u00c0-\u02af]+(?: [\x21-\x7e\u00c0-\u02af]+)*$/;

/**
 * Text as a person would read it: composed (NFC), without invisible format characters (direction marks, zero-width
 * spaces, byte-order marks), white space collapsed to single spaces and trimmed. Idempotent; empty stays empty.
 * Zero-width joiners are kept between other characters, because scripts and emoji are spelt with them.
 */
export function tidyText(text: string): string {
  if (plain.test(text)) return text;
  return (
    text
      .replace(/(?![\u200c\u200d])\p{Cf}/gu, '')
      // Only now: an accent behind something invisible belongs to the letter before it.
      .normalize('NFC')
      .replace(/\p{White_Space}+/gu, ' ')
      .replace(/^[ \u200c\u200d]+|[ \u200c\u200d]+$/g, '')
  );
}

/**
 * The form in which two pieces of text are compared: tidied, compatibility-composed (full-width letters become plain
 * ones) and in lower case, independent of any locale.
 */
export const foldText = (text: string): string =>
  ascii.test(text) ? text.toLowerCase() : tidyText(tidyText(text).normalize('NFKC').toLowerCase());
