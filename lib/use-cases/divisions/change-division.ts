import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listDivisionViews } from '@/db/queries/division-view';
import { lockSeasonOfDivision, updateDivision } from '@/db/queries/divisions';
import { replaceGarments } from '@/db/queries/garments';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { readDivisionFields, scheduleOwnFreeze } from '../division-guards';
import type { changeDivisionSchema } from './division-schemas';

/** Changes a division. Sizes that players gave for a garment that is gone stay with the players, unseen. */
export async function changeDivision(
  ctx: ActorContext,
  input: z.output<typeof changeDivisionSchema>,
): Promise<{ rowVersion: number }> {
  assertCan(ctx.actor, 'division.write');
  return withLeague(ctx.league.id, async (tx) => {
    const seasonId = await lockSeasonOfDivision(tx, input.divisionId);
    if (seasonId === undefined) throw notFound('division');
    const before = (await listDivisionViews(tx, seasonId)).find(
      (division) => division.id === input.divisionId,
    );
    if (!before) throw notFound('division');
    const { fields } = await readDivisionFields(tx, ctx, input.fields, {
      seasonId,
      ownId: before.id,
    });
    if (!(await updateDivision(tx, { ...fields, id: before.id, rowVersion: input.rowVersion }))) {
      throw new AppError(
        'conflict',
        'Somebody changed this division since you opened it. Your entries are kept here; reload to see theirs.',
      );
    }
    await replaceGarments(tx, before.id, input.fields.garments, ctx.newId);
    await scheduleOwnFreeze(tx, { id: before.id, seasonId, freezesAt: fields.freezesAt });
    const { name, ageBand, level, ruleSetId, leastPlayers, mostPlayers, ownFreezesAt, garments } = before;
    const changes = listDifferences(
      { name, ageBand, level, ruleSetId, leastPlayers, mostPlayers, freezesAt: ownFreezesAt, garments },
      { ...fields, garments: input.fields.garments },
    );
    if (changes) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        { type: 'division changed', subjectId: before.id, data: { name: fields.name, changes } },
      );
    }
    return { rowVersion: input.rowVersion + 1 };
  });
}
