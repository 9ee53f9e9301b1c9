import type { z } from 'zod';
import { updateAccountName } from '@/db/queries/accounts';
import { withUser } from '@/db/tenant';
import type { PersonContext } from '../context';
import type { changeNameSchema } from './account-schemas';

/** Changes the name one is shown by in every league. */
export async function changeName(
  ctx: PersonContext,
  input: z.output<typeof changeNameSchema>,
): Promise<{ name: string }> {
  await withUser(ctx.userId, (tx) => updateAccountName(tx, ctx.userId, input.name));
  return { name: input.name };
}
