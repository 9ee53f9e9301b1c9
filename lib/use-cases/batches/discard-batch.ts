import { insertAuditEvent } from '@/db/queries/audit';
import { deleteBatch } from '@/db/queries/batches';
import { withLeague } from '@/db/tenant';
import { lockHeldBatch } from '../batch-guards';
import { assertCan, type ActorContext } from '../context';

/** Discards a held batch: its teams can go into another one. */
export async function discardBatch(ctx: ActorContext, input: { batchId: string }): Promise<{ code: string }> {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await lockHeldBatch(tx, input.batchId);
    await deleteBatch(tx, batch.id);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'batch discarded', subjectId: batch.id, data: { code: batch.code } },
    );
    return { code: batch.code };
  });
}
