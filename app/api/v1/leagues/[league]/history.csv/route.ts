import { z } from 'zod';
import { exportHistory } from '@/lib/use-cases/history/export-history';
import { historyQuerySchema } from '@/lib/use-cases/history/history-schemas';
import { defineRoute } from '@/lib/web/route';
import { streamText } from '@/lib/web/stream-text';

/** The league's history, or the part that is asked for, as CSV. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string() }),
  query: historyQuerySchema.omit({ before: true }),
  run: async (ctx, { query }) =>
    streamText(exportHistory(ctx, query), {
      name: `${ctx.league.slug}-history.csv`,
      mediaType: 'text/csv; charset=utf-8',
    }),
});
