import { randomUUID } from 'node:crypto';
import { withUser } from '@/db/tenant';
import { hashPassword } from '@/lib/platform/passwords';
import type { PersonContext, RequestContext } from '@/lib/use-cases/context';
import { queryAsAdmin } from '../support/database';

/** A request at a fixed time (a Tuesday); `minutes` moves it on. */
export const makeRequest = (minutes = 0): RequestContext => ({
  now: new Date(Date.parse('2027-03-02T10:00:00Z') + minutes * 60_000),
  requestId: randomUUID(),
  newId: randomUUID,
});

export const somePassword = 'four quiet herons wade';
let hash: Promise<string> | undefined;
let count = 0;

export type MadePerson = { id: string; email: string; name: string; password: string; ctx: PersonContext };

/** An account whose password is `somePassword`, with an address of its own unless one is given. */
export async function makePerson(given: { email?: string; name?: string } = {}): Promise<MadePerson> {
  count += 1;
  const id = randomUUID();
  const email = given.email ?? `person${count}@club.example`;
  const name = given.name ?? `Person ${count}`;
  hash ??= hashPassword(somePassword);
  const passwordHash = await hash;
  await withUser(id, (tx) =>
    tx
      .insertInto('users')
      .values({ id, email, name, password_hash: passwordHash, created_at: makeRequest().now })
      .execute(),
  );
  return { id, email, name, password: somePassword, ctx: { ...makeRequest(), userId: id } };
}

export type Letter = { id: string; template: string; params: Record<string, string> };

/** The letters to an address that wait in the outbox or have left it, oldest first. */
export const listLetters = (to: string): Promise<Letter[]> =>
  queryAsAdmin<Letter>(
    'select id, template, params from emails where to_address = $1 order by created_at, id',
    [to],
  );

/** The secret at the end of the newest link in a letter of this kind. */
export async function readToken(to: string, template: string): Promise<string> {
  const link = (await listLetters(to)).filter((letter) => letter.template === template).at(-1)?.params[
    'link'
  ];
  const token = link?.split('/').at(-1);
  if (token === undefined) throw new Error(`no ${template} letter to ${to}`);
  return token;
}

/** How many letters of the outbox have a job that will send them. */
export const countMailJobs = async (): Promise<number> => {
  const rows = await queryAsAdmin<{ count: string }>(
    `select count(*) from graphile_worker.jobs where task_identifier = 'send-email'`,
  );
  return Number(rows[0]?.count);
};
