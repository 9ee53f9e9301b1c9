import { z } from 'zod';
import { exportRoster } from '@/lib/use-cases/rosters/export-roster';
import { defineRoute } from '@/lib/web/route';

/** A roster as CSV, safe to open in a spreadsheet and fit to be brought in again. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string(), roster: z.uuid() }),
  run: async (ctx, { params }) => {
    const { name, csv } = await exportRoster(ctx, { rosterId: params.roster });
    return new Response(csv, {
      headers: {
        'content-type': 'text/csv; charset=utf-8',
        'content-disposition': `attachment; filename="${name}"`,
        'cache-control': 'private, no-store',
      },
    });
  },
});
