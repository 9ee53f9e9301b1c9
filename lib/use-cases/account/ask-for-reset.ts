import type { z } from 'zod';
import { insertPasswordReset } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { queueEmail } from '@/db/queries/jobs';
import { findAccountByEmail } from '@/db/queries/people';
import { withEmail, withUser } from '@/db/tenant';
import { hashToken, newToken } from '@/lib/platform/ids';
import type { RequestContext } from '../context';
import { links } from '../links';
import { budgets, spend } from '../rate-budgets';
import type { askForResetSchema } from './account-schemas';

/** Ends a transaction whose work was done only so that it takes its time. */
class NothingToKeep extends Error {}

/**
 * Sends a link that sets a new password: works once, for an hour. Whether the address has an account can be told
 * neither from the answer nor from the work: for an unknown one a letter is queued and taken back.
 */
export async function askForReset(
  ctx: RequestContext,
  input: z.output<typeof askForResetSchema> & { address: string },
): Promise<void> {
  await spend(budgets.askReset.address, input.address, 'Too many letters were asked for from here.');
  await spend(budgets.askReset.account, input.email, 'This address was sent several letters already.');
  const account = await withEmail(input.email, (tx) => findAccountByEmail(tx, input.email));
  const userId = account?.id ?? ctx.newId();
  const token = newToken();
  try {
    await withUser(userId, async (tx) => {
      const params = { link: links.reset(token), expires: 'for an hour' };
      await queueEmail(tx, ctx, input.email, { template: 'password-reset', params });
      await insertSystemEvent(tx, { ...ctx, userId }, { type: 'password reset asked for', data: {} });
      if (!account) throw new NothingToKeep();
      await insertPasswordReset(tx, {
        id: ctx.newId(),
        userId,
        tokenHash: hashToken(token),
        now: ctx.now,
        expiresAt: new Date(ctx.now.getTime() + 3_600_000),
      });
    });
  } catch (error) {
    if (!(error instanceof NothingToKeep)) throw error;
  }
}
