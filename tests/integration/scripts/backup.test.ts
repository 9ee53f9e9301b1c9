import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { DatabaseUrls } from '../../../scripts/database.mjs';
import { run } from '../../../scripts/run.mjs';
import { getTestUrls, queryAt, queryAsAdmin } from '@/tests/support/database';
import { createEmptyDatabase } from '@/tests/support/empty-database';

const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'raglan-backup-'));
// The database's own user must be able to walk through.
fs.chmodSync(folder, 0o711);
const file = path.join(folder, 'league.dump');

/** Runs one of the two commands as an operator would, on the database of those addresses or on a private one. */
function command(script: 'backup' | 'restore', args: string[], on: DatabaseUrls | { dataDir: string }) {
  const { PATH, HOME, TMPDIR } = process.env;
  const where =
    'dataDir' in on
      ? { RAGLAN_DATA_DIR: on.dataDir }
      : {
          DATABASE_URL: on.ownerUrl,
          RAGLAN_DATABASE_URL: on.appUrl,
          RAGLAN_BACKUP_URL: on.adminUrl,
        };
  return run(process.execPath, [`scripts/${script}.mjs`, ...args], { env: { PATH, HOME, TMPDIR, ...where } });
}

const leaguesOf = async (url: string) =>
  (await queryAt<{ name: string }>(url, 'select name from leagues order by name')).map((row) => row.name);

const insertLeague = (url: string, name: string) =>
  queryAt(
    url,
    `insert into leagues (id, slug, name, time_zone, unit, paper, currency, created_at)
     values ($1, $2, $3, 'Europe/London', 'mm', 'A4', 'GBP', now())`,
    [randomUUID(), name.toLowerCase().replaceAll(' ', '-'), name],
  );

describe('backing up and restoring', () => {
  beforeAll(async () => {
    await insertLeague(getTestUrls().adminUrl, 'Saltmarsh Youth League');
    await insertLeague(getTestUrls().adminUrl, 'Fellside League');
    await queryAsAdmin(`select graphile_worker.add_job('tidy', '{}'::json)`);
    const made = await command('backup', [file], getTestUrls());
    expect(made.output).toContain('Backed up 2 leagues');
    expect(made.code).toBe(0);
  });
  afterAll(() => fs.rmSync(folder, { recursive: true, force: true }));

  test('a backup brings every league, and the jobs that wait, into an empty database', async () => {
    const target = await createEmptyDatabase();
    const restored = await command('restore', [file], target);
    expect(restored.output).toContain('Every table was checked');
    expect(restored.code).toBe(0);
    expect(await leaguesOf(target.adminUrl)).toEqual(['Fellside League', 'Saltmarsh Youth League']);
    const jobs = await queryAt(target.adminUrl, 'select 1 from graphile_worker._private_jobs');
    expect(jobs).toHaveLength(1);
  });

  test('what was restored still keeps leagues apart and still belongs to the owner', async () => {
    const target = await createEmptyDatabase();
    await command('restore', [file], target);
    expect(await leaguesOf(target.appUrl)).toEqual([]);
    const [sealed] = await queryAt<{ loose: number; foreign: number }>(
      target.adminUrl,
      `select count(*) filter (where not (c.relrowsecurity and c.relforcerowsecurity)
           and exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'league_id'))::int as loose,
         count(*) filter (where pg_get_userbyid(c.relowner) <> 'raglan_owner')::int as foreign
       from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind = 'r'`,
    );
    expect(sealed).toEqual({ loose: 0, foreign: 0 });
    await queryAt(target.appUrl, `select enqueue_job('send-email', '{}'::json, 'key', null)`);
  });

  test('a database that holds something is left alone unless told to replace it', async () => {
    const target = await createEmptyDatabase();
    await command('restore', [file], target);
    await insertLeague(target.adminUrl, 'Newcomer League');
    const refused = await command('restore', [file], target);
    expect(refused.code).toBe(1);
    expect(refused.output).toContain('it holds 3 leagues. Nothing was changed.');
    expect(await leaguesOf(target.adminUrl)).toContain('Newcomer League');

    const replaced = await command('restore', [file, '--replace'], target);
    expect(replaced.code).toBe(0);
    expect(await leaguesOf(target.adminUrl)).toEqual(['Fellside League', 'Saltmarsh Youth League']);
  });

  test('a damaged file is refused before anything is touched', async () => {
    const damaged = path.join(folder, 'damaged.dump');
    const bytes = fs.readFileSync(file);
    bytes.writeUInt8(bytes.readUInt8(bytes.length >> 1) ^ 1, bytes.length >> 1);
    fs.writeFileSync(damaged, bytes);
    fs.copyFileSync(`${file}.json`, `${damaged}.json`);
    const target = await createEmptyDatabase();
    const refused = await command('restore', [damaged], target);
    expect(refused.code).toBe(1);
    expect(refused.output).toContain('is damaged');
    expect(await queryAt(target.adminUrl, `select 1 from pg_tables where schemaname = 'public'`)).toEqual([]);
  });

  test('a file that is no backup is refused', async () => {
    const text = path.join(folder, 'notes.txt');
    fs.writeFileSync(text, 'not a backup');
    const refused = await command('restore', [text], await createEmptyDatabase());
    expect(refused.code).toBe(1);
    expect(refused.output).toContain('is not a backup that can be read');
  });

  test('a role that row-level security holds may not write a backup that would lack rows', async () => {
    const urls = getTestUrls();
    const refused = await command('backup', [path.join(folder, 'partial.dump')], {
      ...urls,
      adminUrl: urls.ownerUrl,
    });
    expect(refused.code).toBe(1);
    expect(refused.output).toContain('RAGLAN_BACKUP_URL');
    expect(fs.existsSync(path.join(folder, 'partial.dump'))).toBe(false);
  });

  test('the private database takes a backup in, gives one out, and keeps what a restore replaces', async () => {
    const dataDir = path.join(folder, 'data');
    const taken = await command('restore', [file], { dataDir });
    expect(taken.output).toContain('Restored');
    const again = path.join(folder, 'again.dump');
    const given = await command('backup', [again], { dataDir });
    expect(given.output).toContain('Backed up 2 leagues');
    const replaced = await command('restore', [again, '--replace'], { dataDir });
    expect(replaced.output).toMatch(/kept in the same cluster as the database raglan_replaced_\d{14}/);
    const rows = (name: string) => JSON.parse(fs.readFileSync(`${name}.json`, 'utf8')).rows;
    expect(rows(again)).toEqual(rows(file));
  });
});
