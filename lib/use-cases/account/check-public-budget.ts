import { takeRatePoint, type RateBudget } from '@/db/rate-limit';
import { AppError } from '@/lib/platform/errors';

const budget: RateBudget = { name: 'public-api', points: 60, seconds: 60 };

/** Takes one of the 60 requests a minute that an address has for the public API; throws `too-many` beyond that. */
export async function checkPublicBudget(address: string): Promise<void> {
  const wait = await takeRatePoint(budget, address);
  if (wait !== null) {
    throw new AppError(
      'too-many',
      `This address has made 60 requests in a minute. Try again in ${wait} seconds.`,
      { retryAfterSeconds: wait },
    );
  }
}
