import { z } from 'zod';
import { exportTeams } from '@/lib/use-cases/teams/export-teams';
import { defineRoute } from '@/lib/web/route';

/** The teams of a season as CSV, safe to open in a spreadsheet and fit to be brought in again. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string(), season: z.string().max(80) }),
  run: async (ctx, { params }) => {
    const { name, csv } = await exportTeams(ctx, params);
    return new Response(csv, {
      headers: {
        'content-type': 'text/csv; charset=utf-8',
        'content-disposition': `attachment; filename="${name}"`,
        'cache-control': 'private, no-store',
      },
    });
  },
});
