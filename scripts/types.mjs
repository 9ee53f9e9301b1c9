// npm run types: TypeScript over the product, its tests and the plain JavaScript of scripts/.
import fs from 'node:fs';
import path from 'node:path';
import { spawnSync } from 'node:child_process';
import { root } from './place.mjs';

const node = (/** @type {string[]} */ ...args) =>
  spawnSync(process.execPath, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' },
  }).status ?? 1;

// Next writes the types of routes; without them, and after a page has moved, tsc would look at nothing or at the past.
fs.rmSync(path.join(root, '.next', 'types'), { recursive: true, force: true });
fs.rmSync(path.join(root, '.next', 'dev', 'types'), { recursive: true, force: true });
const generated = node('node_modules/next/dist/bin/next', 'typegen');
const product = generated === 0 ? node('node_modules/typescript/bin/tsc', '--noEmit', '-p', '.') : generated;
const commands = node('node_modules/typescript/bin/tsc', '--noEmit', '-p', 'scripts/tsconfig.json');
process.exit(product || commands);
