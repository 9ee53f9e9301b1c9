import { z } from 'zod';
import { incomingExtraSchema, incomingLineSchema, rosterEditSchema } from '@/lib/domain/roster/edit';
import { columnMappingSchema } from '@/lib/domain/roster/import/column-mapping';
import { fileLimits } from '@/lib/domain/roster/import/limits';
import { mergeModes } from '@/lib/domain/roster/import/merge-roster';
import { playerLimits } from '@/lib/domain/roster/player';

const revision = z.int().min(0);
const reason = z
  .string()
  .trim()
  .min(1, 'Say why, in a sentence the manager can act on.')
  .max(playerLimits.note, 'Write the reason in at most 500 characters.');

/** A step on a roster as the person saw it. */
export const rosterStepSchema = z.object({ rosterId: z.uuid(), revision });

export const reasonedStepSchema = rosterStepSchema.extend({ reason });

/** Edits in the order they were made. A list of 200 players pasted into every cell is 1,600 of them. */
export const saveRosterEditsSchema = z.object({
  rosterId: z.uuid(),
  baseRevision: revision,
  edits: z.array(rosterEditSchema).min(1).max(2000),
});

const incomingSchema = z.object({ line: incomingLineSchema, extra: incomingExtraSchema });

/** Lines read from a file, as the preview showed them, and what the person decided about them. */
export const importRosterSchema = z.object({
  rosterId: z.uuid(),
  revision,
  mode: z.enum(mergeModes),
  lines: z
    .array(incomingSchema)
    .min(1, 'There is no line to import.')
    .max(fileLimits.rows, `Import at most ${fileLimits.rows.toLocaleString('en')} lines at a time.`),
  decisions: z
    .array(
      z.object({
        row: z.int().min(0).max(fileLimits.rows),
        decision: z.discriminatedUnion('as', [
          z.object({ as: z.literal('new') }),
          z.object({ as: z.literal('player'), id: z.uuid() }),
        ]),
      }),
    )
    .max(fileLimits.rows),
  /** How many rows could not be read; only kept in the history. */
  refused: z.int().min(0).max(fileLimits.rows),
  /** The mapping to remember for files with these headings; null for a list without headings. */
  remember: z.object({ signature: z.string().min(1).max(2000), mapping: columnMappingSchema }).nullable(),
});
