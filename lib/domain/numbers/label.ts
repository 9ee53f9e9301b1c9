import { quoteText } from '../text/sentence';
import { plainDigits } from './decimal-digits';

/**
 * What a typed number says. `label` is digits as worn (leading zeros kept), possibly longer than any rule allows;
 * `readAs` is a sentence when the label differs from what was typed, null when it does not. Otherwise `empty` tells
 * a blank from something that is not one number, `reason` says why, and `parts` are the labels found inside.
 */
export type NumberReading =
  | { ok: true; label: string; readAs: string | null }
  | { ok: false; empty: boolean; reason: string; parts: readonly string[] };

/** The longest run of digits read as one number; longer ones are an id or a telephone number. */
const mostDigitsRead = 20;

const advice = 'Write digits only, such as 7 or 00.';
const invisible = /\p{Cf}/gu;
const notDecimal = /[\p{No}\p{Nl}]/u;
/** No. 7, no 7, nº 7, n° 7, N.º 7, Nr. 7, № 7, Number 7, #7: read after NFKC, which turns º into o and № into No. */
const prefix = /^(?:(?:number|num|nr|n\.?\s?[o°])[.:]?\s*)?#?\s*(?=[0-9])/i;
const plainLabel = /^[0-9]{1,3}$/;

/**
 * Reads what people type for a number: "No. 7", "#07", "7.0" from a spreadsheet, "'07" from a spreadsheet's text cell,
 * digits of any script and full-width digits. It never guesses: "7 or 9", "7/8", "1,5", "7.5", "-3", "seven" and "7a"
 * are not read. Total: any text gets an answer, and a label read once reads as itself.
 */
export function readNumber(text: string): NumberReading {
  if (plainLabel.test(text)) return { ok: true, label: text, readAs: null };
  const typed = text.replace(invisible, '').trim();
  if (typed === '') return { ok: false, empty: true, reason: 'No number is given.', parts: [] };
  const plain = plainDigits(typed).replaceAll('٫', '.').trim();
  if (notDecimal.test(typed)) return refuse(typed, 'is not written in ordinary digits', []);
  const digits = stripDress(plain);
  if (!/^[0-9]+$/.test(digits)) return refuseShape(typed, plain);
  if (digits.length > mostDigitsRead) return refuse(typed, 'is too long to be a number', []);
  return { ok: true, label: digits, readAs: digits === text ? null : `Read as ${digits}.` };
}

/** Takes off what surrounds a number without changing it: a text mark, a word for number, `.0`, a full stop. */
const stripDress = (plain: string): string =>
  plain
    .replace(/^['’‘`]\s*/, '')
    .replace(prefix, '')
    .replace(/^([0-9]+)\.(?:0{1,2})?$/, '$1');

function refuseShape(typed: string, plain: string): NumberReading {
  const parts = plain.match(/[0-9]+/g) ?? [];
  if (parts.length === 0) return refuse(typed, 'has no digits', []);
  if (/^[^0-9]*[0-9]+\s?[.,][0-9]+$/.test(plain)) return refuse(typed, 'is not a whole number', []);
  if (/^[^0-9]*[-−–—]\s?[0-9]+$/.test(plain)) return refuse(typed, 'has a minus sign', parts);
  if (parts.length > 1) return refuse(typed, 'holds more than one number', parts);
  return refuse(typed, 'holds more than a number', parts);
}

function refuse(typed: string, because: string, parts: readonly string[]): NumberReading {
  return { ok: false, empty: false, reason: `${quoteText(typed)} ${because}. ${advice}`, parts };
}
