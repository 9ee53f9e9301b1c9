import { z } from 'zod';
import { getBundleState } from '@/lib/use-cases/batches/get-batch';
import { defineRoute } from '@/lib/web/route';

/** How far the bundle of a batch is. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string(), batch: z.string().max(20) }),
  run: async (ctx, { params }) =>
    Response.json(await getBundleState(ctx, { code: params.batch }), {
      headers: { 'cache-control': 'no-store' },
    }),
});
