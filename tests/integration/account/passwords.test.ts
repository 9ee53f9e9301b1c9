import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { AppError } from '@/lib/platform/errors';
import { askForReset } from '@/lib/use-cases/account/ask-for-reset';
import { changePassword } from '@/lib/use-cases/account/change-password';
import { findReset } from '@/lib/use-cases/account/find-reset';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { setNewPassword } from '@/lib/use-cases/account/set-new-password';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { countMailJobs, listLetters, makePerson, makeRequest, readToken } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const fresh = 'seven grey herons stand';
let place = 0;
const ask = (email: string, address = `198.51.100.${(place += 1)}`) =>
  askForReset(makeRequest(), { email, address });
const codeOf = (error: unknown) => {
  if (error instanceof AppError) return error.code;
  throw error;
};

describe('asking for a new password', () => {
  it('answers the same for an unknown address, and sends nothing to it', async () => {
    const person = await makePerson();
    const before = await countMailJobs();
    expect(await ask('nobody.here@club.example')).toEqual(await ask(person.email));
    expect(await listLetters('nobody.here@club.example')).toEqual([]);
    expect(await listLetters(person.email)).toMatchObject([{ template: 'password-reset' }]);
    expect(await countMailJobs()).toBe(before + 1);
  });

  it('sends three letters an hour to an address at most, whether or not it has an account', async () => {
    const person = await makePerson();
    for (const email of [person.email, 'ghost.reset@club.example']) {
      const answers = await Promise.all(
        Array.from({ length: 8 }, () =>
          ask(email).then(
            () => 'sent',
            (error: unknown) => codeOf(error),
          ),
        ),
      );
      expect(answers.filter((answer) => answer === 'sent')).toHaveLength(3);
      expect(answers.filter((answer) => answer === 'too-many')).toHaveLength(5);
    }
    expect(await listLetters(person.email)).toHaveLength(3);
  });

  it('lets one network address ask twenty times an hour at most', async () => {
    const answers = await Promise.all(
      Array.from({ length: 30 }, (_, at) =>
        ask(`spray${at}@club.example`, '192.0.2.9').then(
          () => 'taken',
          (error: unknown) => codeOf(error),
        ),
      ),
    );
    expect(answers.filter((answer) => answer === 'taken')).toHaveLength(20);
  });

  it('stores the hash of the link and not the link', async () => {
    const person = await makePerson();
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');
    const [row] = await queryAsAdmin<{ token_hash: string }>(
      'select token_hash from password_resets where user_id = $1',
      [person.id],
    );
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    expect(row?.token_hash).toMatch(/^[0-9a-f]{64}$/);
    expect(row?.token_hash).not.toContain(token);
  });
});

describe('setting a new password by link', () => {
  it('sets it, ends every session and tells the owner', async () => {
    const person = await makePerson();
    const session = await signIn(makeRequest(), { ...person, address: '192.0.2.10' });
    if (!session) throw new Error('not signed in');
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');

    expect(await findReset(makeRequest(), token)).toEqual({ email: person.email });
    expect(await setNewPassword(makeRequest(5), { token, password: fresh })).toEqual({ email: person.email });

    expect(await findSignedInPerson(session)).toBeUndefined();
    expect(await signIn(makeRequest(), { ...person, address: '192.0.2.10' })).toBeNull();
    expect(
      await signIn(makeRequest(), { email: person.email, password: fresh, address: '192.0.2.10' }),
    ).toMatchObject({ userId: person.id });
    expect((await listLetters(person.email)).map((letter) => letter.template).sort()).toEqual([
      'password-changed',
      'password-reset',
    ]);
  });

  it('works once, though it is followed five times at the same moment', async () => {
    const person = await makePerson();
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');
    const answers = await Promise.all(
      Array.from({ length: 5 }, (_, at) =>
        setNewPassword(makeRequest(), { token, password: `${fresh} ${at}` }).then(
          () => 'set',
          (error: unknown) => codeOf(error),
        ),
      ),
    );
    expect(answers.filter((answer) => answer === 'set')).toHaveLength(1);
    expect(answers.filter((answer) => answer === 'conflict')).toHaveLength(4);
  });

  it('spends the other links of the same person with it', async () => {
    const person = await makePerson();
    await ask(person.email);
    const older = await readToken(person.email, 'password-reset');
    await ask(person.email);
    const tokens = (await listLetters(person.email)).map((letter) =>
      letter.params['link']?.split('/').at(-1),
    );
    const newer = tokens.find((token) => token !== older) ?? '';
    await setNewPassword(makeRequest(), { token: newer, password: fresh });
    await expect(setNewPassword(makeRequest(), { token: older, password: fresh })).rejects.toMatchObject({
      code: 'conflict',
    });
  });

  it('is refused after an hour', async () => {
    const person = await makePerson();
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');
    expect(await findReset(makeRequest(59), token)).toEqual({ email: person.email });
    expect(await findReset(makeRequest(61), token)).toBeUndefined();
    await expect(setNewPassword(makeRequest(61), { token, password: fresh })).rejects.toThrow(
      'used or is too old',
    );
  });

  it('keeps the link good when the password is refused', async () => {
    const person = await makePerson();
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');
    await expect(setNewPassword(makeRequest(), { token, password: 'short' })).rejects.toMatchObject({
      code: 'invalid',
      fields: { password: expect.stringContaining('at least 10') },
    });
    await setNewPassword(makeRequest(), { token, password: fresh });
  });

  it('lets in somebody whose account was throttled by the guesses of others', async () => {
    const person = await makePerson();
    await Promise.allSettled(
      Array.from({ length: 12 }, (_, at) =>
        signIn(makeRequest(), { email: person.email, password: 'guess', address: `203.0.113.${at}` }),
      ),
    );
    await ask(person.email);
    const token = await readToken(person.email, 'password-reset');
    await setNewPassword(makeRequest(), { token, password: fresh });
    expect(
      await signIn(makeRequest(), { email: person.email, password: fresh, address: '192.0.2.33' }),
    ).toMatchObject({ userId: person.id });
  });
});

describe('changing a password on the account page', () => {
  it('needs the old one', async () => {
    const person = await makePerson();
    await expect(
      changePassword(person.ctx, { oldPassword: 'not it at all', newPassword: fresh }),
    ).rejects.toMatchObject({ fields: { oldPassword: 'This is not the password you have now.' } });
  });

  it('ends every session', async () => {
    const person = await makePerson();
    const session = await signIn(makeRequest(), { ...person, address: '192.0.2.40' });
    if (!session) throw new Error('not signed in');
    await changePassword(person.ctx, { oldPassword: person.password, newPassword: fresh });
    expect(await findSignedInPerson(session)).toBeUndefined();
    expect(
      await signIn(makeRequest(), { email: person.email, password: fresh, address: '192.0.2.40' }),
    ).not.toBeNull();
  });

  it('allows ten guesses at the old one, however many come at once', async () => {
    const person = await makePerson();
    const answers = await Promise.all(
      Array.from({ length: 25 }, (_, at) =>
        changePassword(person.ctx, { oldPassword: `guess ${at}`, newPassword: fresh }).then(
          () => 'changed',
          (error: unknown) => codeOf(error),
        ),
      ),
    );
    expect(answers.filter((answer) => answer === 'invalid')).toHaveLength(10);
    expect(answers.filter((answer) => answer === 'too-many')).toHaveLength(15);
  });

  it('refuses the own address as a password', async () => {
    const person = await makePerson({ email: 'long.address@club.example' });
    await expect(
      changePassword(person.ctx, { oldPassword: person.password, newPassword: 'Long.Address@club.example' }),
    ).rejects.toMatchObject({ fields: { newPassword: expect.stringContaining('own address') } });
  });
});
