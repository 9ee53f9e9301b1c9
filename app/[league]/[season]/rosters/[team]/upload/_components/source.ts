import { decodeText, decodeTextAs, type EncodingLabel } from '@/lib/domain/roster/import/decode-text';
import { refuseSize } from '@/lib/domain/roster/import/limits';
import { parseTable, type Delimiter } from '@/lib/domain/roster/import/parse-table';
import type { Taken } from '../../../../_components/use-list-source';

export type Sheet = { name: string; rows: string[][]; notes: string[] };

/** A list as it was brought: its sheets, and for text the bytes with how they were read, so that it can be read anew. */
export type Source = {
  from: string;
  sheets: Sheet[];
  text: {
    bytes: Uint8Array;
    encoding: string;
    sure: boolean;
    sample: string[];
    delimiter: Delimiter;
    chosen: TextChoice;
  } | null;
};
/** What a person chose where the guess was wrong; empty while the guess stands. */
export type TextChoice = { encoding?: EncodingLabel; delimiter?: Delimiter };

type Brought = Taken<Source>;

const noteProblems = (problems: readonly { rowNumber: number; message: string }[]): string[] =>
  problems.map((problem) => `Row ${problem.rowNumber}: ${problem.message}`);

/** Reads pasted cells. */
export function bringPaste(text: string): Brought {
  const parsed = parseTable(text);
  if (!parsed.ok) return { ok: false, message: parsed.message };
  const { rows, notes, problems } = parsed.table;
  return {
    ok: true,
    list: {
      from: 'your paste',
      sheets: [{ name: 'paste', rows, notes: [...notes, ...noteProblems(problems)] }],
      text: null,
    },
  };
}

/** Reads delimited text in the browser, in the encoding and by the separator it seems to have or a person chose. */
export function bringText(name: string, bytes: Uint8Array, chosen: TextChoice): Brought {
  const decoded = chosen.encoding === undefined ? decodeText(bytes) : decodeTextAs(bytes, chosen.encoding);
  if (!decoded.ok) return { ok: false, message: decoded.message };
  const parsed = parseTable(
    decoded.text,
    chosen.delimiter === undefined ? {} : { delimiter: chosen.delimiter },
  );
  if (!parsed.ok) return { ok: false, message: parsed.message };
  const { rows, notes, problems, delimiter } = parsed.table;
  const all = [...(decoded.note === undefined ? [] : [decoded.note]), ...notes, ...noteProblems(problems)];
  return {
    ok: true,
    list: {
      from: name,
      sheets: [{ name, rows, notes: all }],
      text: {
        bytes,
        encoding: decoded.encoding,
        sure: decoded.sure,
        sample: decoded.sample,
        delimiter,
        chosen,
      },
    },
  };
}

type ServerAnswer = { ok: true; tables: Sheet[]; notes: string[] } | { ok: false; message: string };

/** Reads a file: text here, anything else on the server, which knows what it is and whether it may be unpacked. */
export async function bringFile(file: File, readUrl: string): Promise<Brought> {
  const tooLarge = refuseSize(file.size);
  if (tooLarge) return { ok: false, message: tooLarge.message };
  const bytes = new Uint8Array(await file.arrayBuffer());
  if (/\.(csv|tsv|txt)$/i.test(file.name)) {
    const here = bringText(file.name, bytes, {});
    if (here.ok) return here;
  }
  const response = await fetch(`${readUrl}?name=${encodeURIComponent(file.name)}`, {
    method: 'POST',
    headers: { 'content-type': 'application/octet-stream' },
    body: bytes,
  });
  const answer = (await response.json()) as ServerAnswer & { detail?: string };
  if (!response.ok) return { ok: false, message: answer.detail ?? 'The file could not be read. Try again.' };
  if (!answer.ok) return { ok: false, message: answer.message };
  const sheets = answer.tables.map((table) => ({ ...table, notes: [...answer.notes, ...table.notes] }));
  return sheets.length === 0
    ? { ok: false, message: `${file.name} has no sheet with a list in it.` }
    : { ok: true, list: { from: file.name, sheets, text: null } };
}
