import { cleanCell, isBlankRow } from './clean-cell';
import { isKnownHeading, normaliseHeading } from './heading-words';
import { fileLimits } from './limits';

const looksLikeNumber = (cell: string): boolean => /^\D{0,4}\p{Nd}{1,3}(?:[.,]0+)?$/u.test(cell.trim());

/** Whether a row of words stands over at least one column that holds numbers: headings in words we don't know. */
function standsOverNumbers(rows: readonly (readonly string[])[], at: number): boolean {
  const row = rows[at] ?? [];
  if (row.filter((cell) => cell.trim() !== '').length < 2 || row.some((cell) => looksLikeNumber(cell)))
    return false;
  const below = rows.slice(at + 1, at + 31).filter((other) => !isBlankRow(other));
  return row.some((heading, column) => {
    if (heading.trim() === '') return false;
    const cells = below.map((other) => other[column] ?? '').filter((cell) => cell.trim() !== '');
    return cells.length > 0 && cells.filter(looksLikeNumber).length >= cells.length * 0.8;
  });
}

/**
 * The index of the row of headings, or null when the list starts at once. Looks at the first rows with text, at most
 * 10 of which may be titles: the first row with two known headings, or of one cell only that is one, wins; else the
 * first row of words over a column of numbers.
 */
export function findHeadingRow(rows: readonly (readonly string[])[]): number | null {
  const candidates: number[] = [];
  for (let index = 0; index < rows.length && candidates.length <= fileLimits.aboveHeadings; index += 1) {
    if (!isBlankRow(rows[index] ?? [])) candidates.push(index);
  }
  const widest = Math.max(0, ...candidates.map((index) => filled(rows[index] ?? []).length));
  for (const index of candidates) {
    const cells = filled(rows[index] ?? []);
    const known = cells.filter(isKnownHeading).length;
    // A cell of digits is data even when a heading word stands beside it.
    if (cells.some((cell) => /^\p{Nd}+$/u.test(cell.trim()))) continue;
    if (known >= 2 || (known === 1 && cells.length === widest && cells.length <= 2)) return index;
  }
  return candidates.find((index) => standsOverNumbers(rows, index)) ?? null;
}

const filled = (row: readonly string[]): string[] => row.filter((cell) => cell.trim() !== '');

/** How many rows of data a table holds: rows with text below the headings, or all of them when there are none. */
export function countDataRows(rows: readonly (readonly string[])[]): number {
  const start = (findHeadingRow(rows) ?? -1) + 1;
  let count = 0;
  for (let index = start; index < rows.length; index += 1) if (!isBlankRow(rows[index] ?? [])) count += 1;
  return count;
}

/** The headings of every column, each different from the others, and what had to be done to make them so. */
export type Headings = { headings: string[]; notes: string[] };

/**
 * Names all columns of a table: by the row of headings, or "Column 3" where there is no heading; a heading that comes
 * again is numbered ("Size", "Size 2") and said in `notes`. A heading of over 60 characters is shortened.
 */
export function listHeadings(rows: readonly (readonly string[])[], headingRow: number | null): Headings {
  const width = rows.reduce((most, row) => Math.max(most, row.length), 0);
  const row = headingRow === null ? [] : (rows[headingRow] ?? []);
  const taken = new Set<string>();
  const repeated = new Map<string, number>();
  const headings = Array.from({ length: width }, (_, column) => {
    const text = cleanCell(row[column] ?? '').text;
    const wanted = text === '' ? `Column ${column + 1}` : Array.from(text).slice(0, 60).join('');
    let heading = wanted;
    for (let count = 2; taken.has(heading.toLowerCase()); count += 1) heading = `${wanted} ${count}`;
    if (heading !== wanted) repeated.set(wanted, (repeated.get(wanted) ?? 1) + 1);
    taken.add(heading.toLowerCase());
    return heading;
  });
  const notes = [...repeated].map(
    ([heading, count]) =>
      `${count} columns are called “${heading}”, so they were numbered. Check what each of them holds.`,
  );
  return { headings, notes };
}

/**
 * A signature of a row of headings: equal for files with the same headings in the same order, whatever their case,
 * accents and punctuation. Keeps a column mapping for the next file of the same kind. Empty when there are none.
 */
export const headingSignature = (headings: readonly string[]): string => {
  const words = headings.map(normaliseHeading);
  return words.every((word) => word === '') ? '' : words.join('|');
};
