import type { z } from 'zod';
import { findSignUp, insertAccount, takeSignUp } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { withToken } from '@/db/tenant';
import { AppError } from '@/lib/platform/errors';
import { hashToken } from '@/lib/platform/ids';
import { hashPassword } from '@/lib/platform/passwords';
import { assertGoodPassword, spentLink } from '../account-guards';
import type { RequestContext } from '../context';
import type { openAccountSchema } from './account-schemas';

/** Opens the account that a sign-up link stands for, with the password chosen now; a link works once. */
export async function openAccount(
  ctx: RequestContext,
  input: z.output<typeof openAccountSchema>,
): Promise<{ email: string }> {
  const tokenHash = hashToken(input.token);
  const spent = spentLink('Ask for a new one on the page "Open an account".');
  const wish = await withToken(tokenHash, (tx) => findSignUp(tx, tokenHash, ctx.now));
  if (!wish) throw spent;
  assertGoodPassword(input.password, wish.email);
  const passwordHash = await hashPassword(input.password);
  return withToken(tokenHash, async (tx) => {
    const taken = await takeSignUp(tx, tokenHash, ctx.now);
    if (!taken) throw spent;
    const id = ctx.newId();
    const opened = await insertAccount(tx, { id, ...taken, passwordHash, now: ctx.now });
    if (!opened) {
      throw new AppError('conflict', 'This address has an account already. Sign in, or set a new password.');
    }
    await insertSystemEvent(tx, { ...ctx, userId: id }, { type: 'account made', data: {} });
    return { email: taken.email };
  });
}
