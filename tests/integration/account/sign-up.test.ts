import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { AppError } from '@/lib/platform/errors';
import { askForAccount } from '@/lib/use-cases/account/ask-for-account';
import { findPendingSignUp } from '@/lib/use-cases/account/find-sign-up';
import { openAccount } from '@/lib/use-cases/account/open-account';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { listLetters, makePerson, makeRequest, readToken } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const password = 'nine green herons nest';
let place = 0;
const ask = (email: string, name = 'Tove Lind') =>
  askForAccount(makeRequest(), { email, name, address: `198.51.100.${(place += 1)}` });

const countPeople = async () =>
  Number((await queryAsAdmin<{ count: string }>('select count(*) from users'))[0]?.count);

describe('opening an account', () => {
  it('makes none until the link in the letter is followed', async () => {
    const before = await countPeople();
    await ask('tove@club.example');
    expect(await countPeople()).toBe(before);

    const token = await readToken('tove@club.example', 'sign-up');
    expect(await findPendingSignUp(makeRequest(), token)).toEqual({
      email: 'tove@club.example',
      name: 'Tove Lind',
    });
    await openAccount(makeRequest(10), { token, password });

    expect(await countPeople()).toBe(before + 1);
    expect(
      await signIn(makeRequest(), { email: 'tove@club.example', password, address: '192.0.2.1' }),
    ).toMatchObject({ name: 'Tove Lind' });
  });

  it('answers the same for an address that has one, and tells only its owner', async () => {
    const person = await makePerson({ email: 'known@club.example', name: 'Known Before' });
    expect(await ask(person.email, 'Somebody Else')).toEqual(await ask('unknown@club.example'));
    expect(await listLetters(person.email)).toMatchObject([{ template: 'sign-up-known' }]);
    const rows = await queryAsAdmin<{ name: string }>('select name from users where email = $1', [
      person.email,
    ]);
    expect(rows).toEqual([{ name: 'Known Before' }]);
  });

  it('throttles an address with an account like one without', async () => {
    const person = await makePerson();
    for (const email of [person.email, 'new.one@club.example']) {
      const answers = await Promise.all(
        Array.from({ length: 6 }, () =>
          ask(email).then(
            () => 'sent',
            (error: unknown) => (error instanceof AppError ? error.code : 'failed'),
          ),
        ),
      );
      expect(answers.filter((answer) => answer === 'sent')).toHaveLength(3);
      expect(answers.filter((answer) => answer === 'too-many')).toHaveLength(3);
    }
  });

  it('works once, though the link is followed five times at the same moment', async () => {
    await ask('once@club.example');
    const token = await readToken('once@club.example', 'sign-up');
    const answers = await Promise.all(
      Array.from({ length: 5 }, () =>
        openAccount(makeRequest(), { token, password }).then(
          () => 'opened',
          (error: unknown) => (error instanceof AppError ? error.code : 'failed'),
        ),
      ),
    );
    expect(answers.sort()).toEqual(['conflict', 'conflict', 'conflict', 'conflict', 'opened']);
  });

  it('is refused after a day', async () => {
    await ask('late@club.example');
    const token = await readToken('late@club.example', 'sign-up');
    expect(await findPendingSignUp(makeRequest(24 * 60 + 1), token)).toBeUndefined();
    await expect(openAccount(makeRequest(24 * 60 + 1), { token, password })).rejects.toMatchObject({
      code: 'conflict',
    });
  });

  it('leaves an account alone that was opened by another way in the meantime', async () => {
    await ask('raced@club.example');
    const token = await readToken('raced@club.example', 'sign-up');
    const person = await makePerson({ email: 'raced@club.example' });
    await expect(openAccount(makeRequest(), { token, password })).rejects.toThrow('has an account already');
    expect(
      await signIn(makeRequest(), { email: person.email, password: person.password, address: '192.0.2.2' }),
    ).toMatchObject({ userId: person.id });
  });

  it('shows nothing for a made-up link', async () => {
    expect(await findPendingSignUp(makeRequest(), 'x'.repeat(43))).toBeUndefined();
    await expect(openAccount(makeRequest(), { token: '', password })).rejects.toMatchObject({
      code: 'conflict',
    });
  });
});
