import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { AppError } from '@/lib/platform/errors';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { signOutEverywhere } from '@/lib/use-cases/account/sign-out-everywhere';
import { makePerson, makeRequest } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const attempt = (email: string, password: string, address = '198.51.100.7') =>
  signIn(makeRequest(), { email, password, address });

/** What a try comes to: the person's id, null for a wrong pair, or `throttled`. */
const outcome = (email: string, password: string, address?: string) =>
  attempt(email, password, address).then(
    (person) => person?.userId ?? null,
    (error: unknown) => {
      if (error instanceof AppError && error.code === 'too-many') return 'throttled';
      throw error;
    },
  );

describe('signing in', () => {
  it('takes the right password whatever the case and the blanks around the address', async () => {
    const person = await makePerson({ email: 'mara@club.example' });
    expect(await attempt('  Mara@CLUB.example ', person.password)).toMatchObject({ userId: person.id });
  });

  it('takes a password typed as composed or as separate characters', async () => {
    const { hashPassword, verifyPassword } = await import('@/lib/platform/passwords');
    const hash = await hashPassword('caf\u00e9 by the canal');
    expect(await verifyPassword(hash, 'cafe\u0301 by the canal')).toBe(true);
  });

  it('gives an unknown address the same answer as a wrong password', async () => {
    const person = await makePerson();
    const wrong = await attempt(person.email, 'not the password');
    const unknown = await attempt('nobody@club.example', 'not the password');
    expect(wrong).toBeNull();
    expect(unknown).toBeNull();
  });

  it('looks at no more than ten of forty guesses at once for one account', async () => {
    const person = await makePerson();
    const tries = await Promise.all(
      Array.from({ length: 40 }, (_, at) => outcome(person.email, `guess ${at}`, `198.51.100.${at}`)),
    );
    expect(tries.filter((answer) => answer === null)).toHaveLength(10);
    expect(tries.filter((answer) => answer === 'throttled')).toHaveLength(30);
    // The right one comes too late as well: the count is not of wrong answers, but of looks.
    expect(await outcome(person.email, person.password, '198.51.100.99')).toBe('throttled');
  });

  it('lets an address that has no tries left spend none of an account’s', async () => {
    const [person, from] = [await makePerson(), '203.0.113.200'];
    await Promise.all(
      Array.from({ length: 50 }, (_, at) => outcome(`nobody-${at}@club.example`, 'guess', from)),
    );
    const tries = await Promise.all(Array.from({ length: 15 }, () => outcome(person.email, 'guess', from)));
    expect(new Set(tries)).toEqual(new Set(['throttled']));
    expect(await outcome(person.email, person.password, '198.51.100.98')).toBe(person.id);
  });

  it('takes an address of 254 letters, and keeps none of it', async () => {
    const email = `${'a'.repeat(64)}@${'b'.repeat(181)}.example`;
    expect(await outcome(email, 'guess', '198.51.100.97')).toBeNull();
    const kept = await queryAsAdmin<{ key: string }>('select key from rate_limits');
    expect(kept.filter(({ key }) => key.includes('@') || key.includes('198.51.100.97'))).toEqual([]);
  });

  it('throttles an address without an account exactly like one with', async () => {
    const tries = await Promise.all(
      Array.from({ length: 15 }, (_, at) => outcome('ghost@club.example', 'guess', `203.0.113.${at}`)),
    );
    expect(tries.filter((answer) => answer === 'throttled')).toHaveLength(5);
  });

  it('looks at no more than fifty guesses from one network address over many accounts', async () => {
    const tries = await Promise.all(
      Array.from({ length: 60 }, (_, at) => outcome(`many${at}@club.example`, 'guess', '192.0.2.50')),
    );
    expect(tries.filter((answer) => answer === 'throttled')).toHaveLength(10);
    // Others are not held up by it.
    const person = await makePerson();
    expect(await outcome(person.email, person.password, '192.0.2.51')).toBe(person.id);
  });

  it('does not count right passwords against a club house that shares one address', async () => {
    const person = await makePerson();
    for (let n = 0; n < 55; n += 1) {
      expect(await outcome(person.email, person.password, '192.0.2.77')).toBe(person.id);
    }
  });

  it('forgets wrong tries after a right one', async () => {
    const person = await makePerson();
    for (let n = 0; n < 9; n += 1) await outcome(person.email, 'wrong', '192.0.2.90');
    expect(await outcome(person.email, person.password, '192.0.2.90')).toBe(person.id);
    for (let n = 0; n < 9; n += 1) expect(await outcome(person.email, 'wrong', '192.0.2.91')).toBeNull();
  });

  it('notes who signed in and who was refused, without the address typed', async () => {
    const person = await makePerson();
    await outcome(person.email, person.password, '192.0.2.120');
    await outcome(person.email, 'wrong', '192.0.2.120');
    const events = await queryAsAdmin<{ type: string; data: object }>(
      'select type, data from system_events where user_id = $1 order by type',
      [person.id],
    );
    expect(events).toEqual([
      { type: 'sign-in refused', data: { because: 'wrong' } },
      { type: 'signed in', data: {} },
    ]);
  });
});

describe('signing out everywhere', () => {
  it('ends every session that was open, and the next sign-in works', async () => {
    const person = await makePerson();
    const first = await attempt(person.email, person.password, '192.0.2.130');
    const second = await attempt(person.email, person.password, '192.0.2.131');
    if (!first || !second) throw new Error('not signed in');
    expect(await findSignedInPerson(first)).toMatchObject({ userId: person.id });

    await signOutEverywhere(person.ctx);

    expect(await findSignedInPerson(first)).toBeUndefined();
    expect(await findSignedInPerson(second)).toBeUndefined();
    const third = await attempt(person.email, person.password, '192.0.2.132');
    if (!third) throw new Error('not signed in');
    expect(await findSignedInPerson(third)).toMatchObject({ userId: person.id });
  });
});
