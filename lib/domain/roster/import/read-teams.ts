import { z } from 'zod';
import { foldText } from '../../text/normalise-text';
import { countOf } from '../../text/count-of';
import { joinWords, quoteText } from '../../text/sentence';
import { cleanCell, isBlankRow } from './clean-cell';
import { listHeadings } from './find-headings';
import { explainNonEntry, type RefusedRow, type RowCounts } from './read-roster';
import { readColour, type ReadColour } from './read-colour';
import type { TeamColumn, TeamMapping } from './team-mapping';

/** A kit as far as a list of teams tells: its colour, and the number's colour when there is a column for it. */
type TeamLineKit = { colour: ReadColour; number: ReadColour | null };

/** One team to bring in. Kits are null where the list has no colour that can be read; `managers` are e-mail addresses. */
export type TeamLine = {
  name: string;
  divisionId: string;
  home: TeamLineKit | null;
  away: TeamLineKit | null;
  managers: string[];
};

export type ReadTeam = { rowNumber: number; line: TeamLine; extra: Record<string, string>; notes: string[] };

/** As for players: every row is a line, refused with a reason, or counted as blank, headings or title. */
export type TeamsReading = {
  lines: ReadTeam[];
  refused: RefusedRow[];
  counts: RowCounts;
  leftOut: string[];
  notes: string[];
};

/** A division a team may be put in. */
export type KnownDivision = { id: string; name: string };

const mostLetters = 80;
const addressSchema = z.email().max(254);

type Cells = Partial<Record<Exclude<TeamColumn, 'extra' | 'leave out'>, string>>;

/** The division that is named, the only one there is when none is, or the sentence that says why there is none. */
function findDivision(named: string, divisions: readonly KnownDivision[]): KnownDivision | string {
  const [only] = divisions;
  if (named === '' && only && divisions.length === 1) return only;
  const found = divisions.filter(({ name }) => foldText(name) === foldText(named));
  const [division] = found;
  if (division && found.length === 1) return division;
  const names = divisions.map(({ name }) => name);
  const list =
    names.length > 8 ? `${names.slice(0, 8).join(', ')} and ${names.length - 8} more` : joinWords(names);
  const what =
    named === ''
      ? 'This row names no division.'
      : `There ${found.length > 1 ? 'is more than one' : 'is no'} division ${quoteText(named)}.`;
  return names.length === 0 ? `${what} Make the divisions first.` : `${what} Write one of these: ${list}.`;
}

/** A kit from its two cells; a colour that can't be read is said in `notes`, with what was written. */
function readKit(which: 'home' | 'away', cells: Cells, notes: string[]): TeamLineKit | null {
  const read = (
    column: 'homeColour' | 'awayColour' | 'homeNumber' | 'awayNumber',
    what: string,
  ): ReadColour | null => {
    const text = cells[column] ?? '';
    if (text === '') return null;
    const colour = readColour(text);
    if (colour === null) {
      notes.push(
        `The ${what} ${quoteText(text)} is no colour we know. Write it as # and six digits, such as #14375e, or choose it on the team's page.`,
      );
    }
    return colour;
  };
  const colour = read(`${which}Colour`, `${which} colour`);
  const number = read(`${which}Number`, `${which} number colour`);
  if (colour === null && number !== null)
    notes.push(`The ${which} number colour was left, since there is no ${which} colour.`);
  return colour === null ? null : { colour, number };
}

/** The e-mail addresses in a cell, each once, in lower case; anything else in it is said in `notes`. */
function readManagers(text: string, notes: string[]): string[] {
  const pieces = text.split(/[\s,;<>()]+/).filter((piece) => piece !== '');
  const isAddress = (piece: string) => addressSchema.safeParse(piece.toLowerCase()).success;
  const addresses = pieces.filter(isAddress).map((piece) => piece.toLowerCase());
  if (text !== '' && addresses.length === 0) {
    notes.push(`${quoteText(text)} is no e-mail address, so nobody is invited for this team yet.`);
  } else {
    // A name beside its address is as usual; what was meant for an address is not passed over.
    for (const piece of pieces.filter((entry) => entry.includes('@') && !isAddress(entry)))
      notes.push(`${quoteText(piece)} is no e-mail address, so nobody is invited there.`);
  }
  return [...new Set(addresses)];
}

/**
 * Reads a table of teams by a mapping: name, division by its name, colours as #14375e, 14375e or a plain name, and
 * managers' e-mail addresses. A row without a name, with an unknown division, or with a name its division already has
 * further up is refused with the reason; a colour or address that can't be read leaves the team in and is said in its
 * notes. Every row is accounted for. Never throws.
 */
export function readTeams(
  rows: readonly (readonly string[])[],
  mapping: TeamMapping,
  divisions: readonly KnownDivision[],
): TeamsReading {
  const { headerRow, columns } = mapping;
  const { headings, notes } = listHeadings(rows, headerRow);
  const header = headerRow === null ? [] : (rows[headerRow] ?? []);
  const reading: TeamsReading = {
    lines: [],
    refused: [],
    counts: { rows: rows.length, lines: 0, refused: 0, blank: 0, headings: 0, aboveHeadings: 0 },
    leftOut: headings.filter((_, column) => columns[column] === 'leave out'),
    notes,
  };
  const { lines, refused, counts } = reading;
  const seen = new Map<string, number>();
  for (const [index, row] of rows.entries()) {
    const rowNumber = index + 1;
    if (index === headerRow) counts.headings += 1;
    else if (isBlankRow(row)) counts.blank += 1;
    else if (headerRow !== null && index < headerRow) counts.aboveHeadings += 1;
    else {
      const read = explainNonEntry(row, header) ?? readTeam(row, columns, headings, divisions);
      const key = typeof read === 'string' ? '' : `${read.line.divisionId} ${foldText(read.line.name)}`;
      const before = seen.get(key);
      if (typeof read === 'string') refused.push({ rowNumber, cells: [...row], reason: read });
      else if (before !== undefined) {
        refused.push({ rowNumber, cells: [...row], reason: `Row ${before} has this team already.` });
      } else {
        seen.set(key, rowNumber);
        lines.push({ rowNumber, ...read });
      }
    }
  }
  counts.lines = lines.length;
  counts.refused = refused.length;
  if (counts.aboveHeadings > 0) {
    notes.push(
      `${countOf(counts.aboveHeadings, 'line')} above the headings ${counts.aboveHeadings === 1 ? 'was' : 'were'} taken for a title.`,
    );
  }
  return reading;
}

function readTeam(
  row: readonly string[],
  columns: readonly TeamColumn[],
  headings: readonly string[],
  divisions: readonly KnownDivision[],
): Omit<ReadTeam, 'rowNumber'> | string {
  const cells: Cells = {};
  const extra = new Map<string, string>();
  const notes: string[] = [];
  for (const [column, raw] of row.entries()) {
    const target = columns[column] ?? 'extra';
    const { text, notes: said } = cleanCell(raw);
    if (target === 'leave out' || text === '') continue;
    const heading = headings[column] ?? `Column ${column + 1}`;
    notes.push(...said.map((note) => `${heading}: ${note}`));
    if (target === 'extra') extra.set(heading, text);
    else cells[target] = text;
  }
  const name = cells.team ?? '';
  if (name === '') return 'This row names no team. Check which column holds the name of the team.';
  if (name.length > mostLetters) {
    return `The team's name has ${name.length} characters and the most is ${mostLetters}. Shorten it in the file.`;
  }
  const division = findDivision(cells.division ?? '', divisions);
  if (typeof division === 'string') return division;
  const line: TeamLine = {
    name,
    divisionId: division.id,
    home: readKit('home', cells, notes),
    away: readKit('away', cells, notes),
    managers: readManagers(cells.manager ?? '', notes),
  };
  return { line, extra: Object.fromEntries(extra), notes };
}
