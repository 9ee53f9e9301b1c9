import { tidyExpired } from '@/db/queries/health';
import { deleteExpiredRates } from '@/db/rate-limit';
import type { RequestContext } from '../context';

/** Removes what time has made useless: spent rate budgets, links past their date, letters nobody could deliver. */
export async function tidy(ctx: RequestContext) {
  await deleteExpiredRates(ctx.now);
  return tidyExpired(ctx.now);
}
