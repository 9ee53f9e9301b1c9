import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertDivision, lockSeason } from '@/db/queries/divisions';
import { replaceGarments } from '@/db/queries/garments';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import { makeUniqueSlug } from '@/lib/domain/league/slug';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { readDivisionFields, scheduleOwnFreeze } from '../division-guards';
import type { addDivisionSchema } from './division-schemas';

/** Adds a division with its garments to a season. */
export async function addDivision(
  ctx: ActorContext,
  input: z.output<typeof addDivisionSchema>,
): Promise<{ slug: string }> {
  assertCan(ctx.actor, 'division.write');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season || !(await lockSeason(tx, season.id))) throw notFound('season');
    const { fields, others } = await readDivisionFields(tx, ctx, input.fields, {
      seasonId: season.id,
      ownId: null,
    });
    const id = ctx.newId();
    const slug = makeUniqueSlug(
      fields.name,
      'division',
      new Set(['new', ...others.map((division) => division.slug)]),
    );
    await insertDivision(tx, { ...fields, id, seasonId: season.id, slug, now: ctx.now });
    await replaceGarments(tx, id, input.fields.garments, ctx.newId);
    await scheduleOwnFreeze(tx, { id, seasonId: season.id, freezesAt: fields.freezesAt });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'division added', subjectId: id, data: { name: fields.name } },
    );
    return { slug };
  });
}
