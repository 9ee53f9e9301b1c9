import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import {
  listBatchRosters,
  lockRostersOfTeams,
  replaceBatchRosters,
  updateHeldBatch,
} from '@/db/queries/batches';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { AppError } from '@/lib/platform/errors';
import { assertShop, lockHeldBatch, pickReadyTeams } from '../batch-guards';
import { assertCan, type ActorContext } from '../context';
import type { changeBatchSchema } from './batch-schemas';

/** Changes the teams, the shop or the promised day of a batch that is still held. */
export async function changeBatch(
  ctx: ActorContext,
  input: z.output<typeof changeBatchSchema>,
): Promise<{ code: string }> {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await lockHeldBatch(tx, input.batchId);
    await assertShop(tx, input.shopId);
    const held = await listBatchRosters(tx, batch.id);
    // All at once and so in one order: two batches that reach for each other's teams then wait instead of deadlocking.
    await lockRostersOfTeams(tx, [...held.map((roster) => roster.teamId), ...input.teamIds]);
    const before = held.map((roster) => roster.team);
    const teams = await pickReadyTeams(tx, batch.seasonId, input.teamIds, batch.id);
    const changed = await updateHeldBatch(tx, {
      id: batch.id,
      rowVersion: input.rowVersion,
      shopId: input.shopId,
      promisedOn: input.promisedOn,
    });
    if (!changed) {
      throw new AppError(
        'conflict',
        `Batch ${batch.code} was changed since you opened it. Your choices are still here; reload to see the other change.`,
      );
    }
    await replaceBatchRosters(
      tx,
      batch.id,
      teams.map((team) => team.roster.id),
    );
    const changes = listDifferences(
      { teams: before, shop: batch.shop.id, promisedOn: batch.promisedOn },
      { teams: teams.map((team) => team.name).sort(), shop: input.shopId, promisedOn: input.promisedOn },
    );
    if (changes) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        { type: 'batch changed', subjectId: batch.id, data: { code: batch.code, changes } },
      );
    }
    return { code: batch.code };
  });
}
