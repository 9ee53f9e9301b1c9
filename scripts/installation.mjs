// The database of this installation, for commands that come and go: backup, restore, doctor.
import { openCluster, stopCluster } from './cluster.mjs';
import { databaseOf, ensureDatabase, prepareForeignDatabase } from './database.mjs';
import { findClientPrograms } from './postgres-programs.mjs';
import { findRunning } from './running.mjs';

/**
 * @typedef {{
 *   kind: 'private' | 'foreign',
 *   urls: import('./database.mjs').DatabaseUrls,
 *   database: string,
 *   bin: string,
 *   cluster: import('./cluster.mjs').Cluster | null,
 * }} Installation `bin` holds PostgreSQL's programs, ending in a slash, or is empty for those in PATH
 */

/**
 * Opens the database, does the work, and leaves the server as it was found: running or not.
 * @template T
 * @param {(installation: Installation) => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withInstallation(work) {
  const { DATABASE_URL: foreign, RAGLAN_DATABASE_URL: app, RAGLAN_BACKUP_URL: backup } = process.env;
  if (foreign) {
    const urls = await prepareForeignDatabase(foreign, app || undefined);
    return work({
      kind: 'foreign',
      urls: { ...urls, adminUrl: backup || urls.adminUrl },
      database: databaseOf(foreign),
      bin: await findClientPrograms(),
      cluster: null,
    });
  }
  const cluster = await openCluster();
  try {
    const urls = await ensureDatabase(cluster);
    return await work({ kind: 'private', urls, database: 'raglan', bin: `${cluster.bin}/`, cluster });
  } finally {
    if (cluster.startedHere && !findRunning()) await stopCluster(cluster);
  }
}
