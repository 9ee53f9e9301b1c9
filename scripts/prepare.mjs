// What must be there before anything of Raglan can run: the right Node, the packages of the lock file.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { spawn } from 'node:child_process';
import { root } from './place.mjs';
import { Halt, say, secondsSince } from './say.mjs';

/** Halts unless this is a Node that the packages run on (package.json, "engines"). */
export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major > 22 || major < 20 || (major === 20 && minor < 9)) {
    throw new Halt(
      `Raglan runs on Node 20.9 up to 22; this is Node ${process.versions.node}. Install Node 20 and start again.`,
    );
  }
}

const stampFile = path.join(root, 'node_modules', '.raglan-lock');

const readLockHash = () =>
  createHash('sha256')
    .update(fs.readFileSync(path.join(root, 'package-lock.json')))
    .update(`${process.version.split('.')[0]} ${process.platform} ${process.arch}`)
    .digest('hex');

/** Whether what npm noted of its last install is what the lock file asks for; optional packages may be absent. */
function isInstalledByHand() {
  const noted = path.join(root, 'node_modules', '.package-lock.json');
  if (!fs.existsSync(noted)) return false;
  const have = JSON.parse(fs.readFileSync(noted, 'utf8')).packages;
  const want = JSON.parse(fs.readFileSync(path.join(root, 'package-lock.json'), 'utf8')).packages;
  return Object.entries(want).every(
    ([place, entry]) => place === '' || entry.optional || have[place]?.version === entry.version,
  );
}

/** Whether node_modules is what the lock file asks for. */
export function arePackagesInstalled() {
  const hash = readLockHash();
  if (fs.existsSync(stampFile) && fs.readFileSync(stampFile, 'utf8') === hash) return true;
  if (!isInstalledByHand()) return false;
  fs.writeFileSync(stampFile, hash);
  return true;
}

/** Installs the packages of the lock file when they are missing or others. */
export async function ensurePackages() {
  if (arePackagesInstalled()) return;
  const start = performance.now();
  say('Installing packages from the lock file (about a minute the first time)…');
  // Development packages too: the build checks types. A caller's NODE_ENV=production must not leave them out.
  const npm = process.env.npm_execpath;
  const [program, args] = npm ? [process.execPath, [npm]] : ['npm', []];
  const code = await new Promise((resolve) => {
    const child = spawn(program, [...args, 'ci', '--include=dev', '--loglevel=error'], {
      cwd: root,
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    child.on('error', () => resolve(127));
    child.on('close', resolve);
  });
  if (code !== 0) {
    throw new Halt(
      'The packages could not be installed; npm says why above. Check the network and run: npm ci',
    );
  }
  fs.writeFileSync(stampFile, readLockHash());
  say(`Packages installed in ${secondsSince(start)}.`);
}
