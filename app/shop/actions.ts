'use server';

import { batchIdSchema, markBatchSchema } from '@/lib/use-cases/batches/batch-schemas';
import { markBatch } from '@/lib/use-cases/batches/mark-batch';
import { rebuildBundle } from '@/lib/use-cases/batches/rebuild-bundle';
import { leagueAction } from '@/lib/web/action';

export const markShopBatchAction = leagueAction(markBatchSchema, markBatch);
export const rebuildShopBundleAction = leagueAction(batchIdSchema, rebuildBundle);
