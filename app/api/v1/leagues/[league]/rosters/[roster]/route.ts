import { z } from 'zod';
import { rosterStates } from '@/lib/domain/roster/roster-state';
import { getRosterNews } from '@/lib/use-cases/rosters/get-roster';
import { saveRosterEditsSchema } from '@/lib/use-cases/rosters/roster-schemas';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import { defineRoute } from '@/lib/web/route';

const params = z.object({ league: z.string(), roster: z.uuid() });
const headers = { 'cache-control': 'no-store' };

/** What is new in a roster since a revision; `{ changed: false }` when nothing is. */
export const GET = defineRoute({
  access: 'league',
  params,
  query: z.object({
    since: z.coerce.number().int().min(0).default(0),
    state: z.enum(rosterStates).optional(),
  }),
  run: async (ctx, { params: { roster }, query: { since, state } }) =>
    Response.json(await getRosterNews(ctx, { rosterId: roster, since, state }), { headers }),
});

/**
 * Saves edits cell by cell. A route and not an action, because a roster stays open for hours: it must still save after
 * the server has been given a newer build.
 */
export const PATCH = defineRoute({
  access: 'league',
  params,
  body: saveRosterEditsSchema.omit({ rosterId: true }),
  maxBytes: 2_000_000,
  run: async (ctx, { params: { roster }, body }) =>
    Response.json(await saveRosterEdits(ctx, { rosterId: roster, ...body }), { headers }),
});
