// The database server of a test run: a throwaway cluster with one migrated template, which every test file copies.
import pg from 'pg';
import { clusterUrl, startThrowawayCluster } from './cluster.mjs';
import { ensureDatabase, withClient } from './database.mjs';
import { root } from './place.mjs';
import { lastLines, run } from './run.mjs';

/** @typedef {Pick<import('./cluster.mjs').Cluster, 'port' | 'passwords' | 'bin'>} TestCluster */

const template = 'raglan_template';

/** How `npm test` hands its cluster to the parts it runs. */
export const sharedClusterVariable = 'RAGLAN_TEST_CLUSTER';

/**
 * The cluster that `npm test` shares, or a new one that `close` removes.
 * @returns {Promise<{ cluster: TestCluster, close: () => Promise<void> }>}
 */
export async function openTestCluster() {
  const shared = process.env[sharedClusterVariable];
  if (shared) return { cluster: JSON.parse(shared), close: async () => {} };
  const cluster = await startThrowawayCluster();
  try {
    const urls = await ensureDatabase(cluster, template);
    const { code, output } = await run(process.execPath, ['--import', 'tsx', 'scripts/migrate.ts'], {
      cwd: root,
      env: { ...process.env, RAGLAN_OWNER_URL: urls.ownerUrl },
    });
    if (code !== 0) throw new Error(`The template database could not be migrated:\n${lastLines(output, 20)}`);
  } catch (error) {
    await cluster.remove();
    throw error;
  }
  const { port, passwords, bin } = cluster;
  return { cluster: { port, passwords, bin }, close: cluster.remove };
}

/**
 * Makes a fresh, migrated, empty database.
 * @param {TestCluster} cluster
 * @param {string} name
 * @returns {Promise<import('./database.mjs').DatabaseUrls>}
 */
export async function copyTemplate(cluster, name) {
  await withClient(clusterUrl(cluster, 'admin', 'postgres'), async (client) => {
    const database = pg.escapeIdentifier(name);
    await client.query(`create database ${database} template ${template} owner raglan_owner`);
    await client.query(`revoke connect, temporary on database ${database} from public`);
    await client.query(`grant connect on database ${database} to raglan_app`);
  });
  return {
    ownerUrl: clusterUrl(cluster, 'owner', name),
    appUrl: clusterUrl(cluster, 'app', name),
    adminUrl: clusterUrl(cluster, 'admin', name),
  };
}
