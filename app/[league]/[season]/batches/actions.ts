'use server';

import { revalidatePath } from 'next/cache';
import {
  batchIdSchema,
  changeBatchSchema,
  holdBatchSchema,
  markBatchSchema,
} from '@/lib/use-cases/batches/batch-schemas';
import { changeBatch } from '@/lib/use-cases/batches/change-batch';
import { discardBatch } from '@/lib/use-cases/batches/discard-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { markBatch } from '@/lib/use-cases/batches/mark-batch';
import { rebuildBundle } from '@/lib/use-cases/batches/rebuild-bundle';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { leagueAction } from '@/lib/web/action';

/** Every page of a league shows batches somewhere: readiness, rosters, the batch itself. */
const afterwards =
  <A extends unknown[], T>(run: (...args: A) => Promise<T>) =>
  async (...args: A): Promise<T> => {
    const answer = await run(...args);
    revalidatePath('/[league]', 'layout');
    revalidatePath('/shop', 'layout');
    return answer;
  };

export const holdBatchAction = leagueAction(holdBatchSchema, afterwards(holdBatch));
export const changeBatchAction = leagueAction(changeBatchSchema, afterwards(changeBatch));
export const discardBatchAction = leagueAction(batchIdSchema, afterwards(discardBatch));
export const releaseBatchAction = leagueAction(batchIdSchema, afterwards(releaseBatch));
export const markBatchAction = leagueAction(markBatchSchema, afterwards(markBatch));
export const rebuildBundleAction = leagueAction(batchIdSchema, afterwards(rebuildBundle));
