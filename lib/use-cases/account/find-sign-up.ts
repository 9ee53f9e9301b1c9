import { findSignUp } from '@/db/queries/accounts';
import { withToken } from '@/db/tenant';
import { hashToken } from '@/lib/platform/ids';
import type { RequestContext } from '../context';

/** Whose account a sign-up link would open; undefined when it was used, is too old or never was one. */
export function findPendingSignUp(
  ctx: RequestContext,
  token: string,
): Promise<{ email: string; name: string } | undefined> {
  const tokenHash = hashToken(token);
  return withToken(tokenHash, (tx) => findSignUp(tx, tokenHash, ctx.now));
}
