import { decodeText } from '@/lib/domain/roster/import/decode-text';
import { fileLimits, refuseRowCount, refuseSize } from '@/lib/domain/roster/import/limits';
import { parseTable } from '@/lib/domain/roster/import/parse-table';

/** Rows of cells read from what a visitor brought, with where they came from, or the sentence that says why not. */
export type Reading = { ok: true; rows: string[][]; from: string } | { ok: false; message: string };

/** Reads pasted cells or delimited text. */
export function readPaste(text: string): Reading {
  const parsed = parseTable(text);
  return parsed.ok
    ? { ok: true, rows: parsed.table.rows, from: 'your paste' }
    : { ok: false, message: parsed.message };
}

/** Reads a CSV, TSV or XLSX file in the browser; the file itself is never sent. */
export async function readFile(file: File): Promise<Reading> {
  const tooLarge = refuseSize(file.size);
  if (tooLarge) return { ok: false, message: tooLarge.message };
  if (file.name.toLowerCase().endsWith('.xlsx')) return readWorkbook(file);
  const decoded = decodeText(new Uint8Array(await file.arrayBuffer()));
  if (!decoded.ok) return { ok: false, message: decoded.message };
  const parsed = parseTable(decoded.text);
  if (!parsed.ok) return { ok: false, message: parsed.message };
  return { ok: true, rows: parsed.table.rows, from: `${file.name}, read as ${decoded.encoding}` };
}

async function readWorkbook(file: File): Promise<Reading> {
  try {
    // Only those who bring a workbook load its reader.
    const { readSheet } = await import('read-excel-file/browser');
    const cells = await readSheet(file);
    const tooMany = refuseRowCount(cells.length);
    if (tooMany) return { ok: false, message: tooMany.message };
    return {
      ok: true,
      rows: cells.map((row) => row.slice(0, fileLimits.columns).map(writeCell)),
      from: `${file.name}, first sheet`,
    };
  } catch {
    return {
      ok: false,
      message: `${file.name} could not be opened as a workbook. If it has a password, remove it; else save the list as CSV and bring that.`,
    };
  }
}

const writeCell = (cell: unknown): string =>
  cell === null || cell === undefined
    ? ''
    : cell instanceof Date
      ? cell.toISOString().slice(0, 10)
      : String(cell as string | number | boolean);
