import { z } from 'zod';
import { openBundleFile } from '@/lib/use-cases/batches/open-bundle-file';
import { defineRoute } from '@/lib/web/route';
import { isFirstRange, streamFile } from '@/lib/web/stream-file';

/** The whole bundle of a batch as one ZIP. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({ league: z.string(), batch: z.string().max(20) }),
  run: async (ctx, { params, request }) =>
    streamFile(
      request,
      await openBundleFile(ctx, {
        code: params.batch,
        path: null,
        isFirstRange: isFirstRange(request.headers),
      }),
    ),
});
