// npm run doctor: looks at everything that Raglan stands on and says of each part that it is well, or what to do.
import fs from 'node:fs';
import path from 'node:path';
import { arePackagesInstalled, checkNode } from './prepare.mjs';
import { dataFolder, root } from './place.mjs';
import { isPortFree } from './ports.mjs';
import { listServers } from './postgres-programs.mjs';
import { findRunning } from './running.mjs';
import { Halt, say } from './say.mjs';
import { readSettings } from './settings.mjs';

let ill = 0;

/**
 * One line: what was looked at and how it is. A Halt thrown by the look is what to do.
 * @param {string} part
 * @param {() => string | Promise<string>} look
 * @returns {Promise<boolean>} whether it is well
 */
async function examine(part, look) {
  try {
    say(`OK    ${part.padEnd(11)} ${await look()}`);
    return true;
  } catch (error) {
    ill += 1;
    const message = error instanceof Error ? error.message : String(error);
    say(`WRONG ${part.padEnd(11)} ${message.split('\n').join('\n                  ')}`);
    return false;
  }
}

/** @param {import('pg').Client} client */
async function lookAtMigrations(client) {
  const known = fs
    .readdirSync(path.join(root, 'migrations'))
    .filter((file) => file.endsWith('.ts'))
    .map((file) => file.slice(0, -3));
  const { rows: there } = await client.query(
    `select to_regclass('public.kysely_migration') is not null as yes`,
  );
  const { rows } = there[0].yes ? await client.query('select name from kysely_migration') : { rows: [] };
  const applied = rows.map((row) => /** @type {string} */ (row.name));
  const missing = known.filter((name) => !applied.includes(name));
  const newer = applied.filter((name) => !known.includes(name));
  if (newer.length > 0) {
    throw new Halt(
      `The database is newer than this code: it has had ${newer.join(', ')}. Update the code to the version that made it.`,
    );
  }
  if (missing.length > 0) {
    throw new Halt(`${missing.length} steps are missing, from ${missing[0]} on. Run: npm start`);
  }
  return `all ${known.length} steps applied`;
}

/** @param {import('pg').Client} client */
async function lookAtQueue(client) {
  const { rows } = await client.query(`
    select count(*) filter (where run_at <= now() and attempts < max_attempts and locked_at is null)::int as due,
      count(*) filter (where locked_at is not null)::int as working,
      count(*) filter (where attempts >= max_attempts)::int as failed,
      coalesce(extract(epoch from now() - min(run_at) filter (where run_at <= now() and attempts < max_attempts and locked_at is null)), 0)::int as oldest
    from graphile_worker._private_jobs`);
  const { due, working, failed, oldest } = rows[0];
  const counts = `${due} due, ${working} under way, ${failed} given up`;
  if (oldest > 300 && findRunning()) {
    throw new Halt(
      `${counts}; the oldest has waited ${oldest} s, so no worker takes any. Stop and start Raglan.`,
    );
  }
  return counts;
}

await examine('node', () => {
  checkNode();
  return process.versions.node;
});
const hasPackages = await examine('packages', () => {
  if (arePackagesInstalled()) return 'as in the lock file';
  throw new Halt('They are missing or not those of the lock file. Run: npm ci');
});
const { DATABASE_URL: foreign } = process.env;
const hasServer = await examine('postgresql', async () => {
  if (foreign) return 'not needed here: DATABASE_URL names a server';
  const servers = await listServers();
  if (servers.length > 0) return servers.map(({ bin, major }) => `${major} in ${bin}`).join(', ');
  throw new Halt('It is not installed. Run: apt-get install -y --no-install-recommends postgresql');
});
const isMade = Boolean(foreign) || fs.existsSync(path.join(dataFolder, 'database.json'));
if (!isMade) {
  say(`      ${'database'.padEnd(11)} not made yet; npm start makes it`);
} else if (hasPackages && hasServer) {
  const { withInstallation } = await import('./installation.mjs');
  const { withClient } = await import('./database.mjs');
  await examine('database', () =>
    withInstallation(async ({ urls, kind, database, cluster }) => {
      say(
        `OK    ${'server'.padEnd(11)} ${kind}${cluster ? `, in ${cluster.folder}, port ${cluster.port}` : ''}`,
      );
      await withClient(urls.ownerUrl, async (client) => {
        const isUpToDate = await examine('migrations', () => lookAtMigrations(client));
        if (isUpToDate) await examine('queue', () => lookAtQueue(client));
      });
      await withClient(urls.appUrl, (client) => client.query('select 1'));
      return `${database} opens for the owner and for the runtime role`;
    }),
  );
} else {
  say(`      ${'database'.padEnd(11)} not looked at until the above is well`);
}
await examine('port', async () => {
  const { port, host } = readSettings();
  const running = findRunning();
  if (running) return `Raglan runs: ${running.url}`;
  if (await isPortFree(port, host)) return `${port} is free`;
  throw new Halt(`${port} is taken by another program. Choose another: PORT=${port + 1} npm start`);
});
await examine('fonts', () => {
  const folder = path.join(root, 'lib', 'documents', 'fonts');
  const fonts = fs.existsSync(folder) ? fs.readdirSync(folder).filter((file) => file.endsWith('.ttf')) : [];
  const empty = fonts.filter((file) => fs.statSync(path.join(folder, file)).size < 1000);
  if (fonts.length === 0 || empty.length > 0) {
    throw new Halt(
      `The fonts of the documents are not whole (${folder}). Bring them back: git checkout -- lib/documents/fonts`,
    );
  }
  return `${fonts.length} for documents`;
});
say(ill === 0 ? '\nAll is well.' : `\n${ill} ${ill === 1 ? 'part needs' : 'parts need'} attention.`);
process.exit(ill === 0 ? 0 : 1);
