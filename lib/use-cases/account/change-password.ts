import type { z } from 'zod';
import { endSessions, findAccount } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { queueEmail } from '@/db/queries/jobs';
import { clearRateBudget } from '@/db/rate-limit';
import { withUser } from '@/db/tenant';
import { AppError } from '@/lib/platform/errors';
import { hashPassword, verifyPassword } from '@/lib/platform/passwords';
import { assertGoodPassword } from '../account-guards';
import type { PersonContext } from '../context';
import { links } from '../links';
import { oldPasswordBudget, spend } from '../rate-budgets';
import type { changePasswordSchema } from './account-schemas';

/** Changes one's own password, which needs the old one, and ends every session, this one included. */
export async function changePassword(
  ctx: PersonContext,
  input: z.output<typeof changePasswordSchema>,
): Promise<{ email: string }> {
  await spend(oldPasswordBudget, ctx.userId, 'Too many tries.');
  const account = await withUser(ctx.userId, (tx) => findAccount(tx, ctx.userId));
  if (!account || !(await verifyPassword(account.password_hash, input.oldPassword))) {
    const says = 'This is not the password you have now.';
    throw new AppError('invalid', says, { fields: { oldPassword: says } });
  }
  await clearRateBudget(oldPasswordBudget, ctx.userId);
  assertGoodPassword(input.newPassword, account.email, 'newPassword');
  const passwordHash = await hashPassword(input.newPassword);
  await withUser(ctx.userId, async (tx) => {
    if (!(await endSessions(tx, ctx.userId, { passwordHash, ifHash: account.password_hash }))) {
      throw new AppError('conflict', 'The password was changed elsewhere a moment ago. Sign in again.');
    }
    await insertSystemEvent(tx, ctx, { type: 'password changed', data: { how: 'settings' } });
    const params = { resetLink: links.askReset() };
    await queueEmail(tx, ctx, account.email, { template: 'password-changed', params });
  });
  return { email: account.email };
}
