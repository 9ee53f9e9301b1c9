import { endSessions } from '@/db/queries/accounts';
import { insertSystemEvent } from '@/db/queries/audit';
import { withUser } from '@/db/tenant';
import type { PersonContext } from '../context';

/** Ends every session of this person, on every device, this one included. */
export async function signOutEverywhere(ctx: PersonContext): Promise<void> {
  await withUser(ctx.userId, async (tx) => {
    await endSessions(tx, ctx.userId);
    await insertSystemEvent(tx, ctx, { type: 'signed out everywhere', data: {} });
  });
}
