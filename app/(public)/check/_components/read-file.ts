import { decodeText } from '@/lib/domain/roster/import/decode-text';
import { refuseSize } from '@/lib/domain/roster/import/limits';
import { parseTable } from '@/lib/domain/roster/import/parse-table';
import type { ActionResult } from '@/lib/web/action-result';

type WorkbookRows = { rows: string[][]; sheet: string };
export type ReadWorkbook = (form: FormData) => Promise<ActionResult<WorkbookRows>>;

/** Rows of cells read from what a visitor brought, with where they came from, or the sentence that says why not. */
export type Reading = { ok: true; rows: string[][]; from: string } | { ok: false; message: string };

/** Reads pasted cells or delimited text. */
export function readPaste(text: string): Reading {
  const parsed = parseTable(text);
  return parsed.ok
    ? { ok: true, rows: parsed.table.rows, from: 'your paste' }
    : { ok: false, message: parsed.message };
}

/** Reads a file: delimited text in the browser, a workbook on the server, which judges it before it is unpacked. */
export async function readFile(file: File, onReadWorkbook: ReadWorkbook): Promise<Reading> {
  const tooLarge = refuseSize(file.size);
  if (tooLarge) return { ok: false, message: tooLarge.message };
  if (file.name.toLowerCase().endsWith('.xlsx')) return readOnServer(file, onReadWorkbook);
  const decoded = decodeText(new Uint8Array(await file.arrayBuffer()));
  if (!decoded.ok) return { ok: false, message: decoded.message };
  const parsed = parseTable(decoded.text);
  if (!parsed.ok) return { ok: false, message: parsed.message };
  return { ok: true, rows: parsed.table.rows, from: `${file.name}, read as ${decoded.encoding}` };
}

async function readOnServer(file: File, onReadWorkbook: ReadWorkbook): Promise<Reading> {
  const form = new FormData();
  form.set('file', file);
  const answer = await onReadWorkbook(form);
  if (!answer.ok) return { ok: false, message: answer.error.message };
  return { ok: true, rows: answer.data.rows, from: `${file.name}, sheet ${answer.data.sheet}` };
}
