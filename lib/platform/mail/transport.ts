import { createTransport, type Transporter } from 'nodemailer';
import { getEnv } from '../env';
import type { WrittenEmail } from './templates';

let transport: Transporter | undefined;

/** Two pooled connections; a mail server that hangs is given up on long before a worker would miss it. */
function getTransport(): Transporter {
  if (transport) return transport;
  const { SMTP_URL } = getEnv();
  if (SMTP_URL === undefined) {
    throw new Error('No mail server is set. Put its address into SMTP_URL, such as smtp://127.0.0.1:1025.');
  }
  const url = new URL(SMTP_URL);
  const settings = {
    pool: 'true',
    maxConnections: '2',
    connectionTimeout: '10000',
    greetingTimeout: '10000',
    socketTimeout: '20000',
    // Letters hold words and links, never files or fetched content.
    disableFileAccess: 'true',
    disableUrlAccess: 'true',
  };
  for (const [key, value] of Object.entries(settings)) {
    if (!url.searchParams.has(key)) url.searchParams.set(key, value);
  }
  transport = createTransport(url.toString());
  return transport;
}

export type Delivery = { outcome: 'accepted' } | { outcome: 'refused'; because: string };

/**
 * Hands a message to the mail server. `refused` is its last word (a 5xx answer to this recipient or this message);
 * everything that may pass (no connection, a 4xx, wrong credentials) is thrown, for the job to try again.
 */
export async function deliverEmail(message: WrittenEmail & { id: string; to: string }): Promise<Delivery> {
  const { MAIL_FROM, RAGLAN_BASE_URL } = getEnv();
  try {
    await getTransport().sendMail({
      from: MAIL_FROM,
      // As an object, so that a comma in an address can't add a second recipient.
      to: { name: '', address: message.to },
      subject: message.subject,
      text: message.text,
      html: message.html,
      // The same for every try: should a try be repeated after the server took it, mailboxes show one message.
      messageId: `<${message.id}@${new URL(RAGLAN_BASE_URL).hostname}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
    return { outcome: 'accepted' };
  } catch (error) {
    const because = findRefusal(error);
    if (because === null) throw error;
    return { outcome: 'refused', because };
  }
}

/** Why the server will never take this message, without the address it names; null when trying again may help. */
function findRefusal(error: unknown): string | null {
  if (!(error instanceof Error) || !('code' in error)) return null;
  if (error.code !== 'EENVELOPE' && error.code !== 'EMESSAGE') return null;
  const answer = 'responseCode' in error ? Number(error.responseCode) : null;
  if (answer === null) return 'the address or the message is not valid';
  return answer >= 500 && answer < 600 ? `the mail server answered ${answer}` : null;
}

/** Closes the connections to the mail server; for workers and tests that must end. */
export function closeMail(): void {
  transport?.close();
  transport = undefined;
}
