import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { lockBatch, updateBatchState } from '@/db/queries/batches';
import { withLeague } from '@/db/tenant';
import { batchStateOwner, nextBatchState, previousBatchState } from '@/lib/domain/batch/batch-state';
import { can } from '@/lib/domain/access/permissions';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { markBatchSchema } from './batch-schemas';

/**
 * Moves a batch one state on, or one back when a step was a slip: the shop marks on press, packed and shipped, the
 * league marks received. A step that has been taken already answers as if it had just been taken.
 */
export async function markBatch(
  ctx: ActorContext,
  input: z.output<typeof markBatchSchema>,
): Promise<{ code: string; state: string }> {
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await lockBatch(tx, input.batchId);
    if (!batch || (batch.state === 'held' && !can(ctx.actor, 'batch.make'))) throw notFound('batch');
    // A step back undoes the later state, so it belongs to whoever may set that one.
    const forward = nextBatchState(input.from) === input.to;
    const owner = batchStateOwner[forward ? input.to : input.from];
    const scope = { shopId: batch.shop.id, what: 'batch' };
    assertCan(ctx.actor, 'batch.read', scope);
    if (owner === 'shop') assertCan(ctx.actor, 'batch.mark', scope);
    else assertCan(ctx.actor, 'batch.receive');
    if (batch.state === input.to) return { code: batch.code, state: batch.state };
    if (batch.state !== input.from || (!forward && previousBatchState(input.from) !== input.to)) {
      throw new AppError(
        'conflict',
        `Batch ${batch.code} is ${batch.state} now, so it can't go from ${input.from} to ${input.to}. Reload to see it.`,
      );
    }
    await updateBatchState(tx, {
      batchId: batch.id,
      eventId: ctx.newId(),
      state: input.to,
      now: ctx.now,
      userId: ctx.actor.userId,
      note: input.note,
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'batch marked',
        subjectId: batch.id,
        data: { code: batch.code, from: input.from, to: input.to },
      },
    );
    return { code: batch.code, state: input.to };
  });
}
