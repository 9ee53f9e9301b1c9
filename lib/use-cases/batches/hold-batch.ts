import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertBatch, replaceBatchRosters } from '@/db/queries/batches';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertShop, pickReadyTeams } from '../batch-guards';
import { assertCan, type ActorContext } from '../context';
import type { holdBatchSchema } from './batch-schemas';

/** Makes a held batch of signed-off teams for one shop and answers its code. */
export async function holdBatch(
  ctx: ActorContext,
  input: z.output<typeof holdBatchSchema>,
): Promise<{ code: string }> {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    await assertShop(tx, input.shopId);
    const teams = await pickReadyTeams(tx, season.id, input.teamIds, null);
    const id = ctx.newId();
    const code = await insertBatch(tx, {
      id,
      seasonId: season.id,
      shopId: input.shopId,
      promisedOn: input.promisedOn,
      now: ctx.now,
      userId: ctx.actor.userId,
    });
    await replaceBatchRosters(
      tx,
      id,
      teams.map((team) => team.roster.id),
    );
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'batch held', subjectId: id, data: { code, teams: teams.length } },
    );
    return { code };
  });
}
