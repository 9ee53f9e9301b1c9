import Papa from 'papaparse';
import { unguardCell } from './formula-guard';
import { fileLimits, refuseColumnCount, refuseRowCount, refuseSize } from './limits';
import { countDataRows } from './find-headings';
import { isBlankRow } from './clean-cell';
import { refuse, type Refusal } from './refusal';

export type Delimiter = ',' | ';' | '\t' | '|';

/** How the rows of a text end; `mixed` when there are several kinds, `none` when there is one row only. */
type LineEnd = 'CRLF' | 'LF' | 'CR' | 'mixed' | 'none';

/** Something wrong with one row that was nevertheless kept; `rowNumber` counts from 1 as a spreadsheet does. */
export type TableProblem = { rowNumber: number; message: string };

/**
 * Delimited text as rows of cells, every row of the file in its place: `rows[0]` is row 1. Blank rows are kept as rows
 * without text and counted in `blankRows`. Rows may differ in length; `notes` says so.
 */
export type Table = {
  rows: string[][];
  delimiter: Delimiter;
  lineEnd: LineEnd;
  blankRows: number;
  problems: TableProblem[];
  notes: string[];
};
export type TableResult = { ok: true; table: Table } | Refusal;

/** Far beyond any list: a text with more line ends than this is refused before it is taken apart. */
const mostLines = 200_000;

function countLineEnds(text: string): number {
  let count = 0;
  for (let index = 0; index < text.length; index += 1) {
    const code = text.charCodeAt(index);
    if (code === 10 || (code === 13 && text.charCodeAt(index + 1) !== 10)) count += 1;
  }
  return count;
}

/** The line ends that stand outside quotes; when quotes hide them all, those that stand anywhere. */
function findLineEnd(text: string): LineEnd {
  const outside = text.replace(/"[^"]*"/g, '""');
  const kinds = (part: string): LineEnd[] => {
    const found = new Set(part.match(/\r\n|\r|\n/g));
    return [
      ...(found.has('\r\n') ? (['CRLF'] as const) : []),
      ...(found.has('\n') ? (['LF'] as const) : []),
      ...(found.has('\r') ? (['CR'] as const) : []),
    ];
  };
  const ends = kinds(outside);
  const seen = ends.length > 0 ? ends : kinds(text);
  return seen.length > 1 ? 'mixed' : (seen[0] ?? 'none');
}

const newlines = { CRLF: '\r\n', LF: '\n', CR: '\r', mixed: '\n', none: '\n' } as const;

/** Which separator cuts the first rows into the most even columns; a comma when none does. */
function findDelimiter(text: string, newline: '\r\n' | '\n' | '\r'): Delimiter {
  const start = text.slice(0, 20_000);
  let best: { delimiter: Delimiter; even: number; columns: number } = { delimiter: ',', even: 0, columns: 1 };
  // The comma comes last: at a draw it is the one that also stands inside names.
  for (const delimiter of ['\t', ';', '|', ','] as const) {
    const { data } = Papa.parse<string[]>(start, { delimiter, newline, preview: 40 });
    const widths = new Map<number, number>();
    for (const row of data) {
      if (!isBlankRow(row) && row.length > 1) widths.set(row.length, (widths.get(row.length) ?? 0) + 1);
    }
    for (const [columns, even] of widths) {
      if (
        even > best.even ||
        (even === best.even && best.delimiter === delimiter && columns > best.columns)
      ) {
        best = { delimiter, even, columns };
      }
    }
  }
  return best.delimiter;
}

/** Rows with broken quotes that are repaired one by one; beyond this the rest is read without regard to quotes. */
const mostRepairs = 50;

/**
 * Takes the text apart. A row whose quotes don't pair up would swallow the rows below it, so it is read as one line
 * with its quotes as ordinary characters, and reported; reading goes on with the next line.
 */
function readRecords(
  text: string,
  delimiter: Delimiter,
  newline: '\r\n' | '\n' | '\r',
): { rows: string[][]; problems: TableProblem[] } {
  const rows: string[][] = [];
  const problems: TableProblem[] = [];
  const lineAt = (from: number): { line: string; next: number } => {
    const end = text.indexOf(newline, from);
    if (end === -1) return { line: text.slice(from), next: text.length };
    return { line: text.slice(from, end), next: end + newline.length };
  };
  let from = 0;
  while (from < text.length) {
    if (problems.length >= mostRepairs) {
      problems.push({
        rowNumber: rows.length + 1,
        message:
          'Too many rows have quotes that do not pair up. From this row on, quotes were kept as ordinary characters.',
      });
      while (from < text.length) {
        const { line, next } = lineAt(from);
        rows.push(line.split(delimiter));
        from = next;
      }
      break;
    }
    const base = from;
    let done = base;
    let broken = false;
    Papa.parse<string[]>(base === 0 ? text : text.slice(base), {
      delimiter,
      newline,
      step: ({ data, errors, meta }, parser) => {
        if (errors.some((error) => error.type === 'Quotes')) {
          broken = true;
          parser.abort();
          return;
        }
        // The parser also reports the nothing after the last line end.
        if (base + meta.cursor > done) rows.push(data);
        done = base + meta.cursor;
      },
    });
    from = done;
    if (!broken) break;
    const { line, next } = lineAt(from);
    rows.push(line.split(delimiter));
    problems.push({
      rowNumber: rows.length,
      message:
        'A quotation mark in this row has no partner, so its quotes were kept as ordinary characters. Check the cells of this row.',
    });
    from = next;
  }
  return { rows, problems };
}

/** Says which rows are longer or shorter than the others, when some are. */
function noteRaggedRows(rows: readonly (readonly string[])[]): string[] {
  const widths = new Map<number, number>();
  for (const row of rows) if (!isBlankRow(row)) widths.set(row.length, (widths.get(row.length) ?? 0) + 1);
  if (widths.size < 2) return [];
  const [usual] = [...widths].sort(([, a], [, b]) => b - a)[0] ?? [0];
  const odd = rows.flatMap((row, index) => (isBlankRow(row) || row.length === usual ? [] : [index + 1]));
  const listed = odd.slice(0, 5).join(', ') + (odd.length > 5 ? ` and ${odd.length - 5} more` : '');
  return [
    `Most rows have ${usual} ${usual === 1 ? 'cell' : 'cells'}; ${odd.length === 1 ? 'row' : 'rows'} ${listed} ${odd.length === 1 ? 'has' : 'have'} another number of them. All cells were kept.`,
  ];
}

/** Some programs write hundreds of empty cells after the last column: they go, as only they can. */
function trimWideRow(row: string[]): string[] {
  if (row.length <= fileLimits.columns) return row;
  const last = row.findLastIndex((cell) => cell.trim() !== '');
  return row.slice(0, Math.max(last + 1, fileLimits.columns));
}

/**
 * Takes delimited text (a CSV or TSV file, or cells pasted from a spreadsheet) apart into rows of cells. The separator
 * is found among , ; tab and | unless given; any line end will do. Cells are text exactly as written, less the one
 * apostrophe `guardCell` may have put in front. Refuses empty text, more than 5 MB, 2,000 rows of data or 100 columns,
 * saying how many there are; nothing else is refused and no row is dropped. Never throws.
 */
export function parseTable(input: string, options: { delimiter?: Delimiter } = {}): TableResult {
  const text = input.startsWith('\uFEFF') ? input.slice(1) : input;
  if (text.trim() === '')
    return refuse('empty', 'There is no text here. Paste the list, or choose the file that holds it.');
  const tooLarge = refuseSize(text.length);
  if (tooLarge) return tooLarge;
  if (countLineEnds(text) > mostLines)
    return refuseRowCount(mostLines, 'at least') ?? refuse('too-many-rows', '');
  const lineEnd = findLineEnd(text);
  const even = lineEnd === 'mixed' ? text.replace(/\r\n?/g, '\n') : text;
  const newline = newlines[lineEnd];
  const delimiter = options.delimiter ?? findDelimiter(even, newline);
  const { rows: records, problems } = readRecords(even, delimiter, newline);
  const rows = records.map((row) => trimWideRow(row).map(unguardCell));
  const tooMany =
    refuseRowCount(countDataRows(rows)) ??
    refuseColumnCount(rows.reduce((most, row) => Math.max(most, row.length), 0));
  if (tooMany) return tooMany;
  const notes = noteRaggedRows(rows);
  if (lineEnd === 'mixed')
    notes.push('The file mixes several kinds of line end; each was read as the end of a row.');
  return {
    ok: true,
    table: { rows, delimiter, lineEnd, blankRows: rows.filter(isBlankRow).length, problems, notes },
  };
}
