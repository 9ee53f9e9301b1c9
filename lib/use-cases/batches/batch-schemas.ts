import { z } from 'zod';

export const batchDaySchema = z.iso.date('Write the day as year-month-day, such as 2027-10-02.');

export const holdBatchSchema = z.object({
  season: z.string().max(80),
  teamIds: z.array(z.uuid()).min(1, 'Pick at least one team.').max(500),
  shopId: z.uuid('Pick a shop.'),
  promisedOn: batchDaySchema.nullable(),
});

export const changeBatchSchema = z.object({
  batchId: z.uuid(),
  rowVersion: z.int(),
  teamIds: z.array(z.uuid()).min(1, 'Keep at least one team, or discard the batch.').max(500),
  shopId: z.uuid('Pick a shop.'),
  promisedOn: batchDaySchema.nullable(),
});

export const batchIdSchema = z.object({ batchId: z.uuid() });

export const markBatchSchema = z.object({
  batchId: z.uuid(),
  /** The state the page showed, so that a stale page or a second click moves nothing twice. */
  from: z.enum(['released', 'on press', 'packed', 'shipped', 'received']),
  to: z.enum(['released', 'on press', 'packed', 'shipped', 'received']),
  note: z.string().trim().max(300).default(''),
});
