import { z } from 'zod';
import { fileLimits } from '@/lib/domain/roster/import/limits';
import { AppError } from '@/lib/platform/errors';
import { readRosterFile } from '@/lib/use-cases/rosters/read-roster-file';
import { readBytes } from '@/lib/web/read-bytes';
import { defineRoute } from '@/lib/web/route';

/**
 * Takes a workbook apart into its sheets and rows; nothing of it is kept. The file is the body as it is: that content
 * type cannot be sent from a form of another site.
 */
export const POST = defineRoute({
  access: 'league',
  params: z.object({ league: z.string(), roster: z.uuid() }),
  query: z.object({ name: z.string().max(255) }),
  async run(ctx, { params, query, request }) {
    if (request.headers.get('content-type') !== 'application/octet-stream')
      throw new AppError(
        'unsupported',
        'Send the file as it is, with Content-Type: application/octet-stream.',
      );
    const bytes = await readBytes(request, fileLimits.bytes);
    const result = await readRosterFile(ctx, { rosterId: params.roster, name: query.name, bytes });
    return Response.json(result, { headers: { 'cache-control': 'no-store' } });
  },
});
