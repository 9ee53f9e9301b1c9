// npm run bench [-- NAME…]: every tests/bench/*.bench.ts, or those whose names contain one of the words. Those that need
// a database find a fresh one in their settings.
import fs from 'node:fs';
import path from 'node:path';
import { spawn } from 'node:child_process';
import { checkNode, ensurePackages } from './prepare.mjs';
import { root } from './place.mjs';
import { say, sayFailure } from './say.mjs';

/** @param {string[]} files @param {Record<string, string>} settings */
async function runAll(files, settings) {
  let failed = 0;
  for (const file of files) {
    say(`\n${file}`);
    const code = await new Promise((resolve) => {
      const child = spawn(
        process.execPath,
        ['--expose-gc', '--import', 'tsx', path.join('tests/bench', file)],
        {
          cwd: root,
          stdio: 'inherit',
          env: { ...process.env, NODE_ENV: 'production', ...settings },
        },
      );
      child.on('close', resolve);
    });
    if (code !== 0) failed += 1;
  }
  return failed;
}

try {
  checkNode();
  await ensurePackages();
  const words = process.argv.slice(2);
  const files = fs
    .readdirSync(path.join(root, 'tests', 'bench'))
    .filter((file) => file.endsWith('.bench.ts'))
    .filter((file) => words.length === 0 || words.some((word) => file.includes(word)));
  const { copyTemplate, openTestCluster } = await import('./test-cluster.mjs');
  const { cluster, close } = await openTestCluster();
  try {
    const urls = await copyTemplate(cluster, 'bench');
    const failed = await runAll(files, {
      RAGLAN_DATABASE_URL: urls.appUrl,
      RAGLAN_OWNER_URL: urls.ownerUrl,
      RAGLAN_SECRET: 'a secret for tests, and for nothing else',
      LOG_LEVEL: 'silent',
    });
    process.exitCode = failed > 0 ? 1 : 0;
  } finally {
    await close();
  }
} catch (error) {
  process.exitCode = sayFailure(error);
}
