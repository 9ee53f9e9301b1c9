import { z } from 'zod';
import { eventKinds } from '@/lib/domain/audit/event-kinds';

/** What a page of the history is asked for with; anything it does not understand counts as not asked. */
export const historyQuerySchema = z.object({
  kind: z.enum(eventKinds).nullable().catch(null).default(null),
  search: z.string().trim().max(100).catch('').default(''),
  before: z
    .string()
    .regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z_[0-9a-f-]{36}$/)
    .nullable()
    .catch(null)
    .default(null),
});
export type HistoryQuery = z.output<typeof historyQuerySchema>;
