import { sql } from 'kysely';
import { admitNewPerson, type LeagueTx, type TokenTx, type UserTx } from '../tenant';

/** The account of this transaction's person; undefined when it is gone. */
export function findAccount(tx: UserTx, userId: string) {
  return tx
    .selectFrom('users')
    .select(['id', 'email', 'name', 'password_hash', 'session_version', 'created_at'])
    .where('id', '=', userId)
    .executeTakeFirst();
}

/** Opens an account in the transaction that followed a link; false, and nothing is written, when the address has one. */
export async function insertAccount(
  tx: LeagueTx | TokenTx,
  account: { id: string; email: string; name: string; passwordHash: string; now: Date },
): Promise<boolean> {
  await admitNewPerson(tx, account.id);
  const done = await tx
    .insertInto('users')
    .values({
      id: account.id,
      email: account.email,
      name: account.name,
      password_hash: account.passwordHash,
      created_at: account.now,
    })
    .onConflict((conflict) => conflict.column('email').doNothing())
    .executeTakeFirst();
  return done.numInsertedOrUpdatedRows === 1n;
}

/** Sets the name a person is shown by, everywhere. */
export async function updateAccountName(tx: UserTx, userId: string, name: string): Promise<void> {
  await tx.updateTable('users').set({ name }).where('id', '=', userId).execute();
}

/**
 * Ends every session of a person, and sets a new password with it if there is one. With `ifHash` it does so only while
 * that is still the stored hash; answers whether it did.
 */
export async function endSessions(
  tx: UserTx,
  userId: string,
  change: { passwordHash?: string; ifHash?: string } = {},
): Promise<boolean> {
  let query = tx
    .updateTable('users')
    .set({ session_version: sql`session_version + 1` })
    .where('id', '=', userId);
  if (change.passwordHash !== undefined) query = query.set({ password_hash: change.passwordHash });
  if (change.ifHash !== undefined) query = query.where('password_hash', '=', change.ifHash);
  return (await query.executeTakeFirst()).numUpdatedRows === 1n;
}

/** Keeps the hash of a link that sets a new password. */
export async function insertPasswordReset(
  tx: UserTx,
  reset: { id: string; userId: string; tokenHash: string; now: Date; expiresAt: Date },
): Promise<void> {
  await tx
    .insertInto('password_resets')
    .values({
      id: reset.id,
      user_id: reset.userId,
      token_hash: reset.tokenHash,
      created_at: reset.now,
      expires_at: reset.expiresAt,
    })
    .execute();
}

/** Whose password this transaction's link may set; undefined when the link is unknown, used or past its date. */
export async function findPasswordReset(
  tx: TokenTx,
  tokenHash: string,
  now: Date,
): Promise<string | undefined> {
  const row = await tx
    .selectFrom('password_resets')
    .select('user_id')
    .where('token_hash', '=', tokenHash)
    .where('used_at', 'is', null)
    .where('expires_at', '>', now)
    .executeTakeFirst();
  return row?.user_id;
}

/** Uses a link up, and every other one that person still has; false when it was used before or is past its date. */
export async function usePasswordReset(
  tx: UserTx,
  reset: { userId: string; tokenHash: string; now: Date },
): Promise<boolean> {
  const done = await tx
    .updateTable('password_resets')
    .set({ used_at: reset.now })
    .where('user_id', '=', reset.userId)
    .where('token_hash', '=', reset.tokenHash)
    .where('used_at', 'is', null)
    .where('expires_at', '>', reset.now)
    .executeTakeFirst();
  if (done.numUpdatedRows !== 1n) return false;
  await tx
    .updateTable('password_resets')
    .set({ used_at: reset.now })
    .where('user_id', '=', reset.userId)
    .where('used_at', 'is', null)
    .execute();
  return true;
}

/** Keeps a wish for an account until its link is followed; `tx` is the scope of that link. */
export async function insertSignUp(
  tx: TokenTx,
  signUp: { id: string; email: string; name: string; tokenHash: string; now: Date; expiresAt: Date },
): Promise<void> {
  await tx
    .insertInto('sign_ups')
    .values({
      id: signUp.id,
      email: signUp.email,
      name: signUp.name,
      token_hash: signUp.tokenHash,
      created_at: signUp.now,
      expires_at: signUp.expiresAt,
    })
    .execute();
}

/** The wish this transaction's link stands for; undefined when it is unknown, used or past its date. */
export function findSignUp(tx: TokenTx, tokenHash: string, now: Date) {
  return tx
    .selectFrom('sign_ups')
    .select(['email', 'name'])
    .where('token_hash', '=', tokenHash)
    .where('used_at', 'is', null)
    .where('expires_at', '>', now)
    .executeTakeFirst();
}

/** Uses the link up and answers its wish; undefined when another request was first or the link is past its date. */
export function takeSignUp(tx: TokenTx, tokenHash: string, now: Date) {
  return tx
    .updateTable('sign_ups')
    .set({ used_at: now })
    .where('token_hash', '=', tokenHash)
    .where('used_at', 'is', null)
    .where('expires_at', '>', now)
    .returning(['email', 'name'])
    .executeTakeFirst();
}
