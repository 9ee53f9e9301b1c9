import { insertSystemEvent } from '@/db/queries/audit';
import { findAccountByEmail } from '@/db/queries/people';
import { clearRateBudget, peekRateWait, takeRatePoint, type RateBudget } from '@/db/rate-limit';
import { withEmail, withOpen } from '@/db/tenant';
import { AppError } from '@/lib/platform/errors';
import { verifyPassword } from '@/lib/platform/passwords';
import type { RequestContext } from '../context';

// Ten wrong passwords for one account or fifty from one address in a quarter of an hour, then a wait. Our own figures.
const perAccount: RateBudget = { name: 'sign-in-account', points: 10, seconds: 900 };
const perAddress: RateBudget = { name: 'sign-in-address', points: 50, seconds: 900 };

export type SignedIn = { userId: string; email: string; name: string; sessionVersion: number };

/**
 * Checks an e-mail address and a password. An unknown address and a wrong password take the same work and give the
 * same answer (null); too many tries throw `too-many` with the seconds to wait, whether or not the account exists.
 */
export async function signIn(
  ctx: RequestContext,
  input: { email: string; password: string; address: string },
): Promise<SignedIn | null> {
  const email = input.email.trim().toLowerCase();
  const wait = (await peekRateWait(perAccount, email)) ?? (await peekRateWait(perAddress, input.address));
  if (wait !== null) {
    await withOpen((tx) =>
      insertSystemEvent(
        tx,
        { ...ctx, userId: null },
        { type: 'sign-in refused', data: { because: 'throttled' } },
      ),
    );
    throw tooMany(wait);
  }
  const account = await withEmail(email, (tx) => findAccountByEmail(tx, email));
  const right = await verifyPassword(account?.password_hash, input.password);
  if (!account || !right) {
    // The point is taken before the answer goes out, so that parallel tries can't outrun the count.
    const spent =
      (await takeRatePoint(perAccount, email)) ?? (await takeRatePoint(perAddress, input.address));
    await withOpen((tx) =>
      insertSystemEvent(
        tx,
        { ...ctx, userId: account?.id ?? null },
        { type: 'sign-in refused', data: { because: 'wrong' } },
      ),
    );
    if (spent !== null) throw tooMany(spent);
    return null;
  }
  await clearRateBudget(perAccount, email);
  await withOpen((tx) =>
    insertSystemEvent(tx, { ...ctx, userId: account.id }, { type: 'signed in', data: {} }),
  );
  return {
    userId: account.id,
    email: account.email,
    name: account.name,
    sessionVersion: account.session_version,
  };
}

function tooMany(seconds: number): AppError {
  const minutes = Math.ceil(seconds / 60);
  const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`;
  return new AppError('too-many', `Too many tries. Wait ${wait}, or set a new password by e-mail.`, {
    retryAfterSeconds: seconds,
  });
}
