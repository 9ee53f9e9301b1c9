// The settings of one launch: what the operator gave, and what is made for them.
import { randomBytes } from 'node:crypto';
import { readOrMake } from './place.mjs';
import { Halt } from './say.mjs';

/** What a demo visitor signs in as; all share one password. */
export const demoSignIns = [
  ['coordinator@tern.example', 'league admin, Tern Estuary Basketball League'],
  ['manager@tern.example', 'team manager of the Otters and the Herons'],
  ['referee@tern.example', 'referee'],
  ['coordinator@pellbrook.example', 'league admin, Pellbrook Valley Football League'],
  ['manager@pellbrook.example', 'team manager'],
  ['decorator@quay.example', 'decorator for both leagues'],
];
export const demoPassword = 'raglan-demo-2027';

/** @param {string} name @param {number} byDefault @param {number} least @param {number} most */
function readNumber(name, byDefault, least, most) {
  const text = process.env[name];
  if (text === undefined || text === '') return byDefault;
  const value = Number(text);
  if (!Number.isInteger(value) || value < least || value > most) {
    throw new Halt(`${name} is "${text}"; it must be a whole number from ${least} to ${most}.`);
  }
  return value;
}

/** What the environment asks of `npm start` and `npm run dev`. */
export function readSettings() {
  const port = readNumber('PORT', 3000, 1, 65_535);
  // Whoever names an address of their own runs it in earnest: no published passwords there unless asked for.
  const demo = process.env.RAGLAN_DEMO ?? (isOwnMachine(process.env.RAGLAN_BASE_URL) ? '1' : '0');
  if (demo !== '0' && demo !== '1') {
    throw new Halt(`RAGLAN_DEMO is "${demo}"; it must be 1 (demo leagues, the default of npm start) or 0.`);
  }
  return {
    port,
    host: process.env.HOST ?? '127.0.0.1',
    baseUrl: process.env.RAGLAN_BASE_URL ?? `http://localhost:${port}`,
    demo: demo === '1',
    workers: readNumber('RAGLAN_WORKERS', 1, 0, 16),
    databaseUrl: process.env.DATABASE_URL || undefined,
    smtpUrl: process.env.SMTP_URL || undefined,
  };
}

/** The key that signs sessions: RAGLAN_SECRET, or one made once and kept in `.data/`. */
export const readSecret = () =>
  process.env.RAGLAN_SECRET || readOrMake('secret.json', () => randomBytes(32).toString('base64url'));

/**
 * The environment of Raglan's processes. The web process gets it without the owner's address.
 * @param {{
 *   urls: import('./database.mjs').DatabaseUrls,
 *   port: number, host: string, baseUrl: string, demo: boolean,
 *   smtpUrl: string | undefined, inboxUrl: string | undefined, secret: string,
 *   mode: 'production' | 'development',
 * }} from
 */
export function makeEnvironments({ urls, port, host, baseUrl, demo, smtpUrl, inboxUrl, secret, mode }) {
  const web = {
    ...process.env,
    NODE_ENV: mode,
    NEXT_TELEMETRY_DISABLED: '1',
    PORT: String(port),
    HOST: host,
    RAGLAN_BASE_URL: baseUrl,
    RAGLAN_DEMO: demo ? '1' : '0',
    RAGLAN_SECRET: secret,
    NEXTAUTH_URL: baseUrl,
    NEXTAUTH_SECRET: secret,
    RAGLAN_DATABASE_URL: urls.appUrl,
    ...(smtpUrl ? { SMTP_URL: smtpUrl } : {}),
    ...(inboxUrl ? { MAIL_INBOX_URL: inboxUrl } : {}),
  };
  Reflect.deleteProperty(web, 'DATABASE_URL');
  Reflect.deleteProperty(web, 'RAGLAN_OWNER_URL');
  return { web, worker: { ...web, RAGLAN_OWNER_URL: urls.ownerUrl } };
}

/**
 * Whether an address leads to this machine; none given does.
 * @param {string | undefined} url
 */
function isOwnMachine(url) {
  if (url === undefined || !URL.canParse(url)) return true;
  return ['localhost', '127.0.0.1', '[::1]'].includes(new URL(url).hostname);
}
