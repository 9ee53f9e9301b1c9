// The application under end-to-end test: a built one, on a fresh database with the demo leagues, with its mail server
// and worker. Playwright starts it and ends it; everything it started goes with it.
import fs from 'node:fs';
import { buildIfChanged, hashSources, isBuilt } from './build.mjs';
import { runTypeScript } from './launch.mjs';
import { findFreePort } from './ports.mjs';
import { endRunning } from './run.mjs';
import { say, sayFailure } from './say.mjs';
import { Services, waitUntilReady } from './services.mjs';
import { makeEnvironments } from './settings.mjs';
import { copyTemplate, openTestCluster } from './test-cluster.mjs';

const port = Number(process.env.RAGLAN_E2E_PORT ?? 3217);
const inboxPort = Number(process.env.RAGLAN_E2E_INBOX_PORT ?? 3218);
const secondPort = Number(process.env.RAGLAN_E2E_SECOND_PORT ?? 3219);
const baseUrl = `http://127.0.0.1:${port}`;

const services = new Services();
/** @type {(() => Promise<void>)[]} */
const closers = [];
/** @type {(value: unknown) => void} */
let askToStop = () => {};
const askedToStop = new Promise((resolve) => {
  askToStop = resolve;
});
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    endRunning();
    askToStop(signal);
  });
}

/** A developer's own build is used as it stands when it is of these sources; else one is made elsewhere. */
async function findBuild() {
  const own = { webFolder: '.next', commandFolder: 'dist' };
  if (isBuilt(own.webFolder, hashSources()) && fs.existsSync('dist/worker.mjs')) return own;
  const apart = { webFolder: 'dist/next-e2e', commandFolder: 'dist/e2e' };
  await buildIfChanged(apart);
  return apart;
}

async function bringUp() {
  const { cluster, close } = await openTestCluster();
  closers.push(close);
  const build = await findBuild();
  const urls = await copyTemplate(cluster, `e2e_${process.pid}_${Date.now()}`);
  const smtpPort = await findFreePort();
  const { web, worker } = makeEnvironments({
    urls,
    port,
    host: '127.0.0.1',
    baseUrl,
    demo: true,
    smtpUrl: `smtp://127.0.0.1:${smtpPort}`,
    inboxUrl: `http://127.0.0.1:${inboxPort}`,
    secret: 'a secret for tests, and for nothing else',
    mode: 'production',
  });
  const shared = { LOG_LEVEL: 'warn', RAGLAN_DIST_DIR: build.webFolder };
  await runTypeScript('Loading the demo leagues', 'scripts/seed.ts', { ...worker, ...shared });
  closers.push(() => services.stop());
  const plan = /** @type {const} */ ({ whenItEnds: 'end all', toTerminal: true });
  services.start({
    ...plan,
    name: 'mail',
    args: [`${build.commandFolder}/mail-fake.mjs`],
    env: {
      ...process.env,
      RAGLAN_MAIL_SMTP_PORT: String(smtpPort),
      RAGLAN_MAIL_HTTP_PORT: String(inboxPort),
    },
  });
  // Two of each: nothing may depend on which process answers or works. Playwright waits for the last to be ready.
  for (const name of ['worker-1', 'worker-2']) {
    const args = [`${build.commandFolder}/worker.mjs`];
    services.start({ ...plan, name, args, env: { ...worker, ...shared } });
  }
  for (const listening of [secondPort, port]) {
    const env = { ...web, ...shared, PORT: String(listening) };
    services.start({ ...plan, name: `web-${listening}`, args: ['scripts/web.mjs'], env });
    const ready = waitUntilReady(`http://127.0.0.1:${listening}/api/ready`, 60_000);
    await Promise.race([ready, services.failed, askedToStop]);
  }
  say(`under test at ${baseUrl}`);
  await Promise.race([askedToStop, services.failed]);
}

try {
  await bringUp();
} catch (error) {
  process.exitCode = sayFailure(error);
}
for (const close of closers.reverse()) await close();
process.exit();
