import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { getDatabase } from './client';

/** A budget: so many points in so many seconds, counted in PostgreSQL so that every web process shares it. */
export type RateBudget = { name: string; points: number; seconds: number };

const limiters = new Map<string, RateLimiterPostgres>();

function getLimiter(budget: RateBudget): RateLimiterPostgres {
  const key = `${budget.name}:${budget.points}:${budget.seconds}`;
  const known = limiters.get(key);
  if (known) return known;
  const limiter = new RateLimiterPostgres({
    storeClient: getDatabase().pool,
    keyPrefix: budget.name,
    points: budget.points,
    duration: budget.seconds,
    tableName: 'rate_limits',
    tableCreated: true,
    clearExpiredByTimeout: false,
  });
  limiters.set(key, limiter);
  return limiter;
}

/** Keys may be addresses of people and of any length: what is kept is a digest that tells neither. */
const keep = (key: string): string => createHash('sha256').update(key).digest('base64url');

/** Takes one point from the budget for `key`; answers how many seconds to wait when it is spent, else null. */
export async function takeRatePoint(budget: RateBudget, key: string): Promise<number | null> {
  try {
    await getLimiter(budget).consume(keep(key));
    return null;
  } catch (reason) {
    if (reason instanceof RateLimiterRes) return Math.max(1, Math.ceil(reason.msBeforeNext / 1000));
    throw reason;
  }
}

/** Gives one point back, as for a try that turned out to be right. */
export async function returnRatePoint(budget: RateBudget, key: string): Promise<void> {
  await getLimiter(budget).reward(keep(key), 1);
}

/** Gives `key` its whole budget back, as after a right password. */
export const clearRateBudget = (budget: RateBudget, key: string): Promise<boolean> =>
  getLimiter(budget).delete(keep(key));

/** Forgets budgets that ran out of time; the worker calls it now and then so that the table stays small. */
export async function deleteExpiredRates(now: Date): Promise<void> {
  await getDatabase().pool.query('delete from rate_limits where expire < $1', [now.getTime()]);
}
