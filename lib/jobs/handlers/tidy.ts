import { readClock } from '@/lib/platform/clock';
import { newId } from '@/lib/platform/ids';
import { getLog } from '@/lib/platform/log';
import { tidy } from '@/lib/use-cases/health/tidy';

/** Run by the worker's own clock, once an hour (see registry.ts). */
export async function handleTidy(): Promise<void> {
  const ctx = { now: readClock(), requestId: newId(), newId };
  getLog().info({ ...(await tidy(ctx)), requestId: ctx.requestId }, 'tidied');
}
