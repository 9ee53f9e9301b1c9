import { readNumber } from '../../numbers/label';
import { countOf } from '../../text/count-of';
import { quoteText } from '../../text/sentence';
import { playerLimits, type Garment, type RosterLine } from '../player';
import { cleanCell, isBlankRow } from './clean-cell';
import type { ColumnMapping, ColumnTarget } from './column-mapping';
import { listHeadings } from './find-headings';
import { looksLikeFormula } from './formula-guard';
import { normaliseHeading, type PlayerField } from './heading-words';
import { findSize } from './match-size';

/** A row that became a line of the roster. `rowNumber` counts from 1 as a spreadsheet does; `notes` are sentences. */
export type ReadLine = {
  rowNumber: number;
  line: RosterLine;
  extra: Record<string, string>;
  notes: string[];
};

/** A row that did not: its cells as they stood in the file, and the sentence that says why. */
export type RefusedRow = { rowNumber: number; cells: string[]; reason: string };

/** Every row of the table is in exactly one of these counts: `rows` is the sum of the other five. */
export type RowCounts = {
  rows: number;
  lines: number;
  refused: number;
  blank: number;
  headings: number;
  aboveHeadings: number;
};

/** `notes` are about the list as a whole; `leftOut` names the columns a person chose to leave out. */
export type RosterReading = {
  lines: ReadLine[];
  refused: RefusedRow[];
  counts: RowCounts;
  leftOut: string[];
  notes: string[];
};

/** What stands first in a row of sums, in several languages. Common practice, no source. */
const totalWords =
  /^(?:(?:grand |sub ?)?totals?|gesamt|gesamtsumme|summe|somme|totaal|totalt|totale)(?: (?:number )?(?:of )?(?:players|shirts|kits|pieces|teams))?(?: \p{Nd}+)?$|^(?:number of players|player count|head count)(?: \p{Nd}+)?$/u;

/** Most rows are players: one quick look spares them the careful one. */
const mayBeTotal = /tot|gesamt|summe|somme|players|count/i;

/**
 * Whether a row says of itself that it is a sum of the rows above: it begins with a word for a total, and no other
 * cell holds a word (Total is somebody's surname when a first name stands beside it).
 */
function isTotalsRow(cells: readonly string[]): boolean {
  const [first, ...others] = cells.filter((cell) => cell.trim() !== '');
  return (
    first !== undefined &&
    mayBeTotal.test(first) &&
    totalWords.test(normaliseHeading(first)) &&
    others.every((cell) => /\p{N}/u.test(cell) || !/\p{L}/u.test(cell))
  );
}

const plainCell = (cell: string | undefined): string => (cell ?? '').trim().toLowerCase();
const sameCells = (row: readonly string[], other: readonly string[]): boolean =>
  (row.length >= other.length ? row : other).every(
    (_, index) => plainCell(row[index]) === plainCell(other[index]),
  );

/** Why a row below the headings is no player, or null: the headings again, or a row of sums. */
export function explainNonEntry(row: readonly string[], header: readonly string[]): string | null {
  if (header.length > 0 && sameCells(row, header)) return 'This row repeats the headings.';
  if (isTotalsRow(row)) return 'This row looks like a total, not a player or a team. Rename it if it is one.';
  return null;
}

/** The cells of one row by what they hold, before anything is read from them. */
type SortedRow = {
  fields: Partial<Record<PlayerField, string>>;
  sizes: Map<string, string>;
  extra: Map<string, string>;
  notes: string[];
};

/** Puts each cell where its column's target says; cells beyond the last mapped column are extra. */
function sortCells(
  row: readonly string[],
  columns: readonly ColumnTarget[],
  headings: readonly string[],
): SortedRow {
  const sorted: SortedRow = { fields: {}, sizes: new Map(), extra: new Map(), notes: [] };
  for (const [column, raw] of row.entries()) {
    const target = columns[column] ?? { field: 'extra' };
    if (target.field === 'leave out') continue;
    const { text, notes } = cleanCell(raw);
    if (text === '') continue;
    const heading = headings[column] ?? `Column ${column + 1}`;
    sorted.notes.push(...notes.map((note) => `${heading}: ${note}`));
    if (/^[=@]/.test(text) && looksLikeFormula(text)) {
      sorted.notes.push(
        `${heading}: ${quoteText(text)} looks like a formula. It was kept as text and not worked out.`,
      );
    }
    if (target.field === 'extra') sorted.extra.set(heading, text);
    else if (target.field === 'size') for (const garment of target.garments) sorted.sizes.set(garment, text);
    else sorted.fields[target.field] = text;
  }
  return sorted;
}

/** "Last, First" from its parts, or the one part there is. */
function joinName({ name, firstName, lastName }: SortedRow['fields']): string {
  if (name !== undefined) return name;
  return [lastName, firstName].filter((part) => part !== undefined).join(', ');
}

/** The number to keep: the label read, or what was typed when it can't be read, for the roster check to show. */
function keepNumber(typed: string): { number: string; note: string | null } {
  const reading = readNumber(typed);
  if (!reading.ok) return { number: typed, note: null };
  const note = reading.label === typed ? null : `Number ${quoteText(typed)} was read as ${reading.label}.`;
  return { number: reading.label, note };
}

type KeptSize = { size: string; note: string | null };

function keepSize(typed: string, garment: Garment | undefined): KeptSize {
  const code = garment ? findSize(garment, typed) : null;
  if (code === null) return { size: typed, note: null };
  const differs = code.toLowerCase() !== typed.toLowerCase();
  const note = differs ? `${garment?.name ?? 'Size'}: ${quoteText(typed)} was read as ${code}.` : null;
  return { size: code, note };
}

/** `keepSize` for the garments of one kit, each text of a size worked out once for all rows. */
function rememberSizes(garments: readonly Garment[]): (garment: string, typed: string) => KeptSize {
  const byCode = new Map(garments.map((garment) => [garment.code, garment]));
  const known = new Map<string, KeptSize>();
  return (code, typed) => {
    const key = `${code} ${typed}`;
    const kept = known.get(key) ?? keepSize(typed, byCode.get(code));
    known.set(key, kept);
    return kept;
  };
}

/** The first entry over its limit as a sentence, or null. Limits count UTF-16 units, as the stored schema does. */
function explainOverlong(
  line: RosterLine,
  extra: Map<string, string>,
  garments: Map<string, Garment>,
): string | null {
  const entries: [string, string, number][] = [
    ['name', line.name, playerLimits.name],
    ['name on the back', line.nameOnBack, playerLimits.nameOnBack],
    ['number', line.number, playerLimits.number],
    ['role', line.role, playerLimits.role],
    ...Object.entries(line.sizes).map(([code, size]): [string, string, number] => [
      `size of ${garments.get(code)?.name ?? code}`,
      size,
      playerLimits.size,
    ]),
    ...[...extra].map(([heading, text]): [string, string, number] => [heading, text, playerLimits.note]),
  ];
  const over = entries.find(([, text, most]) => text.length > most);
  if (!over) return null;
  const [what, text, most] = over;
  return `The ${what} has ${text.length} characters and the most is ${most}. Shorten it in the file, or type this player in by hand.`;
}

/** Reads one row with text in it: a line, or the reason why it is none. */
function readRow(
  row: readonly string[],
  columns: readonly ColumnTarget[],
  headings: readonly string[],
  garments: Map<string, Garment>,
  sizeOf: (garment: string, typed: string) => KeptSize,
): Omit<ReadLine, 'rowNumber'> | string {
  const { fields, sizes, extra, notes } = sortCells(row, columns, headings);
  const { number, note } = keepNumber(fields.number ?? '');
  if (note !== null) notes.push(note);
  const keptSizes = [...sizes].map(([code, typed]): [string, string] => {
    const kept = sizeOf(code, typed);
    if (kept.note !== null) notes.push(kept.note);
    return [code, kept.size];
  });
  const line: RosterLine = {
    name: joinName(fields),
    nameOnBack: fields.nameOnBack ?? '',
    number,
    role: fields.role ?? '',
    sizes: Object.fromEntries(keptSizes),
  };
  if (Object.keys(fields).length === 0 && sizes.size === 0) {
    return 'This row has nothing in the columns that were matched. Check which column holds the name and which the number.';
  }
  return explainOverlong(line, extra, garments) ?? { line, extra: Object.fromEntries(extra), notes };
}

/**
 * Reads a table of players by a mapping. Every row ends up in exactly one place: as a line, refused with a reason, or
 * counted as blank, as the headings or as a title above them. Numbers and sizes are kept as read when they can be read
 * and as typed when not; the roster check says what is wrong with them. Never throws; at most 2,000 rows are expected.
 */
export function readRoster(
  rows: readonly (readonly string[])[],
  mapping: ColumnMapping,
  garments: readonly Garment[],
): RosterReading {
  const { headerRow, columns } = mapping;
  const { headings, notes } = listHeadings(rows, headerRow);
  const header = headerRow === null ? [] : (rows[headerRow] ?? []);
  const byCode = new Map(garments.map((garment) => [garment.code, garment]));
  const sizeOf = rememberSizes(garments);
  const lines: ReadLine[] = [];
  const refused: RefusedRow[] = [];
  const counts: RowCounts = {
    rows: rows.length,
    lines: 0,
    refused: 0,
    blank: 0,
    headings: 0,
    aboveHeadings: 0,
  };
  for (const [index, row] of rows.entries()) {
    const rowNumber = index + 1;
    if (index === headerRow) counts.headings += 1;
    else if (isBlankRow(row)) counts.blank += 1;
    else if (headerRow !== null && index < headerRow) counts.aboveHeadings += 1;
    else {
      const read = explainNonEntry(row, header) ?? readRow(row, columns, headings, byCode, sizeOf);
      if (typeof read === 'string') refused.push({ rowNumber, cells: [...row], reason: read });
      else lines.push({ rowNumber, ...read });
    }
  }
  counts.lines = lines.length;
  counts.refused = refused.length;
  const leftOut = headings.filter((_, column) => columns[column]?.field === 'leave out');
  if (counts.aboveHeadings > 0) {
    notes.push(
      `${countOf(counts.aboveHeadings, 'line')} above the headings ${counts.aboveHeadings === 1 ? 'was' : 'were'} taken for a title.`,
    );
  }
  if (!columns.some(({ field }) => field === 'number')) notes.push('No column was matched with the number.');
  if (!columns.some(({ field }) => /name$/i.test(field))) notes.push('No column was matched with the name.');
  return { lines, refused, counts, leftOut, notes };
}
