// Finding PostgreSQL's own programs on this machine.
import fs from 'node:fs';
import path from 'node:path';
import { installFromDebian } from './debian.mjs';
import { isInPath, run } from './run.mjs';

const debianHome = '/usr/lib/postgresql';

/** Folders that hold a whole server, newest version first. @returns {Promise<{ bin: string, major: number }[]>} */
export async function listServers() {
  /** @type {string[]} */
  const folders = [];
  if (process.env.RAGLAN_PG_BIN) folders.push(process.env.RAGLAN_PG_BIN);
  if (fs.existsSync(debianHome)) {
    const versions = fs.readdirSync(debianHome).filter((name) => /^\d+$/.test(name));
    versions.sort((a, b) => Number(b) - Number(a));
    folders.push(...versions.map((version) => path.join(debianHome, version, 'bin')));
  }
  const { code, stdout } = await run('pg_config', ['--bindir']);
  if (code === 0) folders.push(stdout.trim());

  const servers = [];
  for (const bin of new Set(folders)) {
    if (!['initdb', 'pg_ctl', 'postgres'].every((program) => fs.existsSync(path.join(bin, program))))
      continue;
    const version = await run(path.join(bin, 'postgres'), ['--version']);
    const major = Number(/PostgreSQL\) (\d+)/.exec(version.stdout)?.[1] ?? 0);
    if (major >= 14) servers.push({ bin, major });
  }
  return servers;
}

/** The servers on this machine, after installing one if there was none. */
export async function requireServers() {
  const found = await listServers();
  if (found.length > 0) return found;
  await installFromDebian(['postgresql'], 'is needed for the database');
  return listServers();
}

/**
 * The folder of pg_dump and pg_restore, ending in a slash; empty when those in PATH will do. Newest first: an older
 * pg_dump refuses a newer server.
 */
export async function findClientPrograms() {
  const versions = fs.existsSync(debianHome) ? fs.readdirSync(debianHome) : [];
  versions.sort((a, b) => Number(b) - Number(a));
  const bin = versions
    .map((version) => path.join(debianHome, version, 'bin/'))
    .find((folder) => fs.existsSync(`${folder}pg_dump`));
  if (bin) return bin;
  if (await isInPath('pg_dump')) return '';
  await installFromDebian(['postgresql-client'], 'is needed to read and write backups');
  return '';
}
