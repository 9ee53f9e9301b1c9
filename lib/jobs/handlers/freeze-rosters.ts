import { z } from 'zod';
import { readClock } from '@/lib/platform/clock';
import { newId } from '@/lib/platform/ids';
import { getLog } from '@/lib/platform/log';
import { freezeDueRosters } from '@/lib/use-cases/rosters/freeze-due-rosters';

const payloadSchema = z.object({ leagueId: z.uuid(), seasonId: z.uuid() });

/** Freezes the signed-off rosters of a season when their freeze has come. */
export async function handleFreezeRosters(payload: unknown): Promise<void> {
  const input = payloadSchema.parse(payload);
  const ctx = { now: readClock(), requestId: newId(), newId };
  const frozen = await freezeDueRosters(ctx, input);
  getLog().info({ seasonId: input.seasonId, frozen, requestId: ctx.requestId }, 'rosters frozen');
}
