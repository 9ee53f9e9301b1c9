import { z } from 'zod';
import { openBundleFile } from '@/lib/use-cases/batches/open-bundle-file';
import { defineRoute } from '@/lib/web/route';
import { isFirstRange, streamFile } from '@/lib/web/stream-file';

/** One file of a batch's bundle. */
export const GET = defineRoute({
  access: 'league',
  params: z.object({
    league: z.string(),
    batch: z.string().max(20),
    path: z.array(z.string().max(300)).min(1).max(10),
  }),
  run: async (ctx, { params, request }) => {
    const path = params.path.map(decodeURIComponent).join('/');
    return streamFile(
      request,
      await openBundleFile(ctx, { code: params.batch, path, isFirstRange: isFirstRange(request.headers) }),
    );
  },
});
