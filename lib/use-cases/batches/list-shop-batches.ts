import { insertSystemEvent } from '@/db/queries/audit';
import { listBatchesOfMyShops } from '@/db/queries/batches';
import { withUser } from '@/db/tenant';
import type { PersonContext } from '../context';

/**
 * Released batches over every league that invited this decorator's shops, newest first. Reaching over leagues is
 * noted each time, since no league's own history would show it.
 */
export async function listShopBatches(ctx: PersonContext) {
  return withUser(ctx.userId, async (tx) => {
    const batches = await listBatchesOfMyShops(tx);
    await insertSystemEvent(tx, ctx, {
      type: 'batches listed over leagues',
      data: { batches: batches.length },
    });
    return batches;
  });
}
export type ShopBatch = Awaited<ReturnType<typeof listShopBatches>>[number];
