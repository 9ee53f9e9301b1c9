// What `npm start` and `npm run dev` share: from a bare clone to a running application, and back down again.
import { checkNode, ensurePackages } from './prepare.mjs';
import { makeDataFolder, root } from './place.mjs';
import { findFreePort, isPortFree } from './ports.mjs';
import { findRunning, forgetRunning, noteRunning } from './running.mjs';
import { endRunning, lastLines, run } from './run.mjs';
import { Halt, say, sayFailure, secondsSince } from './say.mjs';
import { readLogTail, Services, waitUntilReady } from './services.mjs';
import { demoPassword, demoSignIns, makeEnvironments, readSecret, readSettings } from './settings.mjs';

/** @param {string} what @param {string} script @param {NodeJS.ProcessEnv} env */
export async function runTypeScript(what, script, env) {
  const { code, output } = await run(process.execPath, ['--import', 'tsx', script], { cwd: root, env });
  if (code !== 0) throw new Halt(`${what} failed:\n\n${lastLines(output, 20)}`);
  return output;
}

/** @param {ReturnType<typeof readSettings>} settings */
async function checkNothingInTheWay({ port, host, baseUrl }) {
  const other = findRunning();
  if (other) {
    throw new Halt(
      `Raglan already runs from this folder (process ${other.pid}, ${other.url}). Stop that one first, with Ctrl-C or: kill ${other.pid}`,
    );
  }
  if (!(await isPortFree(port, host))) {
    throw new Halt(
      `Port ${port} is taken by another program. Stop it, or choose another port: PORT=${port + 1} npm start`,
    );
  }
  noteRunning(baseUrl);
}

/**
 * The database of this launch, and how to close what was opened for it.
 * @param {string | undefined} databaseUrl
 */
async function openDatabase(databaseUrl) {
  if (databaseUrl) {
    say('Using the database that DATABASE_URL names.');
    const { prepareForeignDatabase } = await import('./database.mjs');
    const urls = await prepareForeignDatabase(databaseUrl, process.env.RAGLAN_DATABASE_URL || undefined);
    return { urls, close: async () => {}, failed: new Promise(() => {}) };
  }
  const { openCluster, stopCluster, watchCluster } = await import('./cluster.mjs');
  const cluster = await openCluster();
  say(`Private database on 127.0.0.1:${cluster.port}.`);
  const close = () => stopCluster(cluster);
  try {
    const { ensureDatabase } = await import('./database.mjs');
    const failed = watchCluster(cluster);
    failed.catch(() => {}); // whoever waits for it sees it
    return { urls: await ensureDatabase(cluster), close, failed };
  } catch (error) {
    await close();
    throw error;
  }
}

/** @param {string} baseUrl @param {boolean} demo @param {number} start @param {'production' | 'development'} mode */
function sayWelcome(baseUrl, demo, start, mode) {
  say(`\nRaglan is ready at ${baseUrl}   (${secondsSince(start)})`);
  if (demo) {
    say(`\nDemo sign-ins, all with the password ${demoPassword}`);
    for (const [email = '', who = ''] of demoSignIns) say(`  ${email.padEnd(31)} ${who}`);
  }
  const logs = mode === 'production' ? ' Logs are in .data/logs.' : '';
  say(`\nCtrl-C stops everything.${logs}`);
}

/**
 * Brings Raglan up and keeps it up until it is told to stop; answers the exit code.
 * @param {'production' | 'development'} mode
 */
export async function launch(mode) {
  const start = performance.now();
  const services = new Services();
  /** @type {(() => Promise<void>)[]} what to undo, last first */
  const closers = [];
  /** @type {() => void} */
  let askToStop = () => {};
  const askedToStop = new Promise((resolve) => {
    askToStop = () => resolve('asked');
  });
  let asked = 0;
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      asked += 1;
      if (asked === 1) {
        say('\nStopping…');
        endRunning();
        askToStop();
      } else if (asked > 2) services.kill(); // npm hands Ctrl-C on, so two arrive at once; the third is meant
    });
  }
  const stopIfAsked = () => {
    if (asked > 0) throw new Halt('Stopped before it was up.');
  };

  const bringUp = async () => {
    checkNode();
    makeDataFolder();
    const settings = readSettings();
    await checkNothingInTheWay(settings);
    closers.push(async () => forgetRunning());
    await ensurePackages();
    stopIfAsked();

    const database = await openDatabase(settings.databaseUrl);
    closers.push(database.close);
    stopIfAsked();

    const toTerminal = mode === 'development';
    const withMailFake = settings.demo && !settings.smtpUrl;
    const [smtpPort, inboxPort] = await Promise.all([findFreePort(), findFreePort()]);
    const secret = readSecret();
    const environments = makeEnvironments({
      ...settings,
      urls: database.urls,
      secret,
      mode,
      smtpUrl: withMailFake ? `smtp://127.0.0.1:${smtpPort}` : settings.smtpUrl,
      inboxUrl: withMailFake ? `http://127.0.0.1:${inboxPort}` : undefined,
    });
    if (!settings.demo && !settings.smtpUrl) {
      say('SMTP_URL is not set: e-mails wait in the outbox until it is.');
    }

    const migrated = await runTypeScript(
      'Bringing the tables up to date',
      'scripts/migrate.ts',
      environments.worker,
    );
    if (migrated.trim() !== '') say(migrated.trim());
    stopIfAsked();
    if (settings.demo) {
      const loaded = await runTypeScript('Loading the demo leagues', 'scripts/seed.ts', environments.worker);
      if (loaded.trim() !== '') say(loaded.trim());
    }
    stopIfAsked();

    if (mode === 'production') {
      const { buildIfChanged } = await import('./build.mjs');
      await buildIfChanged({ webFolder: '.next', commandFolder: 'dist' });
    }
    stopIfAsked();

    closers.push(() => services.stop());
    const inDev = mode === 'development';
    if (withMailFake) {
      services.start({
        name: 'mail',
        args: inDev ? ['--import', 'tsx', 'scripts/mail-fake.ts'] : ['dist/mail-fake.mjs'],
        env: {
          ...process.env,
          RAGLAN_MAIL_SMTP_PORT: String(smtpPort),
          RAGLAN_MAIL_HTTP_PORT: String(inboxPort),
        },
        whenItEnds: 'restart',
        toTerminal,
      });
    }
    services.start({
      name: 'web',
      args: ['scripts/web.mjs', ...(inDev ? ['--dev'] : [])],
      env: environments.web,
      whenItEnds: 'end all',
      toTerminal,
    });
    for (let number = 1; number <= settings.workers; number += 1) {
      services.start({
        name: settings.workers === 1 ? 'worker' : `worker-${number}`,
        args: inDev ? ['node_modules/tsx/dist/cli.mjs', 'watch', 'scripts/worker.ts'] : ['dist/worker.mjs'],
        env: environments.worker,
        whenItEnds: 'restart',
        toTerminal,
      });
    }
    const nearby = settings.host === '0.0.0.0' || settings.host === '::' ? '127.0.0.1' : settings.host;
    await Promise.race([
      waitUntilReady(
        `http://${nearby.includes(':') ? `[${nearby}]` : nearby}:${settings.port}/api/ready`,
        120_000,
      ),
      services.failed,
      askedToStop,
    ]).catch((error) => {
      const tail = toTerminal ? '' : readLogTail('web');
      throw error instanceof Halt && tail && !error.message.includes(tail)
        ? new Halt(`${error.message}\n\n${tail}`)
        : error;
    });
    stopIfAsked();
    sayWelcome(settings.baseUrl, settings.demo, start, mode);
    await Promise.race([askedToStop, services.failed, database.failed]);
  };

  let code = 0;
  try {
    await bringUp();
  } catch (error) {
    code = asked > 0 && error instanceof Halt ? 0 : sayFailure(error);
  }
  for (const close of closers.reverse()) await close();
  if (asked > 0) say('Stopped.');
  return code;
}
