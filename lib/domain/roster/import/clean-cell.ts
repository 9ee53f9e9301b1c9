import { tidyText } from '../../text/normalise-text';

/** Whether no cell of the row holds anything but white space. */
export const isBlankRow = (row: readonly string[]): boolean => row.every((cell) => cell.trim() === '');

/** Control characters other than tab and line ends, which count as spaces. */
const control = /[\u0000-\u0008\u000E-\u001F\u007F-\u0084\u0086-\u009F]/g;
const invisible = /(?![\u200C\u200D])\p{Cf}/u;
const halves = /\p{Cs}/gu;

/** A cell made fit to keep, and what was done to it that a person should know of (usually nothing). */
export type CleanCell = { text: string; notes: string[] };

/**
 * Makes the text of a cell fit to keep: tidied (`tidyText`), without control characters, and with halves of a
 * character, which no database keeps, shown as U+FFFD. What was taken out is said in `notes`; the text of a cell
 * without letters is empty.
 */
export function cleanCell(raw: string): CleanCell {
  if (/^[\x20-\x7E]*$/.test(raw)) return { text: tidyText(raw), notes: [] };
  const notes: string[] = [];
  const shown = raw.replace(control, '');
  if (shown !== raw || invisible.test(raw)) notes.push('Characters that cannot be seen were taken out.');
  const whole = shown.replace(halves, '\uFFFD');
  if (whole !== shown) notes.push('Half a character could not be read and shows as \uFFFD.');
  return { text: tidyText(whole), notes };
}
