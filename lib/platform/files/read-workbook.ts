import JSZip from 'jszip';
import readXlsxFile from 'read-excel-file/node';
import { unguardCell } from '@/lib/domain/roster/import/formula-guard';
import { isBlankRow } from '@/lib/domain/roster/import/clean-cell';
import { countDataRows } from '@/lib/domain/roster/import/find-headings';
import { fileLimits, refuseColumnCount, refuseRowCount, refuseSize } from '@/lib/domain/roster/import/limits';
import { refuse, type Refusal } from '@/lib/domain/roster/import/refusal';
import { countOf } from '@/lib/domain/text/count-of';
import { quoteText } from '@/lib/domain/text/sentence';
import { listZip, unpackZip } from './read-zip';
import { scanSheet, type OddCell } from './scan-sheet';
import { refuseZip, sniffFile } from './sniff-file';
import {
  listPadding,
  listSheets,
  readPart,
  readRelations,
  relationsPart,
  workbookPart,
} from './workbook-parts';

/** A sheet as rows of text, `rows[0]` being row 1; `notes` say what the sheet held besides plain text and numbers. */
type WorkbookSheet = { name: string; rows: string[][]; notes: string[] };

/** The visible sheets that hold anything; `notes` name those that were left out and why. */
export type WorkbookResult = { ok: true; sheets: WorkbookSheet[]; notes: string[] } | Refusal;

/** Sheets read from one workbook, and the last row one may reach down to (rows between may be blank). */
const mostSheets = 20;
const deepestRow = 10_000;

const damaged = refuseZip('damaged');
const emptySheet = '<worksheet><sheetData/></worksheet>';

/** What a sheet is read with, or why it is not. */
type SheetPlan = { index: number; name: string; odd: OddCell[]; formulas: number };

/**
 * Reads an .xlsx workbook of at most 5 MB. Before anything is unpacked its directory is judged, and unpacking stops at
 * a limit whatever the directory claims; then each sheet is looked through, and only sheets within the limits (2,000
 * rows of data, 100 columns) are read. Formulas are never worked out: the stored result is taken, or the formula shown
 * as text. Numbers read as they are shown where leading zeros are (7, or 07), dates as 2027-08-31. Macros, passwords
 * and other kinds of file are refused by name. Never throws: what the reader trips over is refused as damaged.
 */
export async function readWorkbook(bytes: Uint8Array): Promise<WorkbookResult> {
  const tooLarge = refuseSize(bytes.length);
  if (tooLarge) return tooLarge;
  const sniffed = sniffFile(bytes, '');
  if (!sniffed.ok) return sniffed;
  if (sniffed.kind !== 'workbook') return refuse('wrong-type', 'This file is not an Excel workbook (.xlsx).');
  const listing = listZip(bytes);
  if (!listing.ok) return refuseZip(listing.fault);
  const head = await unpackZip(bytes, listing, [workbookPart, relationsPart]);
  if (!head.ok) return refuseZip(head.fault);
  const workbook = head.files.get(workbookPart);
  const relationsXml = head.files.get(relationsPart);
  if (!workbook || !relationsXml) return damaged;
  const relations = readRelations(readPart(relationsXml));
  const entries = listSheets(readPart(workbook), relations);
  const parts = entries.flatMap(({ part }) => (part === null ? [] : [part]));
  const body = await unpackZip(bytes, listing, [relations.sharedStrings, relations.styles, ...parts]);
  if (!body.ok) return refuseZip(body.fault);
  const files = new Map([...head.files, ...body.files]);

  const notes: string[] = [];
  const plans: SheetPlan[] = [];
  const refusals: Refusal[] = [];
  const stylesXml = files.get(relations.styles);
  const padding = stylesXml ? listPadding(readPart(stylesXml)) : new Map<number, number>();
  for (const [index, { name, hidden, part }] of entries.entries()) {
    const file = part === null ? undefined : files.get(part);
    if (part === null || !file) continue;
    const leaveOut = (why: string): void => {
      notes.push(`Sheet ${quoteText(name)} was left out: ${why}`);
      files.set(part, Buffer.from(emptySheet));
    };
    if (hidden) {
      leaveOut('it is hidden. Show it in the spreadsheet first if it holds the list.');
      continue;
    }
    if (plans.length >= mostSheets) {
      leaveOut(`only the first ${mostSheets} sheets are read.`);
      continue;
    }
    const scan = scanSheet(readPart(file), padding);
    if (!scan.ok) return damaged;
    const refusal = judgeSheet(scan);
    if (refusal) {
      refusals.push(refusal);
      leaveOut(refusal.message);
    } else if (scan.filledRows > 0) plans.push({ index, name, odd: scan.odd, formulas: scan.formulas });
  }
  if (plans.length === 0) {
    return (
      refusals[0] ??
      refuse(
        'empty',
        'This workbook has no visible sheet with anything in it. Choose the file that holds the list.',
      )
    );
  }
  return readSheets(files, entries.length, plans, notes, refusals);
}

/** Why a sheet is too much to read, or null; a few rows more than the limit may still be titles and headings. */
function judgeSheet(scan: { filledRows: number; lastRow: number; columns: number }): Refusal | null {
  if (scan.filledRows > fileLimits.rows + fileLimits.aboveHeadings + 1) {
    return refuseRowCount(scan.filledRows, 'with headings');
  }
  if (scan.lastRow > deepestRow) {
    return refuse(
      'too-many-rows',
      `This sheet reaches down to row ${scan.lastRow.toLocaleString('en-GB')}. Delete the rows below the list, which hold something far down, and bring it in again.`,
    );
  }
  return refuseColumnCount(scan.columns);
}

/** Hands the judged parts, and nothing else, to the spreadsheet reader, and turns its cells into text. */
async function readSheets(
  files: ReadonlyMap<string, Uint8Array>,
  sheetCount: number,
  plans: readonly SheetPlan[],
  notes: string[],
  refusals: Refusal[],
): Promise<WorkbookResult> {
  const archive = new JSZip();
  for (const [name, content] of files) archive.file(name, content, { createFolders: false });
  const plain = await archive.generateAsync({ type: 'nodebuffer', compression: 'STORE' });
  let read: Awaited<ReturnType<typeof readXlsxFile>>;
  try {
    read = await readXlsxFile(plain, { trim: false });
  } catch {
    return damaged;
  }
  if (read.length !== sheetCount) return damaged;
  const sheets: WorkbookSheet[] = [];
  for (const plan of plans) {
    const data = read[plan.index]?.data;
    if (!data) return damaged;
    const sheet = makeSheet(plan, data);
    const refusal = refuseRowCount(countDataRows(sheet.rows));
    if (refusal) {
      refusals.push(refusal);
      notes.push(`Sheet ${quoteText(plan.name)} was left out: ${refusal.message}`);
    } else if (!sheet.rows.every(isBlankRow)) sheets.push(sheet);
  }
  if (sheets.length > 0) return { ok: true, sheets, notes };
  return refusals[0] ?? refuse('empty', 'This workbook is empty. Choose the file that holds the list.');
}

const two = (number: number): string => String(number).padStart(2, '0');

/**
 * A date as ISO 8601 text, with the time only when there is one. The reader gives wall-clock time as if it were UTC,
 * cut from a fraction of a day, so it is rounded to the second.
 */
function writeDate(cut: Date): string {
  if (Number.isNaN(cut.getTime())) return '';
  const date = new Date(Math.round(cut.getTime() / 1000) * 1000);
  const day = `${date.getUTCFullYear()}-${two(date.getUTCMonth() + 1)}-${two(date.getUTCDate())}`;
  const time = `${two(date.getUTCHours())}:${two(date.getUTCMinutes())}`;
  return time === '00:00' ? day : `${day}T${time}`;
}

function writeValue(value: unknown): string {
  if (value instanceof Date) return writeDate(value);
  if (typeof value === 'string') return unguardCell(value);
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return typeof value === 'number' ? String(value) : '';
}

const placeOf = (row: number, column: number): string => {
  const letter = (index: number): string =>
    index < 26 ? String.fromCharCode(65 + index) : letter(Math.floor(index / 26) - 1) + letter(index % 26);
  return `${letter(column)}${row + 1}`;
};

/** Cells as text, with what a plain reading loses put back, and notes of what a person should look at. */
function makeSheet(plan: SheetPlan, data: readonly (readonly unknown[])[]): WorkbookSheet {
  const rows = data.map((row) => row.map(writeValue));
  for (const { row, column, text } of plan.odd) {
    while (rows.length <= row) rows.push([]);
    const cells = rows[row];
    while (cells && cells.length <= column) cells.push('');
    if (cells) cells[column] = text;
  }
  const notes: string[] = [];
  const tell = (kind: OddCell['kind'], what: (count: string) => string): void => {
    const found = plan.odd.filter((cell) => cell.kind === kind);
    const [first] = found;
    if (first)
      notes.push(
        what(
          `${countOf(found.length, 'cell')} (${placeOf(first.row, first.column)}${found.length > 1 ? ' and others' : ''})`,
        ),
      );
  };
  if (plan.formulas > 0)
    notes.push(
      `${countOf(plan.formulas, 'formula')} ${plan.formulas === 1 ? 'was' : 'were'} not worked out again; the results stored in the file were taken.`,
    );
  tell(
    'formula without result',
    (cells) => `In ${cells} the file holds no result of the formula, so the formula itself is shown.`,
  );
  tell('error', (cells) => `In ${cells} the spreadsheet shows an error, which was kept as text.`);
  const dates = data.flatMap((row, at) =>
    row.flatMap((value, column) => (value instanceof Date ? [placeOf(at, column)] : [])),
  );
  if (dates.length > 0) {
    notes.push(
      `${countOf(dates.length, 'cell')} (${dates[0]}${dates.length > 1 ? ' and others' : ''}) ${dates.length === 1 ? 'holds a date' : 'hold dates'}. If a size such as 9-10 was meant, type it again as text.`,
    );
  }
  return { name: plan.name, rows, notes };
}
