import Papa from 'papaparse';
import { listCells, readCell, makeEmptyEntry, writeCell } from './cells';
import { cleanCellValue, refuseCell, type RosterEdit, type RosterEntry } from './edit';
import { countOf } from '../text/count-of';
import { unguardCell } from './import/formula-guard';
import { findSize } from './import/match-size';
import { mostPlayersPerRoster } from './player';
import type { RosterColumn } from './roster-columns';

/** A spreadsheet ends the last row too; that line end begins no row of its own. */
const withoutLastLineEnd = (text: string): string => text.replace(/(?:\r\n|\r|\n)$/, '');

/** Cells as a spreadsheet puts them on the clipboard: tabs between cells, a line end after each row, quotes around line ends. */
export function readBlock(text: string): string[][] {
  const { data } = Papa.parse<string[]>(withoutLastLineEnd(text), { delimiter: '\t' });
  return data;
}

/** Whether a text is more than one cell. */
export const isBlock = (text: string): boolean => /[\t\r\n]/.test(withoutLastLineEnd(text));

/** A typed or pasted value as its column keeps it: a size by its code when the kit offers it. */
export function readValue(column: RosterColumn, text: string): string {
  const value = cleanCellValue(column.field, unguardCell(text));
  return column.garment ? (findSize(column.garment, value) ?? value) : value;
}

/** What a paste becomes: edits, and sentences about what found no place or was too long. */
export type PastePlan = { edits: RosterEdit[]; problems: string[] };

/**
 * Puts a block of cells into a roster from an anchor cell on, over what is there; rows below the last player become new
 * players. `shown` is the list in the order on screen. Cells beyond the last column and values too long for their cell
 * are left out and said.
 */
export function planPaste(given: {
  players: readonly RosterEntry[];
  shown: readonly RosterEntry[];
  columns: readonly RosterColumn[];
  anchor: { row: number; column: number };
  block: readonly (readonly string[])[];
  newId: () => string;
}): PastePlan {
  const { players, shown, columns, anchor } = given;
  const edits: RosterEdit[] = [];
  const problems: string[] = [];
  let beyond = 0;
  let unplaced = 0;
  let last = players.at(-1)?.id ?? null;
  let count = players.length;
  for (const [at, cells] of given.block.entries()) {
    const present = shown[anchor.row + at];
    let fresh = makeEmptyEntry(present?.id ?? given.newId());
    for (const [offset, text] of cells.entries()) {
      const column = columns[anchor.column + offset];
      if (column === undefined) {
        if (text.trim() !== '') beyond += 1;
        continue;
      }
      const to = readValue(column, text);
      const problem = refuseCell(column.field, to);
      if (problem !== null) problems.push(`Row ${at + 1}: ${problem}`);
      else if (present === undefined) fresh = writeCell(fresh, column.field, to);
      else {
        const from = readCell(present, column.field);
        if (from !== to) edits.push({ kind: 'set', playerId: present.id, field: column.field, from, to });
      }
    }
    // What found no place or was refused makes no player.
    if (present !== undefined || listCells(fresh).length === 0) continue;
    if (count >= mostPlayersPerRoster) {
      unplaced += 1;
      continue;
    }
    edits.push({ kind: 'add', player: fresh, after: last });
    last = fresh.id;
    count += 1;
  }
  if (beyond > 0) problems.push(`${countOf(beyond, 'cell')} lay beyond the last column and found no place.`);
  if (unplaced > 0) {
    problems.push(
      `${countOf(unplaced, 'row')} found no place: a roster holds at most ${mostPlayersPerRoster}.`,
    );
  }
  return { edits, problems };
}
