import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { enqueueJob } from '@/db/queries/jobs';
import { listSeasons } from '@/db/queries/season-view';
import { insertSeason, lockCurrentSeason, setCurrentSeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { toInstant } from '@/lib/domain/dates/zone';
import { makeUniqueSlug } from '@/lib/domain/league/slug';
import { AppError } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { seasonFieldsSchema } from './season-schemas';

/** Opens a season; the first one becomes the one people work in. Its freeze is put on the worker's calendar. */
export async function openSeason(
  ctx: ActorContext,
  input: z.output<typeof seasonFieldsSchema>,
): Promise<{ slug: string }> {
  assertCan(ctx.actor, 'season.write');
  return withLeague(ctx.league.id, async (tx) => {
    const current = await lockCurrentSeason(tx);
    const known = await listSeasons(tx);
    if (known.some((season) => season.name.toLowerCase() === input.name.toLowerCase())) {
      const message = `There is a season called ${input.name} already. Choose another name.`;
      throw new AppError('conflict', message, { fields: { name: message } });
    }
    const id = ctx.newId();
    const slug = makeUniqueSlug(input.name, 'season', new Set(known.map((season) => season.slug)));
    const freezesAt = toInstant(input.freezesAt, ctx.league.timeZone).instant;
    await insertSeason(tx, { ...input, freezesAt, id, slug, now: ctx.now });
    if (current === null) await setCurrentSeason(tx, id);
    await enqueueJob(
      tx,
      { task: 'freeze-rosters', payload: { leagueId: ctx.league.id, seasonId: id } },
      { key: `freeze:${id}`, runAt: freezesAt },
    );
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'season opened', subjectId: id, data: { name: input.name } },
    );
    return { slug };
  });
}
