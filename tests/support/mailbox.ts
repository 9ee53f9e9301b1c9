import { startMailServer, type MailServer } from '../../scripts/mail-server';

/**
 * A mail server for this test file; the product sends to it when this is called before anything reads the settings
 * (in the first `beforeAll`). Addresses at refused.example are turned away as a real server would. Close it at the end.
 */
export async function openMailbox(): Promise<MailServer> {
  const server = await startMailServer({ smtp: 0, http: 0 });
  Object.assign(process.env, { SMTP_URL: server.smtpUrl, MAIL_INBOX_URL: server.inboxUrl });
  return server;
}
