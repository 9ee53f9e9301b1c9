import { z } from 'zod';
import { eventKinds } from '@/lib/domain/audit/event-kinds';

/** What a page of the history is asked for with; anything it does not understand counts as not asked. */
export const historyQuerySchema = z.object({
  kind: z.enum(eventKinds).nullable().catch(null).default(null),
  search: z.string().trim().max(100).catch('').default(''),
  before: z
    .string()
    .refine((text) => {
      const [at, id, ...more] = text.split('_');
      return more.length === 0 && z.iso.datetime().safeParse(at).success && z.uuid().safeParse(id).success;
    })
    .nullable()
    .catch(null)
    .default(null),
});
export type HistoryQuery = z.output<typeof historyQuerySchema>;
