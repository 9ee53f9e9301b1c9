import { z } from 'zod';
import { readNumber } from '../numbers/label';
import { cleanCell } from './import/clean-cell';
import { playerLimits, rosterLineSchema, type Player } from './player';

/** A player while a roster is edited: the order of the list is the order of the roster, so there is no position. */
export type RosterEntry = Omit<Player, 'position'>;

/** The entry alone, without whatever else the row it comes from carries (who changed it, where it stood). */
export const toRosterEntry = ({
  id,
  name,
  nameOnBack,
  number,
  role,
  sizes,
  extra,
}: RosterEntry): RosterEntry => ({ id, name, nameOnBack, number, role, sizes, extra });

const garmentCodeSchema = z.string().regex(/^[a-z][a-z0-9-]{0,38}$/);

/** One cell of a player: an own field, or the size of one garment by its code. */
export const cellFieldSchema = z.union([
  z.enum(['name', 'nameOnBack', 'number', 'role']),
  z.templateLiteral(['size:', garmentCodeSchema]),
]);
export type CellField = z.infer<typeof cellFieldSchema>;

const cellWords = {
  name: { limit: playerLimits.name, says: 'name' },
  nameOnBack: { limit: playerLimits.nameOnBack, says: 'name on back' },
  number: { limit: playerLimits.number, says: 'number' },
  role: { limit: playerLimits.role, says: 'role' },
} as const;

/** The most characters (UTF-16 units, as stored) a cell may hold. */
export const cellLimit = (field: CellField): number =>
  isSizeField(field) ? playerLimits.size : cellWords[field].limit;

/** What a cell is called in a sentence: "name on back", "size". */
export const nameOfCell = (field: CellField): string => (isSizeField(field) ? 'size' : cellWords[field].says);

type SizeField = Exclude<CellField, keyof typeof cellWords>;

/** Whether a cell holds the size of a garment. */
export const isSizeField = (field: CellField): field is SizeField => field.startsWith('size:');

/** The garment whose size a cell holds. */
export const garmentOf = (field: SizeField): string => field.slice('size:'.length);

/** Text as a cell keeps it: tidied, without characters that no database or printer takes. Idempotent. */
export const cleanCellText = (text: string): string => cleanCell(text).text;

/** A number as it is kept: the label as worn ("No. 7" is 7, full-width digits are plain), else the text as typed. */
export function cleanNumber(text: string): string {
  const clean = cleanCellText(text);
  const reading = readNumber(clean);
  return reading.ok ? reading.label : clean;
}

/** What somebody typed or pasted into a cell, as it is kept. */
export const cleanCellValue = (field: CellField, text: string): string =>
  field === 'number' ? cleanNumber(text) : cleanCellText(text);

const cleanRecord = (record: Record<string, string>): Record<string, string> =>
  Object.fromEntries(
    Object.entries(record)
      .map(([key, value]) => [cleanCellText(key), cleanCellText(value)] as const)
      .filter(([key, value]) => key !== '' && value !== ''),
  );

/** The cells of a player as they come from outside: within their limits, cleaned, sizes by garment code. */
export const incomingLineSchema = rosterLineSchema
  .extend({ sizes: z.record(garmentCodeSchema, z.string().max(playerLimits.size)) })
  .transform((line) => ({
    name: cleanCellText(line.name),
    nameOnBack: cleanCellText(line.nameOnBack),
    number: cleanNumber(line.number),
    role: cleanCellText(line.role),
    sizes: cleanRecord(line.sizes),
  }));

/** What a file held beside the cells of a player, by heading, as it comes from outside. */
export const incomingExtraSchema = z
  .record(z.string().max(120), z.string().max(playerLimits.note))
  .refine((extra) => Object.keys(extra).length <= 100, 'At most 100 further columns are kept.')
  .transform(cleanRecord);

const entrySchema = z
  .object({ id: z.uuid(), extra: incomingExtraSchema })
  .and(incomingLineSchema)
  .transform(toRosterEntry);
const placeSchema = z.uuid().nullable();

/**
 * One thing a person did to a roster. `from` is what the cell held when it was done, `was` the player as they were;
 * `after` is the player above (null at the top of the list). Ids of added players are made by whoever adds them, so
 * that an edit sent twice is done once.
 */
export const rosterEditSchema = z.discriminatedUnion('kind', [
  z
    .object({
      kind: z.literal('set'),
      playerId: z.uuid(),
      field: cellFieldSchema,
      from: z.string().max(200),
      to: z.string().max(2000),
    })
    .transform((edit) => ({ ...edit, to: cleanCellValue(edit.field, edit.to) }))
    .superRefine(({ field, to }, context) => {
      const problem = refuseCell(field, to);
      if (problem !== null) context.addIssue({ code: 'custom', path: ['to'], message: problem });
    }),
  z.object({ kind: z.literal('add'), player: entrySchema, after: placeSchema }),
  z.object({ kind: z.literal('remove'), was: entrySchema, after: placeSchema }),
  z.object({ kind: z.literal('move'), playerId: z.uuid(), after: placeSchema, from: placeSchema }),
]);
export type RosterEdit = z.infer<typeof rosterEditSchema>;

/** Why a text is too long for a cell, as a sentence, or null. Nothing is ever cut. */
export function refuseCell(field: CellField, text: string): string | null {
  const most = cellLimit(field);
  return text.length <= most
    ? null
    : `A ${nameOfCell(field)} has at most ${most} characters; this one has ${text.length}.`;
}

/** The player an edit is about. */
export function playerOfEdit(edit: RosterEdit): string {
  if (edit.kind === 'add') return edit.player.id;
  return edit.kind === 'remove' ? edit.was.id : edit.playerId;
}

/** The edit that takes this one back, to be applied after it. */
export function invertEdit(edit: RosterEdit): RosterEdit {
  switch (edit.kind) {
    case 'set':
      return { ...edit, from: edit.to, to: edit.from };
    case 'add':
      return { kind: 'remove', was: edit.player, after: edit.after };
    case 'remove':
      return { kind: 'add', player: edit.was, after: edit.after };
    case 'move':
      return { ...edit, after: edit.from, from: edit.after };
  }
}
