import { fail, succeed, type Result } from '../result';
import { quoteText } from '../text/sentence';
import { plainDigits } from './decimal-digits';

/** By value, and for one value the longer label first: 00, 0, 1, 2, … 10. */
export const compareLabels = (a: string, b: string): number => Number(a) - Number(b) || b.length - a.length;

/** The longest text a rule set may hold for its labels; longer is refused before it is read. */
const longestText = 400;

/**
 * Reads labels written as ranges and single labels ("0, 00, 1–5, 10-15"; commas, semicolons or spaces; hyphen or
 * dash) into a list without repeats in wearing order (00, 0, 1, 2 …). A range with leading zeros keeps them (01-03 is
 * 01, 02, 03). Letters, reversed ranges, more than three digits and ranges from 00 are refused with a sentence.
 */
export function parseAllowedLabels(text: string): Result<string[], string> {
  if (text.length > longestText) return fail(`Write the numbers in at most ${longestText} characters.`);
  const tokens = plainDigits(text)
    .replace(/\s*[-‐‑‒–—−]\s*/g, '-')
    .split(/[,;\s]+/)
    .filter((token) => token !== '');
  if (tokens.length === 0) return fail('Name at least one number, such as 0, 00, 1-99.');
  const labels = new Set<string>();
  for (const token of tokens) {
    const read = parseToken(token);
    if (!read.ok) return read;
    for (const label of read.value) labels.add(label);
  }
  return succeed([...labels].sort(compareLabels));
}

function parseToken(token: string): Result<string[], string> {
  const shape = /^([0-9]+)(?:-([0-9]+))?$/.exec(token);
  const from = shape?.[1];
  if (from === undefined) {
    return fail(`${quoteText(token)} is neither a number nor a range. Write it like 7, 00 or 10-15.`);
  }
  const to = shape?.[2] ?? from;
  if (from.length > 3 || to.length > 3) return fail(`${quoteText(token)} has more than three digits.`);
  return shape?.[2] === undefined ? succeed([from]) : spreadRange(from, to);
}

function spreadRange(from: string, to: string): Result<string[], string> {
  const range = `${from}-${to}`;
  if (Number(from) > Number(to)) return fail(`${quoteText(range)} runs backwards. Write ${to}-${from}.`);
  if (/^00+$/.test(from)) {
    return fail(`${quoteText(range)} starts at ${from}. Write ${from}, 0-${Number(to)} instead.`);
  }
  const padded = (from.length > 1 && from.startsWith('0')) || (to.length > 1 && to.startsWith('0'));
  if (padded && from.length !== to.length) {
    return fail(`${quoteText(range)} mixes leading zeros. Write both ends with the same number of digits.`);
  }
  const width = padded ? from.length : 1;
  const count = Number(to) - Number(from) + 1;
  return succeed(Array.from({ length: count }, (_, i) => String(Number(from) + i).padStart(width, '0')));
}

/**
 * Labels as a person would write them, runs of three or more joined by a dash: "0, 00, 1–5, 10–15". Only labels
 * without leading zeros join a run. The order given is kept, except that 0 is written before 00.
 */
export function writeLabels(labels: readonly string[]): string {
  const pieces: string[] = labels.filter((label) => /^0+[0-9]/.test(label));
  const values = labels.filter((label) => !/^0+[0-9]/.test(label)).map(Number);
  for (let i = 0; i < values.length;) {
    let end = i;
    while (values[end + 1] === (values[end] ?? 0) + 1 && !(values[i] === 0 && pieces.includes('00')))
      end += 1;
    pieces.push(...(end - i < 2 ? values.slice(i, end + 1).map(String) : [`${values[i]}–${values[end]}`]));
    i = end + 1;
  }
  return pieces
    .sort((a, b) => Number.parseInt(a, 10) - Number.parseInt(b, 10) || a.length - b.length)
    .join(', ');
}
