import type { z } from 'zod';
import { findAccount } from '@/db/queries/accounts';
import { findInvitationByToken } from '@/db/queries/invitations';
import { withLeague, withToken, withUser } from '@/db/tenant';
import { AppError } from '@/lib/platform/errors';
import { hashToken } from '@/lib/platform/ids';
import { spentLink } from '../account-guards';
import type { PersonContext } from '../context';
import { joinLeague } from '../people-guards';
import type { acceptInvitationSchema } from './people-schemas';

/** Accepts an invitation as the person who is signed in; only with the address it was sent to. */
export async function acceptInvitation(
  ctx: PersonContext,
  input: z.output<typeof acceptInvitationSchema>,
): Promise<void> {
  const tokenHash = hashToken(input.token);
  const found = await withToken(tokenHash, (tx) => findInvitationByToken(tx, tokenHash));
  if (!found) throw spentLink('Ask your league admin to send the invitation again.');
  const account = await withUser(ctx.userId, (tx) => findAccount(tx, ctx.userId));
  if (account?.email !== found.email) {
    throw new AppError(
      'forbidden',
      `This invitation was sent to ${found.email}. Sign in with that address to accept it.`,
    );
  }
  await withLeague(found.league_id, (tx) =>
    joinLeague(tx, ctx, { tokenHash, userId: ctx.userId, email: account.email }),
  );
}
