// npm run restore -- FILE [--replace]: a backup back into the database. Refuses to touch a database that holds
// anything unless told --replace; the private database that it replaces is kept beside the new one.
import path from 'node:path';
import pg from 'pg';
import { checkBackup, readBackup, verifyRows } from './backup-file.mjs';
import { clusterUrl } from './cluster.mjs';
import { ensureDatabase, withClient } from './database.mjs';
import { withInstallation } from './installation.mjs';
import { findRunning } from './running.mjs';
import { Halt, say, sayFailure } from './say.mjs';

/** How many leagues the database holds; null when it has no tables at all. @param {string} url */
const countLeagues = (url) =>
  withClient(url, async (client) => {
    const { rows } = await client.query(`select to_regclass('public.leagues') is not null as there`);
    if (!rows[0].there) {
      const { rowCount } = await client.query(`select 1 from pg_tables where schemaname = 'public' limit 1`);
      return rowCount === 0 ? null : 0;
    }
    const counted = await client.query('select count(*)::int as leagues from leagues');
    return /** @type {number} */ (counted.rows[0].leagues);
  });

/**
 * Restores beside the present database, checks, and only then changes their names.
 * @param {import('./installation.mjs').Installation & { cluster: import('./cluster.mjs').Cluster }} installation
 * @param {string} file
 * @param {import('./backup-file.mjs').BackupNote | null} note
 * @param {boolean} keepOld
 */
async function restorePrivately({ cluster, bin }, file, note, keepOld) {
  const fresh = 'raglan_restoring';
  const admin = clusterUrl(cluster, 'admin', 'postgres');
  await withClient(admin, (client) => client.query(`drop database if exists ${fresh} with (force)`));
  await ensureDatabase(cluster, fresh);
  const url = clusterUrl(cluster, 'admin', fresh);
  await readBackup({ url, owner: 'raglan_owner', bin, file, clean: false });
  if (note) await verifyRows(url, note);
  const old = `raglan_replaced_${new Date().toISOString().slice(0, 19).replace(/\D/g, '')}`;
  await withClient(admin, async (client) => {
    await client.query(
      `select pg_terminate_backend(pid) from pg_stat_activity where datname in ('raglan', '${fresh}')`,
    );
    await client.query(
      keepOld ? `alter database raglan rename to ${pg.escapeIdentifier(old)}` : 'drop database raglan',
    );
    await client.query(`alter database ${fresh} rename to raglan`);
  });
  if (keepOld) say(`What was there before is kept in the same cluster as the database ${old}.`);
}

/**
 * @param {import('./installation.mjs').Installation} installation
 * @param {string} file
 * @param {import('./backup-file.mjs').BackupNote | null} note
 */
async function restoreOnForeignServer({ urls, bin }, file, note) {
  const owner = decodeURIComponent(new URL(urls.ownerUrl).username);
  await readBackup({ url: urls.ownerUrl, owner, bin, file, clean: true });
  if (note && process.env.RAGLAN_BACKUP_URL) await verifyRows(urls.adminUrl, note);
}

try {
  const args = process.argv.slice(2);
  const replace = args.includes('--replace');
  const named = args.filter((arg) => !arg.startsWith('--'))[0];
  if (!named) throw new Halt('Name the backup to restore: npm run restore -- FILE [--replace]');
  const file = path.resolve(named);
  const running = findRunning();
  if (running) throw new Halt(`Raglan is running (process ${running.pid}). Stop it first, then restore.`);

  await withInstallation(async (installation) => {
    const note = await checkBackup(file, installation.bin);
    const leagues = await countLeagues(installation.urls.adminUrl);
    if (leagues !== null && !replace) {
      throw new Halt(
        `The database "${installation.database}" is not empty: it holds ${leagues} ${leagues === 1 ? 'league' : 'leagues'}. Nothing was changed. To put the backup in its place: npm run restore -- ${named} --replace`,
      );
    }
    const { cluster } = installation;
    if (cluster) await restorePrivately({ ...installation, cluster }, file, note, leagues !== null);
    else await restoreOnForeignServer(installation, file, note);
    const checked = note ? `Every table was checked against ${path.basename(file)}.json.` : '';
    say(`Restored ${file}. ${checked}\nThe next npm start brings its tables up to date.`);
  });
} catch (error) {
  process.exitCode = sayFailure(error);
}
