import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openMailbox } from '../../support/mailbox';
import { countMailJobs, listLetters, makePerson, makeRequest } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';
import { closeDatabase } from '@/db/client';
import { queueEmail } from '@/db/queries/jobs';
import { withOpen } from '@/db/tenant';
import type { OutgoingEmail } from '@/lib/domain/league/email';
import { handleSendEmail } from '@/lib/jobs/handlers/send-email';
import { handleTidy } from '@/lib/jobs/handlers/tidy';
import { closeMail } from '@/lib/platform/mail/transport';
import { askForReset } from '@/lib/use-cases/account/ask-for-reset';

let mailbox: Awaited<ReturnType<typeof openMailbox>>;
let open = true;
beforeAll(async () => {
  mailbox = await openMailbox();
});
async function closeMailbox() {
  closeMail();
  if (open) await mailbox.close();
  open = false;
}
afterAll(async () => {
  await closeMailbox();
  await closeDatabase();
});

const reset: OutgoingEmail = {
  template: 'password-reset',
  params: { link: 'http://localhost:3000/reset/secret', expires: 'for an hour' },
};

async function queue(to: string, email: OutgoingEmail = reset): Promise<string> {
  await withOpen((tx) => queueEmail(tx, makeRequest(), to, email));
  const letter = (await listLetters(to)).at(-1);
  if (!letter) throw new Error('nothing was queued');
  return letter.id;
}

/** Runs the job as a worker would on its try number `attempts` of eight. */
const deliver = (emailId: string, attempts = 1) =>
  handleSendEmail({ emailId }, { job: { attempts, max_attempts: 8 } } as Parameters<
    typeof handleSendEmail
  >[1]);

const readRow = async (id: string) =>
  (
    await queryAsAdmin<{ sent: boolean; failure: string | null; params: object }>(
      'select sent_at is not null as sent, failure, params from emails where id = $1',
      [id],
    )
  )[0];

const arrived = (to: string) => mailbox.listMessages().filter((message) => message.to.includes(to));

describe('the outbox', () => {
  it('sends a letter once and forgets the link it carried', async () => {
    const id = await queue('one@club.example');
    await deliver(id);
    await deliver(id);
    expect(arrived('one@club.example')).toMatchObject([{ subject: 'Set a new password' }]);
    expect(arrived('one@club.example')[0]?.text).toContain('http://localhost:3000/reset/secret');
    expect(await readRow(id)).toEqual({ sent: true, failure: null, params: {} });
  });

  it('sends one message when two workers have the same job at the same moment', async () => {
    const id = await queue('twice@club.example');
    await Promise.all(Array.from({ length: 5 }, () => deliver(id)));
    expect(arrived('twice@club.example')).toHaveLength(1);
  });

  it('loses the letter and its job with the transaction that queued them', async () => {
    const before = await countMailJobs();
    const halted = withOpen(async (tx) => {
      await queueEmail(tx, makeRequest(), 'never@club.example', reset);
      throw new Error('the change it tells of failed');
    });
    await expect(halted).rejects.toThrow('failed');
    expect(await listLetters('never@club.example')).toEqual([]);
    expect(await countMailJobs()).toBe(before);
  });

  it('gives a letter up that the server refuses for good, and does not try again', async () => {
    const id = await queue('gone@refused.example');
    await deliver(id);
    expect(await readRow(id)).toEqual({ sent: false, failure: 'the mail server answered 550', params: {} });
    await deliver(id);
    expect(arrived('gone@refused.example')).toEqual([]);
  });

  it('keeps a letter whole after a failure that may pass, and gives it up after the last try', async () => {
    const id = randomUUID();
    // A letter that cannot be written is a fault of ours: it must not vanish on the first try.
    await queryAsAdmin(
      `insert into emails (id, to_address, template, params, created_at) values ($1, 'odd@club.example', 'no such template', '{"a":"b"}', now())`,
      [id],
    );
    await expect(deliver(id, 7)).rejects.toThrow();
    expect(await readRow(id)).toEqual({ sent: false, failure: null, params: { a: 'b' } });
    await expect(deliver(id, 8)).rejects.toThrow();
    expect(await readRow(id)).toMatchObject({ sent: false, params: {} });
    expect((await readRow(id))?.failure).not.toBeNull();
  });

  it('refuses a job whose payload names no letter', async () => {
    await expect(
      handleSendEmail({ emailId: 'x' }, { job: {} } as Parameters<typeof handleSendEmail>[1]),
    ).rejects.toThrow();
  });

  it('does not mind a job whose letter is not there', async () => {
    await expect(deliver(randomUUID())).resolves.toBeUndefined();
  });

  it('reaches one person, whatever stands in the address', async () => {
    const id = await queue('a@club.example, b@club.example');
    await deliver(id);
    expect(arrived('b@club.example')).toEqual([]);
  });

  it('shows the runtime role no letter but the one it names', async () => {
    await queue('hidden@club.example');
    const seen = await withOpen((tx) => tx.selectFrom('emails').select('id').execute());
    expect(seen).toEqual([]);
  });
});

describe('tidying', () => {
  it('removes links long past their date and the secrets of letters nobody could deliver', async () => {
    const person = await makePerson();
    await askForReset(makeRequest(), { email: person.email, address: '192.0.2.200' });
    const letter = (await listLetters(person.email))[0];
    await queryAsAdmin(`update password_resets set expires_at = now() - interval '8 days'`);
    await queryAsAdmin(`update emails set created_at = now() - interval '4 days' where id = $1`, [
      letter?.id,
    ]);
    const fresh = await queue('fresh@club.example');

    await handleTidy();

    expect(await queryAsAdmin('select id from password_resets')).toEqual([]);
    expect((await listLetters(person.email))[0]?.params).toEqual({});
    expect(await readRow(fresh)).toMatchObject({ failure: null, params: reset.params });
  });
});

// Last, since nothing can be sent after it.
describe('a mail server that is away', () => {
  it('leaves the letter whole for the next try', async () => {
    const id = await queue('patient@club.example');
    await closeMailbox();
    await expect(deliver(id)).rejects.toThrow();
    expect(await readRow(id)).toEqual({ sent: false, failure: null, params: reset.params });
  });
});
