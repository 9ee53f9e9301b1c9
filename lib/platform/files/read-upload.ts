import { decodeText, decodeTextAs, type EncodingLabel } from '@/lib/domain/roster/import/decode-text';
import { refuseSize } from '@/lib/domain/roster/import/limits';
import { parseTable, type Delimiter, type TableProblem } from '@/lib/domain/roster/import/parse-table';
import type { Refusal } from '@/lib/domain/roster/import/refusal';
import { readWorkbook } from './read-workbook';
import { sniffFile } from './sniff-file';

/** One list found in a file: a sheet of a workbook, or a text file as a whole. `rows[0]` is row 1 of the file. */
export type UploadTable = { name: string; rows: string[][]; problems: TableProblem[]; notes: string[] };

/** How a text file was read, for the screen to show and a person to change. */
type TextReading = { encoding: string; sure: boolean; sample: string[]; delimiter: Delimiter };

/** A file as tables, or the sentence that says why it is refused. `text` is null for workbooks. */
export type UploadResult =
  | { ok: true; kind: 'workbook' | 'text'; tables: UploadTable[]; text: TextReading | null; notes: string[] }
  | Refusal;

/** What a person chose for a text file when the guess was wrong. */
export type UploadChoices = { encoding?: EncodingLabel; delimiter?: Delimiter };

/**
 * Reads an uploaded file of at most 5 MB, whatever its name: a workbook (.xlsx) as its visible sheets, anything that is
 * text as one table. Everything else is refused with a sentence for a person. Never throws.
 */
export async function readUpload(
  { bytes, name }: { bytes: Uint8Array; name: string },
  choices: UploadChoices = {},
): Promise<UploadResult> {
  const tooLarge = refuseSize(bytes.length);
  if (tooLarge) return tooLarge;
  const sniffed = sniffFile(bytes, name);
  if (!sniffed.ok) return sniffed;
  if (sniffed.kind === 'workbook') {
    const workbook = await readWorkbook(bytes);
    if (!workbook.ok) return workbook;
    const tables = workbook.sheets.map((sheet) => ({ ...sheet, problems: [] }));
    return { ok: true, kind: 'workbook', tables, text: null, notes: workbook.notes };
  }
  const decoded = choices.encoding === undefined ? decodeText(bytes) : decodeTextAs(bytes, choices.encoding);
  if (!decoded.ok) return decoded;
  const parsed = parseTable(
    decoded.text,
    choices.delimiter === undefined ? {} : { delimiter: choices.delimiter },
  );
  if (!parsed.ok) return parsed;
  const { rows, problems, notes, delimiter } = parsed.table;
  const { encoding, sure, sample, note } = decoded;
  return {
    ok: true,
    kind: 'text',
    tables: [{ name, rows, problems, notes }],
    text: { encoding, sure, sample, delimiter },
    notes: note === undefined ? [] : [note],
  };
}
