import { z } from 'zod';
import type { Garment } from '../player';
import { isBlankRow } from './clean-cell';
import { findHeadingRow, listHeadings } from './find-headings';
import {
  findPlayerField,
  normaliseHeading,
  playerFields,
  readSizeHeading,
  type PlayerField,
} from './heading-words';
import { fileLimits } from './limits';
import { findSize } from './match-size';

/**
 * What a column of a list of players holds. One size column may serve several garments; `extra` is kept beside the
 * player under its heading; `leave out` is never guessed: only a person may choose to leave a column behind.
 */
const columnTargetSchema = z.discriminatedUnion('field', [
  z.object({ field: z.enum(playerFields) }),
  z.object({ field: z.literal('size'), garments: z.array(z.string().min(1).max(40)).min(1).max(20) }),
  z.object({ field: z.literal('extra') }),
  z.object({ field: z.literal('leave out') }),
]);
export type ColumnTarget = z.infer<typeof columnTargetSchema>;

const headingRowSchema = z
  .int()
  .min(0)
  .max(fileLimits.rows + fileLimits.aboveHeadings)
  .nullable();

/**
 * How a list is read: `headerRow` is the index (from 0) of the row of headings, null when there is none, and
 * `columns` says for each column what it holds. Each field, and each garment's size, comes from one column at most;
 * a full name excludes its parts.
 */
export const columnMappingSchema = z
  .object({ headerRow: headingRowSchema, columns: z.array(columnTargetSchema).max(fileLimits.columns) })
  .superRefine(({ columns }, context) => {
    const seen = new Set<string>();
    for (const [index, target] of columns.entries()) {
      const keys =
        target.field === 'size'
          ? target.garments.map((garment) => `size of ${garment}`)
          : target.field === 'extra' || target.field === 'leave out'
            ? []
            : [target.field];
      for (const key of keys) {
        if (seen.has(key)) {
          const message = `Two columns are chosen for ${nameOfTarget[key] ?? 'the same size'}. Choose one of them.`;
          context.addIssue({ code: 'custom', path: ['columns', index], message });
        }
        seen.add(key);
      }
    }
    if (seen.has('name') && (seen.has('firstName') || seen.has('lastName'))) {
      context.addIssue({
        code: 'custom',
        path: ['columns'],
        message: 'Choose either one column for the whole name or columns for its parts, not both.',
      });
    }
  });
export type ColumnMapping = z.infer<typeof columnMappingSchema>;

const nameOfTarget: Record<string, string> = {
  name: 'the name',
  firstName: 'the first name',
  lastName: 'the last name',
  nameOnBack: 'the name on the back',
  number: 'the number',
  role: 'the role',
};

/** Words for the same kind of garment, so that "Jersey size" finds a garment called "Home shirt". */
const garmentKinds: Record<string, string> = {
  jersey: 'shirt',
  shirts: 'shirt',
  jerseys: 'shirt',
  top: 'shirt',
  tops: 'shirt',
  tee: 'shirt',
  short: 'shorts',
  pants: 'shorts',
  sock: 'socks',
};
const kindOf = (word: string): string => garmentKinds[word] ?? word;

const wordsOf = (garment: Garment): Set<string> =>
  new Set(
    `${garment.name} ${garment.code}`
      .split(/[\s-]+/)
      .flatMap((word) => readSizeHeading(word).words)
      .map(kindOf),
  );

/** The garments a heading names: all its words must be words of the garment; "Size" alone names all of them. */
function findGarments(heading: string, garments: readonly Garment[]): { garments: string[]; plain: boolean } {
  const { size, words } = readSizeHeading(heading);
  if (words.length === 0) return { garments: size ? garments.map(({ code }) => code) : [], plain: size };
  const kinds = words.map(kindOf);
  const named = garments.filter((garment) => kinds.every((word) => wordsOf(garment).has(word)));
  return { garments: named.map(({ code }) => code), plain: false };
}

/** Gives each field and each garment to one column only; what comes second is kept as extra. */
function claimOnce(columns: readonly ColumnTarget[]): ColumnTarget[] {
  const taken = new Set<string>();
  const claim = (key: string): boolean => !taken.has(key) && taken.add(key).has(key);
  return columns.map((target): ColumnTarget => {
    if (target.field === 'extra' || target.field === 'leave out') return target;
    if (target.field !== 'size') return claim(target.field) ? target : { field: 'extra' };
    const garments = target.garments.filter((garment) => claim(`size of ${garment}`));
    return garments.length > 0 ? { field: 'size', garments } : { field: 'extra' };
  });
}

/** Columns called just "Size": one serves all garments, several are taken for the garments in their order. */
function shareSizes(
  columns: readonly ColumnTarget[],
  plain: readonly boolean[],
  garments: readonly Garment[],
): ColumnTarget[] {
  const several = plain.filter(Boolean).length > 1;
  let next = 0;
  return columns.map((target, column): ColumnTarget => {
    if (!plain[column] || !several) return target;
    const garment = garments[next];
    next += 1;
    return garment ? { field: 'size', garments: [garment.code] } : { field: 'extra' };
  });
}

/** Headings that say no more than "Name". */
const bareNames = new Set(['name', 'names', 'naam']);

/**
 * A bare "Name" beside "First name" is the last name; a whole name ("Full name", "Player", or any beside both parts)
 * makes the parts extra. `bare` tells of each column whether its heading is just "Name".
 */
function settleNames(columns: readonly ColumnTarget[], bare: readonly boolean[]): ColumnTarget[] {
  const has = (field: PlayerField): boolean => columns.some((target) => target.field === field);
  if (!has('name')) return [...columns];
  const isPart = ({ field }: ColumnTarget): boolean => field === 'firstName' || field === 'lastName';
  const isBare = columns.some((target, column) => target.field === 'name' && bare[column] === true);
  if (isBare && has('firstName') !== has('lastName')) {
    const missing: PlayerField = has('firstName') ? 'lastName' : 'firstName';
    return columns.map((target) => (target.field === 'name' ? { field: missing } : target));
  }
  return columns.map((target) => (isPart(target) ? { field: 'extra' } : target));
}

type Look = 'number' | 'size' | 'name' | 'words' | 'empty' | 'other';

/** What most cells of a column look like, judged from at most 60 rows. */
function lookAtColumn(cells: readonly string[], garments: readonly Garment[]): Look {
  const texts = cells.map((cell) => cell.trim()).filter((cell) => cell !== '');
  if (texts.length === 0) return 'empty';
  const most = (test: (text: string) => boolean): boolean => texts.filter(test).length >= texts.length * 0.7;
  if (most((text) => /^(?:#|n[or]?\.? ?)?\p{Nd}{1,2}(?:[.,]0+)?$/iu.test(text))) return 'number';
  if (most((text) => garments.some((garment) => findSize(garment, text) !== null))) return 'size';
  if (most((text) => /^\p{L}[\p{L}\p{M}'’.\-]*,? +\p{L}/u.test(text))) return 'name';
  if (most((text) => /^\p{L}[\p{L}\p{M}'’.\-]*$/u.test(text))) return 'words';
  return 'other';
}

/** Fills in fields that no heading named from what the cells look like; at most one column for each. */
function guessByLooks(
  columns: readonly ColumnTarget[],
  looks: readonly Look[],
  garments: readonly Garment[],
): ColumnTarget[] {
  const result = [...columns];
  const has = (field: ColumnTarget['field']): boolean => result.some((target) => target.field === field);
  const free = (look: Look): number[] =>
    looks.flatMap((other, column) => (other === look && result[column]?.field === 'extra' ? [column] : []));
  const [number] = free('number');
  if (number !== undefined && !has('number')) result[number] = { field: 'number' };
  if (!has('size')) {
    const sizes = free('size');
    if (sizes.length === 1 && sizes[0] !== undefined) {
      result[sizes[0]] = { field: 'size', garments: garments.map(({ code }) => code) };
    } else {
      for (const [order, column] of sizes.entries()) {
        const garment = garments[order];
        if (garment) result[column] = { field: 'size', garments: [garment.code] };
      }
    }
  }
  if (!has('name') && !has('firstName') && !has('lastName')) {
    const [whole] = free('name');
    const [one, two] = free('words');
    if (whole !== undefined) result[whole] = { field: 'name' };
    else if (one !== undefined && two === one + 1) {
      result[one] = { field: 'firstName' };
      result[two] = { field: 'lastName' };
    } else if (one !== undefined) result[one] = { field: 'name' };
  }
  return result;
}

/**
 * Guesses what each column of a list of players holds, for a person to check: by its heading where it is a known one,
 * else by its cells. Columns that fit nothing become `extra`; nothing is guessed to be left out. The result always
 * satisfies `columnMappingSchema` for tables of at most 100 columns.
 */
export function guessMapping(
  rows: readonly (readonly string[])[],
  garments: readonly Garment[],
): ColumnMapping {
  const headerRow = findHeadingRow(rows);
  const { headings } = listHeadings(rows, headerRow);
  const header = headerRow === null ? [] : (rows[headerRow] ?? []);
  const body = rows
    .slice((headerRow ?? -1) + 1)
    .filter((row) => !isBlankRow(row))
    .slice(0, 60);
  const plain: boolean[] = [];
  const byHeading = headings.map((_, column): ColumnTarget => {
    const heading = header[column] ?? '';
    const field = findPlayerField(heading);
    const sizes = findGarments(heading, garments);
    plain[column] = field === null && sizes.plain;
    if (field !== null) return { field };
    return sizes.garments.length > 0 ? { field: 'size', garments: sizes.garments } : { field: 'extra' };
  });
  const bare = header.map((heading) => bareNames.has(normaliseHeading(heading)));
  const named = claimOnce(settleNames(shareSizes(byHeading, plain, garments), bare));
  const looks = headings.map((_, column) =>
    // A heading we can't read names something we don't know, so only unnamed columns are judged by their looks…
    headerRow !== null && (header[column] ?? '').trim() !== '' && named.some(({ field }) => field !== 'extra')
      ? 'other'
      : lookAtColumn(
          body.map((row) => row[column] ?? ''),
          garments,
        ),
  );
  // …unless no heading at all was known: then the cells are all there is to go by.
  return { headerRow, columns: guessByLooks(named, looks, garments) };
}

/**
 * A mapping kept from an earlier file, fitted to this one: its row of headings is looked for anew, and garments that
 * the kit no longer has are let go. Null when the table has another number of columns. The caller keeps mappings by
 * `headingSignature` and asks for the one of this file.
 */
export function reuseMapping(
  remembered: ColumnMapping,
  rows: readonly (readonly string[])[],
  garments: readonly Garment[],
): ColumnMapping | null {
  const headerRow = findHeadingRow(rows);
  if (listHeadings(rows, headerRow).headings.length !== remembered.columns.length) return null;
  const codes = new Set(garments.map(({ code }) => code));
  const columns = remembered.columns.map((target): ColumnTarget => {
    if (target.field !== 'size') return target;
    const known = target.garments.filter((garment) => codes.has(garment));
    return known.length > 0 ? { field: 'size', garments: known } : { field: 'extra' };
  });
  return { headerRow, columns };
}
