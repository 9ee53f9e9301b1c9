import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { writeCsv } from '../csv/write-csv';

/** A column of a data file: its name in the CSV heading and the JSON rows, and what it holds. */
export type Column = { name: string; meaning: string };

/** A table to be written as CSV and as JSON; every row has a value for each column, in the same order. */
export type DataTable = {
  /** The name of the format in the JSON, such as `raglan-pieces`. */
  format: string;
  columns: readonly Column[];
  rows: readonly (readonly (string | number)[])[];
};

const encoder = new TextEncoder();

/**
 * The table as CSV with a byte order mark, so that spreadsheets read it as UTF-8. Text that a spreadsheet would run as
 * a formula gets a leading apostrophe; the JSON holds every text exactly.
 */
export const writeTableCsv = ({ columns, rows }: DataTable): Uint8Array =>
  encoder.encode(
    writeCsv(
      columns.map((column) => column.name),
      rows,
      { byteOrderMark: true },
    ),
  );

/** The table as JSON with the meaning of its columns, a row an object. Without a byte order mark. */
export function writeTableJson(snapshot: BatchSnapshot, { format, columns, rows }: DataTable): Uint8Array {
  const { code, league, season, releasedAt } = snapshot.batch;
  const table = {
    format,
    formatVersion: 1,
    batch: { code, league, season, releasedAt },
    columns,
    rows: rows.map((row) => Object.fromEntries(columns.map((column, at) => [column.name, row[at] ?? '']))),
  };
  return encoder.encode(`${JSON.stringify(table, null, 2)}\n`);
}
