import type { z } from 'zod';
import { insertAccount } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { findInvitationByToken } from '@/db/queries/invitations';
import { findAccountByEmail } from '@/db/queries/people';
import { withEmail, withLeague, withToken } from '@/db/tenant';
import { AppError } from '@/lib/platform/errors';
import { hashToken } from '@/lib/platform/ids';
import { hashPassword } from '@/lib/platform/passwords';
import { assertGoodPassword, spentLink } from '../account-guards';
import type { RequestContext } from '../context';
import { joinLeague } from '../people-guards';
import type { joinAsNewcomerSchema } from './people-schemas';

/**
 * Accepts an invitation for somebody without an account: opens one for the address it was sent to (following the link
 * has shown that it is theirs) and gives them the role, both or neither.
 */
export async function joinAsNewcomer(
  ctx: RequestContext,
  input: z.output<typeof joinAsNewcomerSchema>,
): Promise<{ email: string }> {
  const tokenHash = hashToken(input.token);
  const found = await withToken(tokenHash, (tx) => findInvitationByToken(tx, tokenHash));
  if (!found) throw spentLink('Ask your league admin to send the invitation again.');
  const { email } = found;
  const known = new AppError('conflict', `${email} has an account already. Sign in with it to accept.`);
  // Checked before the costly hash; the insertion below has the last word.
  if (await withEmail(email, (tx) => findAccountByEmail(tx, email))) throw known;
  assertGoodPassword(input.password, email);
  const passwordHash = await hashPassword(input.password);
  await withLeague(found.league_id, async (tx) => {
    const userId = ctx.newId();
    const opened = await insertAccount(tx, {
      id: userId,
      email,
      name: input.name,
      passwordHash,
      now: ctx.now,
    });
    if (!opened) throw known;
    await joinLeague(tx, ctx, { tokenHash, userId, email });
    await insertSystemEvent(tx, { ...ctx, userId }, { type: 'account made', data: {} });
  });
  return { email };
}
