import { sql, type Transaction } from 'kysely';
import { getDatabase } from './client';
import type { Database } from './schema';

declare const scope: unique symbol;
type Scoped<S extends string> = Transaction<Database> & { readonly [scope]: S };

/** A transaction that row-level security confines to one league. Only `withLeague` makes one. */
export type LeagueTx = Scoped<'league'> & { readonly leagueId: string };
/** A transaction that sees what belongs to one person, over all leagues. Only `withUser` makes one. */
export type UserTx = Scoped<'user'>;
/** A transaction that sees what one link's secret opens, and nothing else. */
export type TokenTx = Scoped<'token'>;
/** A transaction that sees the account of one e-mail address, for sign-in. */
export type EmailTx = Scoped<'email'>;
/** A transaction with no scope at all: it sees only tables that belong to nobody. */
export type OpenTx = Scoped<'open'>;
/** A transaction that sees the one e-mail a worker is sending. */
export type OutgoingTx = Scoped<'outgoing'>;
/** Any of the above: for queues and logs that each of them may write to. */
export type AnyTx = LeagueTx | UserTx | TokenTx | EmailTx | OpenTx | OutgoingTx;

async function inScope<T>(setting: string, value: string, run: (tx: never) => Promise<T>): Promise<T> {
  return getDatabase()
    .db.transaction()
    .execute(async (tx) => {
      // Transaction-local: a session-level setting would leak to the next borrower of the connection.
      await sql`select set_config(${setting}, ${value}, true)`.execute(tx);
      return run(tx as never);
    });
}

/** Runs `run` in a transaction that can read and write only this league's rows. */
export const withLeague = <T>(leagueId: string, run: (tx: LeagueTx) => Promise<T>): Promise<T> =>
  inScope('app.league_id', leagueId, (tx: LeagueTx) => run(Object.assign(tx, { leagueId })));

/** Runs `run` in a transaction that sees this person's account, memberships and leagues. */
export const withUser = <T>(userId: string, run: (tx: UserTx) => Promise<T>): Promise<T> =>
  inScope('app.user_id', userId, run);

/** Runs `run` in a transaction that sees the invitation or reset whose secret has this hash. */
export const withToken = <T>(tokenHash: string, run: (tx: TokenTx) => Promise<T>): Promise<T> =>
  inScope('app.token_hash', tokenHash, run);

/** Runs `run` in a transaction that sees the account with this address (lower case). */
export const withEmail = <T>(email: string, run: (tx: EmailTx) => Promise<T>): Promise<T> =>
  inScope('app.email', email, run);

/** Runs `run` in a transaction that sees one queued e-mail. */
export const withOutgoing = <T>(emailId: string, run: (tx: OutgoingTx) => Promise<T>): Promise<T> =>
  inScope('app.email_id', emailId, run);

/** Runs `run` in a transaction without any scope: row-level security shows it no league and no person. */
export const withOpen = <T>(run: (tx: OpenTx) => Promise<T>): Promise<T> =>
  getDatabase()
    .db.transaction()
    .execute((tx) => run(tx as unknown as OpenTx));

/**
 * Lets a transaction also write the account `userId`: for somebody new, whose account begins in the transaction that
 * follows a link. Give it only an id that was made a moment ago; nobody else's rows come into sight that way.
 */
export async function admitNewPerson(tx: LeagueTx | TokenTx, userId: string): Promise<void> {
  await sql`select set_config('app.user_id', ${userId}, true)`.execute(tx);
}
