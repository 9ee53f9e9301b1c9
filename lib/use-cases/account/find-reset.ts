import { findAccount, findPasswordReset } from '@/db/queries/accounts';
import { withToken, withUser } from '@/db/tenant';
import { hashToken } from '@/lib/platform/ids';
import type { RequestContext } from '../context';

/** Whose password a reset link would set; undefined when it was used, is too old or never was one. */
export async function findReset(ctx: RequestContext, token: string): Promise<{ email: string } | undefined> {
  const tokenHash = hashToken(token);
  const userId = await withToken(tokenHash, (tx) => findPasswordReset(tx, tokenHash, ctx.now));
  if (userId === undefined) return undefined;
  const account = await withUser(userId, (tx) => findAccount(tx, userId));
  return account && { email: account.email };
}
