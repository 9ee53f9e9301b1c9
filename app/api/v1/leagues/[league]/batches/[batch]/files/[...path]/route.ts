import { z } from 'zod';
import { notFound } from '@/lib/platform/errors';
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
    const path = readPath(params.path);
    return streamFile(
      request,
      await openBundleFile(ctx, { code: params.batch, path, isFirstRange: isFirstRange(request.headers) }),
    );
  },
});

/** The path of a file as its address writes it; one that is no text at all names no file. */
function readPath(parts: readonly string[]): string {
  try {
    return parts.map(decodeURIComponent).join('/');
  } catch {
    throw notFound('file');
  }
}
