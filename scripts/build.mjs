// Building the web application and the worker, only when a source has changed.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { root } from './place.mjs';
import { lastLines, run } from './run.mjs';
import { Halt, say, sayFailure, secondsSince } from './say.mjs';

/** What the built application is made of. Tests, migrations and documents are not in it. */
const sources = [
  'app',
  'components',
  'db',
  'lib',
  'public',
  'types',
  'proxy.ts',
  'instrumentation.ts',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'package-lock.json',
  'scripts/worker.ts',
  'scripts/mail-fake.ts',
  'scripts/mail-server.ts',
  'scripts/build.mjs',
];

/** @param {string} place @returns {string[]} */
function listFiles(place) {
  const full = path.join(root, place);
  if (!fs.existsSync(full)) return [];
  if (!fs.statSync(full).isDirectory()) return [place];
  const entries = fs.readdirSync(full, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  return entries.flatMap((entry) => listFiles(path.join(place, entry.name)));
}

/** A hash of every source's place and content: a checkout that changes only dates builds nothing. */
export function hashSources() {
  const hash = createHash('sha256');
  for (const file of sources.flatMap(listFiles)) {
    hash
      .update(`${file}\0`)
      .update(fs.readFileSync(path.join(root, file)))
      .update('\0');
  }
  return hash.digest('hex');
}

/** Whether the folder holds a finished build of these sources. @param {string} folder @param {string} hash */
export function isBuilt(folder, hash) {
  const stamp = path.join(root, folder, 'raglan-stamp');
  return (
    fs.existsSync(path.join(root, folder, 'BUILD_ID')) &&
    fs.existsSync(stamp) &&
    fs.readFileSync(stamp, 'utf8') === hash
  );
}

/**
 * Bundles the worker and the mail fake into one file each; packages stay outside.
 * @param {string} folder
 */
export async function buildCommands(folder) {
  const { build, formatMessages, stop } = await import('esbuild');
  try {
    await build({
      absWorkingDir: root,
      entryPoints: ['scripts/worker.ts', 'scripts/mail-fake.ts'],
      bundle: true,
      platform: 'node',
      target: 'node20',
      format: 'esm',
      packages: 'external',
      sourcemap: true,
      outExtension: { '.js': '.mjs' },
      outdir: folder,
      logLevel: 'silent',
    });
  } catch (error) {
    const { errors = [] } = /** @type {import('esbuild').BuildFailure} */ (error);
    const lines = await formatMessages(errors, { kind: 'error', color: false });
    throw new Halt(`Building the worker failed:\n\n${lines.join('') || error}`);
  } finally {
    await stop(); // esbuild keeps a helper process otherwise
  }
}

/**
 * Runs Next's build. For a folder other than its own it would write that folder's name into tsconfig.json and
 * next-env.d.ts; both are put back, so that a test run leaves the working tree as it was.
 * @param {string} folder
 */
async function buildWeb(folder) {
  const kept = ['tsconfig.json', 'next-env.d.ts']
    .map((name) => path.join(root, name))
    .filter((file) => folder !== '.next' && fs.existsSync(file))
    .map((file) => ({ file, text: fs.readFileSync(file) }));
  const { code, output } = await run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
    cwd: root,
    env: {
      ...process.env,
      NODE_ENV: 'production',
      NEXT_TELEMETRY_DISABLED: '1',
      RAGLAN_DIST_DIR: folder,
      NO_COLOR: '1',
    },
  });
  for (const { file, text } of kept) fs.writeFileSync(file, text);
  if (code !== 0) throw new Halt(`Building the web application failed:\n\n${lastLines(output, 40)}`);
}

/**
 * Builds into `webFolder` (for Next) and `commandFolder` (for the worker) unless both are up to date.
 * @param {{ webFolder: string, commandFolder: string }} folders
 */
export async function buildIfChanged({ webFolder, commandFolder }) {
  const hash = hashSources();
  const worker = path.join(root, commandFolder, 'worker.mjs');
  if (isBuilt(webFolder, hash) && fs.existsSync(worker)) return;
  const start = performance.now();
  say('Building (about a minute the first time)…');
  // A build that is cut short must not pass for this one.
  fs.rmSync(path.join(root, webFolder, 'raglan-stamp'), { force: true });
  await buildCommands(commandFolder);
  await buildWeb(webFolder);
  fs.writeFileSync(path.join(root, webFolder, 'raglan-stamp'), hash);
  say(`Built in ${secondsSince(start)}.`);
}

if (process.argv[1] === import.meta.filename) {
  await buildIfChanged({ webFolder: '.next', commandFolder: 'dist' }).catch((error) => {
    process.exitCode = sayFailure(error);
  });
}
