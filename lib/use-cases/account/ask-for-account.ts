import type { z } from 'zod';
import { insertSignUp } from '@/db/queries/accounts';
import { queueEmail } from '@/db/queries/jobs';
import { findAccountByEmail } from '@/db/queries/people';
import { withEmail, withToken } from '@/db/tenant';
import { hashToken, newToken } from '@/lib/platform/ids';
import type { RequestContext } from '../context';
import { links } from '../links';
import { budgets, spend } from '../rate-budgets';
import type { askForAccountSchema } from './account-schemas';

const hoursValid = 24;

/**
 * Sends a link that opens an account. Whether the address has one already is told only to its owner, in the letter:
 * the answer here is the same, and so is the work.
 */
export async function askForAccount(
  ctx: RequestContext,
  input: z.output<typeof askForAccountSchema> & { address: string },
): Promise<void> {
  await spend(budgets.askAccount.address, input.address, 'Too many accounts were asked for from here.');
  await spend(budgets.askAccount.account, input.email, 'This address was sent several letters already.');
  const known = await withEmail(input.email, (tx) => findAccountByEmail(tx, input.email));
  const token = newToken();
  const tokenHash = hashToken(token);
  await withToken(tokenHash, async (tx) => {
    await insertSignUp(tx, {
      id: ctx.newId(),
      // A link nobody holds: the row is written either way, so that the time taken tells nothing.
      tokenHash,
      email: input.email,
      name: input.name,
      now: ctx.now,
      expiresAt: new Date(ctx.now.getTime() + hoursValid * 3_600_000),
    });
    if (known) {
      const params = { signInLink: links.signIn(), resetLink: links.askReset() };
      await queueEmail(tx, ctx, input.email, { template: 'sign-up-known', params });
    } else {
      const params = { link: links.confirmSignUp(token), expires: `for ${hoursValid} hours` };
      await queueEmail(tx, ctx, input.email, { template: 'sign-up', params });
    }
  });
}
