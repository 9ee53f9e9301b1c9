// Where things lie in the project folder.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { Halt } from './say.mjs';

/** The project folder. */
export const root = path.resolve(import.meta.dirname, '..');

/** What one installation keeps: the private database, passwords, the secret, logs. Never committed. */
export const dataFolder = path.resolve(process.env.RAGLAN_DATA_DIR || path.join(root, '.data'));

/** Names this installation among others on the same machine. */
export const placeKey = createHash('sha256').update(dataFolder).digest('hex').slice(0, 12);

/** Makes `.data/` if it is missing; others may pass through (the database's own user must), not look inside. */
export function makeDataFolder() {
  try {
    fs.mkdirSync(dataFolder, { recursive: true, mode: 0o711 });
    fs.accessSync(dataFolder, fs.constants.W_OK | fs.constants.X_OK);
  } catch {
    const owner = fs.existsSync(dataFolder) ? `user ${fs.statSync(dataFolder).uid}` : 'another user';
    throw new Halt(
      `This user may not write ${dataFolder}; it belongs to ${owner}. Run the command as that user, or give the folder to this one: chown -R $(id -u) ${dataFolder}`,
    );
  }
}

/**
 * Reads a small JSON file of `.data/`, or makes it with `make()` (readable by its owner only) when it is missing.
 * @template T
 * @param {string} name
 * @param {() => T} make
 * @returns {T}
 */
export function readOrMake(name, make) {
  const file = path.join(dataFolder, name);
  if (fs.existsSync(file)) {
    try {
      return JSON.parse(fs.readFileSync(file, 'utf8'));
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      throw new Halt(
        `${file} cannot be read (${reason}). Bring it back from a copy, or run as the user who made it.`,
      );
    }
  }
  makeDataFolder();
  const value = make();
  fs.writeFileSync(file, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  return value;
}
