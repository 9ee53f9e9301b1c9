// The demonstration's mail server as a process of its own (scripts/launch.mjs starts it).
import { startMailServer } from './mail-server';

const server = await startMailServer({
  smtp: Number(process.env.RAGLAN_MAIL_SMTP_PORT ?? 0),
  http: Number(process.env.RAGLAN_MAIL_HTTP_PORT ?? 0),
});
console.log(`mail caught at ${server.smtpUrl}, shown at ${server.inboxUrl}/messages`);

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.once(signal, () => void server.close().then(() => process.exit(0)));
}
