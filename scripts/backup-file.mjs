// Backups: one file of pg_dump, and beside it a note of what is in it, taken from the same snapshot.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import { pipeline } from 'node:stream/promises';
import pg from 'pg';
import { withClient } from './database.mjs';
import { lastLines, run } from './run.mjs';
import { Halt } from './say.mjs';

/** @typedef {{ format: 'raglan-backup', at: string, sha256: string, rows: Record<string, number> }} BackupNote */

/** Connection settings as PostgreSQL's programs read them; a command line would show the password to everybody. @param {string} url */
function toEnvironment(url) {
  const address = new URL(url);
  const ssl = address.searchParams.get('sslmode');
  return {
    PATH: process.env.PATH,
    LANG: 'C.UTF-8',
    PGHOST: address.hostname,
    PGPORT: address.port || '5432',
    PGUSER: decodeURIComponent(address.username),
    PGPASSWORD: decodeURIComponent(address.password),
    PGDATABASE: decodeURIComponent(address.pathname.slice(1)),
    ...(ssl ? { PGSSLMODE: ssl } : {}),
  };
}

/** @param {string} file */
async function hashFile(file) {
  const hash = createHash('sha256');
  await pipeline(fs.createReadStream(file), hash);
  return hash.digest('hex');
}

/** How many rows each table of ours holds. @param {pg.Client} client @returns {Promise<Record<string, number>>} */
export async function countRows(client) {
  const { rows } = await client.query(`
    select n.nspname as schema, c.relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
    where c.relkind = 'r' and n.nspname in ('public', 'graphile_worker') order by 1, 2`);
  /** @type {Record<string, number>} */
  const counts = {};
  for (const { schema, name } of rows) {
    const table = `${pg.escapeIdentifier(schema)}.${pg.escapeIdentifier(name)}`;
    const counted = await client.query(`select count(*)::int as rows from ${table}`);
    counts[`${schema}.${name}`] = counted.rows[0].rows;
  }
  return counts;
}

/** Halts unless the role sees every league's rows: a backup of what one role may see would lack the rest. @param {pg.Client} client */
async function checkSeesAll(client) {
  const { rows } = await client.query(
    'select rolname, rolsuper or rolbypassrls as sees_all from pg_roles where rolname = current_user',
  );
  if (!rows[0].sees_all) {
    throw new Halt(
      `The role "${rows[0].rolname}" is under row-level security, so it cannot back up every league. Put the address of a role with BYPASSRLS (or a superuser) into RAGLAN_BACKUP_URL.`,
    );
  }
}

/**
 * Writes the whole database to `file`, and a note of its contents to `file`.json. Work goes on meanwhile; the backup is
 * of one instant.
 * @param {{ adminUrl: string, bin: string, file: string, now: Date }} order
 * @returns {Promise<BackupNote>}
 */
export async function writeBackup({ adminUrl, bin, file, now }) {
  const partial = `${file}.part`;
  const rows = await withClient(adminUrl, async (client) => {
    await checkSeesAll(client);
    await client.query('begin isolation level repeatable read read only');
    const { rows: exported } = await client.query('select pg_export_snapshot() as snapshot');
    const counts = await countRows(client);
    const { code, output } = await run(
      `${bin}pg_dump`,
      ['--format=custom', '--no-password', `--snapshot=${exported[0].snapshot}`, `--file=${partial}`],
      { env: toEnvironment(adminUrl) },
    );
    await client.query('commit');
    if (code !== 0) {
      fs.rmSync(partial, { force: true });
      throw new Halt(`The backup failed:\n${lastLines(output, 8)}`);
    }
    return counts;
  });
  fs.chmodSync(partial, 0o600);
  /** @type {BackupNote} */
  const note = { format: 'raglan-backup', at: now.toISOString(), sha256: await hashFile(partial), rows };
  fs.renameSync(partial, file);
  fs.writeFileSync(`${file}.json`, `${JSON.stringify(note, null, 2)}\n`, { mode: 0o600 });
  return note;
}

/**
 * Halts unless the file is a whole backup of a Raglan database; answers its note, or null when that is not beside it.
 * @param {string} file
 * @param {string} bin
 * @returns {Promise<BackupNote | null>}
 */
export async function checkBackup(file, bin) {
  if (!fs.existsSync(file)) throw new Halt(`There is no file ${file}.`);
  const noteFile = `${file}.json`;
  /** @type {BackupNote | null} */
  const note = fs.existsSync(noteFile) ? JSON.parse(fs.readFileSync(noteFile, 'utf8')) : null;
  if (note && note.sha256 !== (await hashFile(file))) {
    throw new Halt(
      `${file} is damaged: it is not the file that its note (${noteFile}) describes. Nothing was changed. Use another copy.`,
    );
  }
  const { code, stdout, output } = await run(`${bin}pg_restore`, ['--list', file]);
  if (code !== 0) {
    throw new Halt(
      `${file} is not a backup that can be read (${lastLines(output, 1)}). Nothing was changed.`,
    );
  }
  if (!/ TABLE public leagues /.test(stdout) || !/ TABLE public kysely_migration /.test(stdout)) {
    throw new Halt(`${file} is a database backup, but not of Raglan. Nothing was changed.`);
  }
  return note;
}

/**
 * Fills the database at `url` from the file, in one transaction: all of it, or nothing.
 * @param {{ url: string, owner: string, bin: string, file: string, clean: boolean }} order
 */
export async function readBackup({ url, owner, bin, file, clean }) {
  const { code, output } = await run(
    `${bin}pg_restore`,
    [
      '--single-transaction',
      '--exit-on-error',
      '--no-password',
      '--no-owner',
      `--role=${owner}`,
      ...(clean ? ['--clean', '--if-exists'] : []),
      `--dbname=${new URL(url).pathname.slice(1)}`,
      file,
    ],
    { env: toEnvironment(url) },
  );
  if (code !== 0) {
    throw new Halt(`The restore failed and was undone:\n${lastLines(output, 8)}`);
  }
}

/** Halts when the tables do not hold what the note says. @param {string} url an address that sees every row @param {BackupNote} note */
export async function verifyRows(url, note) {
  const found = await withClient(url, async (client) => {
    await checkSeesAll(client);
    return countRows(client);
  });
  const wrong = Object.entries(note.rows).filter(([table, rows]) => found[table] !== rows);
  if (wrong.length > 0) {
    const list = wrong.map(([table, rows]) => `${table}: ${found[table] ?? 'missing'} instead of ${rows}`);
    throw new Halt(`The restored tables are not what was backed up:\n  ${list.join('\n  ')}`);
  }
}
