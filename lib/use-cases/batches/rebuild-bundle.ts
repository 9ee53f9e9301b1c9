import { insertAuditEvent } from '@/db/queries/audit';
import { findBatchById } from '@/db/queries/batches';
import { lockBundle, updateBundleState } from '@/db/queries/bundles';
import { enqueueJob } from '@/db/queries/jobs';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Queues another try of a bundle that failed; what was finished is kept. */
export async function rebuildBundle(
  ctx: ActorContext,
  input: { batchId: string },
): Promise<{ queued: true }> {
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await findBatchById(tx, input.batchId);
    // What is held is the league's own: to a shop it does not exist yet.
    if (!batch || (batch.state === 'held' && !can(ctx.actor, 'batch.make'))) throw notFound('batch');
    assertCan(ctx.actor, 'batch.read', { shopId: batch.shop.id, what: 'batch' });
    const bundle = await lockBundle(tx, input.batchId);
    if (!bundle) throw notFound('bundle');
    if (bundle.state !== 'failed')
      throw new AppError('conflict', `The bundle is ${bundle.state}; there is nothing to try again.`);
    await updateBundleState(tx, bundle.id, { state: 'queued', now: ctx.now });
    await enqueueJob(
      tx,
      { task: 'build-bundle', payload: { leagueId: ctx.league.id, batchId: batch.id } },
      { key: `bundle:${batch.id}`, runAt: null },
    );
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'bundle queued again', subjectId: batch.id, data: { code: batch.code } },
    );
    return { queued: true };
  });
}
