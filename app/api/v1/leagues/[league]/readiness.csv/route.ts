import { z } from 'zod';
import { exportReadiness } from '@/lib/use-cases/readiness/export-readiness';
import { defineRoute } from '@/lib/web/route';

/** The readiness of a season as CSV. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string() }),
  query: z.object({ season: z.string().max(80) }),
  run: async (ctx, { query }) => {
    const { name, csv } = await exportReadiness(ctx, query);
    return new Response(csv, {
      headers: {
        'content-type': 'text/csv; charset=utf-8',
        'content-disposition': `attachment; filename="${name}"`,
        'cache-control': 'private, no-store',
      },
    });
  },
});
