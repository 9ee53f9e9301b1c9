import { takeRatePoint, type RateBudget } from '@/db/rate-limit';
import { AppError } from '@/lib/platform/errors';

// Each thing a stranger may try is counted twice: for the account it aims at, whether or not that account exists,
// and for the address it comes from. The figures are our own.
const quarter = 900;
const hour = 3600;

export const budgets = {
  signIn: {
    account: { name: 'sign-in-account', points: 10, seconds: quarter },
    address: { name: 'sign-in-address', points: 50, seconds: quarter },
  },
  askReset: {
    account: { name: 'reset-account', points: 3, seconds: hour },
    address: { name: 'reset-address', points: 20, seconds: hour },
  },
  askAccount: {
    account: { name: 'sign-up-account', points: 3, seconds: hour },
    address: { name: 'sign-up-address', points: 20, seconds: hour },
  },
} as const satisfies Record<string, { account: RateBudget; address: RateBudget }>;

/** Guesses at the old password by whoever sits at a signed-in screen. */
export const oldPasswordBudget: RateBudget = { name: 'old-password', points: 10, seconds: quarter };

/** Invitations one league may send: enough for a large one, too few to be of use to somebody who sends junk. */
export const invitationBudget: RateBudget = { name: 'invitations', points: 300, seconds: hour };

/** Leagues one person may create: enough for a club with several sports. */
export const leagueBudget: RateBudget = { name: 'new-leagues', points: 10, seconds: 24 * hour };

/** Takes a point; when the budget is spent throws `too-many` with `says` and how long to wait. */
export async function spend(budget: RateBudget, key: string, says: string): Promise<void> {
  const wait = await takeRatePoint(budget, key);
  if (wait !== null)
    throw new AppError('too-many', `${says} ${describeWait(wait)}`, { retryAfterSeconds: wait });
}

function describeWait(seconds: number): string {
  const minutes = Math.ceil(seconds / 60);
  if (minutes > 90) return `Wait ${Math.ceil(minutes / 60)} hours.`;
  return minutes === 1 ? 'Wait a minute.' : `Wait ${minutes} minutes.`;
}
