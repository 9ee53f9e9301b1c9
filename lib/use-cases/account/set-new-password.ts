import type { z } from 'zod';
import { endSessions, findAccount, findPasswordReset, usePasswordReset } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { queueEmail } from '@/db/queries/jobs';
import { clearRateBudget } from '@/db/rate-limit';
import { withToken, withUser } from '@/db/tenant';
import { hashToken } from '@/lib/platform/ids';
import { hashPassword } from '@/lib/platform/passwords';
import { assertGoodPassword, spentLink } from '../account-guards';
import type { RequestContext } from '../context';
import { links } from '../links';
import { budgets } from '../rate-budgets';
import type { setNewPasswordSchema } from './account-schemas';

/** Sets the password a reset link stands for, and ends every session of that person; a link works once. */
export async function setNewPassword(
  ctx: RequestContext,
  input: z.output<typeof setNewPasswordSchema>,
): Promise<{ email: string }> {
  const tokenHash = hashToken(input.token);
  const spent = spentLink('Ask for a new one on the page "Set a new password".');
  const userId = await withToken(tokenHash, (tx) => findPasswordReset(tx, tokenHash, ctx.now));
  if (userId === undefined) throw spent;
  const account = await withUser(userId, (tx) => findAccount(tx, userId));
  if (!account) throw spent;
  assertGoodPassword(input.password, account.email);
  const passwordHash = await hashPassword(input.password);
  await withUser(userId, async (tx) => {
    if (!(await usePasswordReset(tx, { userId, tokenHash, now: ctx.now }))) throw spent;
    await endSessions(tx, userId, { passwordHash });
    await insertSystemEvent(tx, { ...ctx, userId }, { type: 'password changed', data: { how: 'reset' } });
    const params = { resetLink: links.askReset() };
    await queueEmail(tx, ctx, account.email, { template: 'password-changed', params });
  });
  // Whoever was kept out by somebody else's guesses gets in with the new password.
  await clearRateBudget(budgets.signIn.account, account.email);
  return { email: account.email };
}
