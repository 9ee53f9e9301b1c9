// npm run boundaries: the arrows of .dependency-cruiser.cjs over every folder that exists.
import fs from 'node:fs';
import path from 'node:path';
import { spawnSync } from 'node:child_process';
import { root } from './place.mjs';

const places = fs
  .readdirSync(root, { withFileTypes: true })
  .filter((entry) =>
    entry.isDirectory()
      ? ['app', 'components', 'db', 'lib', 'migrations', 'scripts', 'tests'].includes(entry.name)
      : /\.(ts|tsx|mjs)$/.test(entry.name) && entry.name !== 'next-env.d.ts',
  )
  .map((entry) => entry.name);

const cruiser = path.join(root, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
const { status } = spawnSync(process.execPath, [cruiser, ...places], { cwd: root, stdio: 'inherit' });
process.exit(status ?? 1);
