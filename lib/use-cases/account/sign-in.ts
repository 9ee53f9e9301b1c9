import { insertSystemEvent } from '@/db/queries/audit';
import { findAccountByEmail } from '@/db/queries/people';
import { clearRateBudget, returnRatePoint } from '@/db/rate-limit';
import { withEmail, withOpen } from '@/db/tenant';
import type { SystemEvent } from '@/lib/domain/audit/event';
import { AppError } from '@/lib/platform/errors';
import { verifyPassword } from '@/lib/platform/passwords';
import type { RequestContext } from '../context';
import { budgets, spend } from '../rate-budgets';

export type SignedIn = { userId: string; email: string; name: string; sessionVersion: number };

const tooMany = 'Too many tries. Set a new password by e-mail, or try later.';

/**
 * Checks an e-mail address and a password. An unknown address and a wrong password take the same work and give the
 * same answer (null); too many tries throw `too-many` with the seconds to wait, whether or not the account exists.
 */
export async function signIn(
  ctx: RequestContext,
  input: { email: string; password: string; address: string },
): Promise<SignedIn | null> {
  const email = input.email.trim().toLowerCase();
  const note = (userId: string | null, event: SystemEvent) =>
    withOpen((tx) => insertSystemEvent(tx, { ...ctx, userId }, event));

  // The points are taken before the password is looked at: of a hundred tries at once, ten are looked at.
  try {
    // The address pays first, so that one which has nothing left cannot spend what belongs to accounts.
    await spend(budgets.signIn.address, input.address, tooMany);
    await spend(budgets.signIn.account, email, tooMany);
  } catch (error) {
    if (error instanceof AppError)
      await note(null, { type: 'sign-in refused', data: { because: 'throttled' } });
    throw error;
  }

  const account = await withEmail(email, (tx) => findAccountByEmail(tx, email));
  const right = await verifyPassword(account?.password_hash, input.password);
  if (!account || !right) {
    await note(account?.id ?? null, { type: 'sign-in refused', data: { because: 'wrong' } });
    return null;
  }
  await clearRateBudget(budgets.signIn.account, email);
  await returnRatePoint(budgets.signIn.address, input.address);
  await note(account.id, { type: 'signed in', data: {} });
  return {
    userId: account.id,
    email: account.email,
    name: account.name,
    sessionVersion: account.session_version,
  };
}
