import { guardCell } from '@/lib/domain/roster/import/formula-guard';

/** A cell to write: text, a number that stays a number, or null for an empty cell. */
export type CsvCell = string | number | null;

/** `byteOrderMark` starts the file with U+FEFF, which makes spreadsheets read it as UTF-8 (default: without). */
export type CsvOptions = { byteOrderMark?: boolean };

const needsQuotes = /[",;|\t\r\n]|^\s|\s$/;
const quote = (text: string): string => `"${text.replaceAll('"', '""')}"`;

/**
 * One cell as it stands in the file. Numbers stay bare, also negative ones; text that might run as a formula gets a
 * leading apostrophe and is always quoted; a number that is not finite is written as text.
 */
function writeCell(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number' && Number.isFinite(cell)) return String(cell);
  const text = String(cell);
  const safe = guardCell(text);
  return safe !== text || needsQuotes.test(safe) ? quote(safe) : safe;
}

/** A row of one empty cell is written as "" so that it isn't taken for a blank line. */
function writeRow(cells: readonly CsvCell[]): string {
  const line = cells.map(writeCell).join(',');
  return line === '' ? '""' : line;
}

/**
 * Writes a heading row and rows of cells as CSV: commas, a line end (CR LF) after every row, and quotes where a cell
 * holds a separator, a quote, a line end or outer spaces (source: RFC 4180, section 2; semicolon, bar and tab are
 * quoted too so that a file opened with another separator keeps its cells). Formula-looking text is neutralised with
 * a leading apostrophe (source: OWASP, CSV Injection), which `parseTable` takes off again: reading what was written
 * gives back every text cell exactly.
 */
export function writeCsv(
  headings: readonly string[],
  rows: readonly (readonly CsvCell[])[],
  options: CsvOptions = {},
): string {
  const lines = [headings, ...rows].map((row) => `${writeRow(row)}\r\n`);
  return (options.byteOrderMark ? '\uFEFF' : '') + lines.join('');
}
