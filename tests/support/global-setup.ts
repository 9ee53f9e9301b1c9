import type { TestProject } from 'vitest/node';
import { openTestCluster, type TestCluster } from '../../scripts/test-cluster.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    cluster: TestCluster;
  }
}

// Several projects of one run share one cluster; the last to finish removes it.
let opened: ReturnType<typeof openTestCluster> | undefined;
let users = 0;

/** Gives the project's test files a PostgreSQL cluster with a migrated template. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  users += 1;
  opened ??= openTestCluster();
  const { cluster, close } = await opened;
  project.provide('cluster', cluster);
  return async () => {
    users -= 1;
    if (users === 0) await close();
  };
}
