import type { JobHelpers } from 'graphile-worker';
import { z } from 'zod';
import { readClock } from '@/lib/platform/clock';
import { newId } from '@/lib/platform/ids';
import { getLog } from '@/lib/platform/log';
import { buildBundle, failBundle } from '@/lib/use-cases/batches/build-bundle';

const payloadSchema = z.object({ leagueId: z.uuid(), batchId: z.uuid() });

/** Builds the bundle of a released batch; after the last try it is marked failed, so that the page can offer another. */
export async function handleBuildBundle(payload: unknown, helpers: Pick<JobHelpers, 'job'>): Promise<void> {
  const input = payloadSchema.parse(payload);
  const ctx = { now: readClock(), requestId: newId(), newId };
  try {
    const outcome = await buildBundle(ctx, input);
    getLog().info({ batchId: input.batchId, outcome, requestId: ctx.requestId }, 'bundle');
  } catch (error) {
    getLog().error({ err: error, batchId: input.batchId, requestId: ctx.requestId }, 'bundle failed');
    if (helpers.job.attempts >= helpers.job.max_attempts) await failBundle(ctx, input);
    throw error;
  }
}
