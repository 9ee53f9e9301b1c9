import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listDivisionViews } from '@/db/queries/division-view';
import { enqueueJob } from '@/db/queries/jobs';
import { listSeasons } from '@/db/queries/season-view';
import { lockCurrentSeason, updateSeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { formatDay } from '@/lib/domain/dates/format';
import { listSeasonFaults } from '@/lib/domain/dates/list-season-faults';
import { toDay, toInstant } from '@/lib/domain/dates/zone';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { changeSeasonSchema } from './season-schemas';

/** Changes the name and dates of a season; a new freeze replaces the one on the worker's calendar. */
export async function changeSeason(
  ctx: ActorContext,
  input: z.output<typeof changeSeasonSchema>,
): Promise<{ rowVersion: number }> {
  assertCan(ctx.actor, 'season.write');
  return withLeague(ctx.league.id, async (tx) => {
    // Names are compared below, so seasons change one after the other.
    await lockCurrentSeason(tx);
    const seasons = await listSeasons(tx);
    const before = seasons.find((season) => season.id === input.seasonId);
    if (!before) throw notFound('season');
    if (
      seasons.some(
        (season) => season.id !== before.id && season.name.toLowerCase() === input.fields.name.toLowerCase(),
      )
    ) {
      const message = `There is another season called ${input.fields.name}. Choose another name.`;
      throw new AppError('conflict', message, { fields: { name: message } });
    }
    for (const division of await listDivisionViews(tx, before.id)) {
      if (division.ownFreezesAt === null) continue;
      const freezeOn = toDay(division.ownFreezesAt, ctx.league.timeZone);
      const faults = listSeasonFaults({ ...input.fields, freezeOn });
      const field = faults.freezeOn ? 'rosterOpensOn' : faults.handOutOn && 'handOutOn';
      if (field === undefined) continue;
      const message = `${division.name} freezes on ${formatDay(freezeOn)}, ${faults.freezeOn ? 'before rosters would be open for a day' : 'which would be on or after the hand-out day'}. Change its own freeze first.`;
      throw new AppError('invalid', message, { fields: { [field]: message } });
    }
    const fields = {
      ...input.fields,
      freezesAt: toInstant(input.fields.freezesAt, ctx.league.timeZone).instant,
    };
    if (!(await updateSeason(tx, { ...fields, id: before.id, rowVersion: input.rowVersion }))) {
      throw new AppError(
        'conflict',
        'Somebody changed this season since you opened it. Your entries are kept here; reload to see theirs.',
      );
    }
    if (fields.freezesAt.getTime() !== before.freezesAt.getTime()) {
      await enqueueJob(
        tx,
        { task: 'freeze-rosters', payload: { leagueId: ctx.league.id, seasonId: before.id } },
        { key: `freeze:${before.id}`, runAt: fields.freezesAt },
      );
    }
    const { name, sport, rosterOpensOn, freezesAt, releaseOn, handOutOn, firstMatchOn } = before;
    const changes = listDifferences(
      { name, sport, rosterOpensOn, freezesAt, releaseOn, handOutOn, firstMatchOn },
      fields,
    );
    if (changes) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        { type: 'season changed', subjectId: before.id, data: { name: fields.name, changes } },
      );
    }
    return { rowVersion: input.rowVersion + 1 };
  });
}
