import { sql } from 'kysely';
import { beforeAll, describe, expect, it } from 'vitest';
import { getDatabase } from '@/db/client';

// Reads the catalogue of the live database, so that a table added tomorrow is covered without a line here.

type Table = { name: string; enabled: boolean; forced: boolean; owner: string };
type Key = {
  table: string;
  name: string;
  kind: 'p' | 'f';
  columns: string[];
  target: string | null;
  targetColumns: string[] | null;
};

let tables: Table[] = [];
let keys: Key[] = [];
let policies: {
  table: string;
  name: string;
  command: string;
  using: string | null;
  check: string | null;
  permissive: string;
  roles: string[];
}[] = [];
let withLeagueId = new Set<string>();

beforeAll(async () => {
  const { db } = getDatabase();
  tables = (
    await sql<Table>`
      select c.relname as name, c.relrowsecurity as enabled, c.relforcerowsecurity as forced, pg_get_userbyid(c.relowner) as owner
      from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind = 'r' order by 1`.execute(
      db,
    )
  ).rows;
  const columns = await sql<{ name: string }>`
    select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'league_id'`.execute(
    db,
  );
  withLeagueId = new Set(columns.rows.map((row) => row.name));
  keys = (
    await sql<Key>`
      select c.conrelid::regclass::text as table, c.conname as name, c.contype as kind,
        array(select a.attname::text from unnest(c.conkey) with ordinality k(n, i) join pg_attribute a on a.attrelid = c.conrelid and a.attnum = k.n order by i) as columns,
        case when c.confrelid = 0 then null else c.confrelid::regclass::text end as target,
        case when c.confrelid = 0 then null else array(select a.attname::text from unnest(c.confkey) with ordinality k(n, i) join pg_attribute a on a.attrelid = c.confrelid and a.attnum = k.n order by i) end as "targetColumns"
      from pg_constraint c where c.connamespace = 'public'::regnamespace and c.contype in ('p', 'f')`.execute(
      db,
    )
  ).rows;
  policies = (
    await sql<(typeof policies)[number]>`
      select tablename as table, policyname as name, cmd as command, qual as using, with_check as check, permissive, roles::text[] as roles
      from pg_policies where schemaname = 'public'`.execute(db)
  ).rows;
});

const tenantTables = () => tables.filter((table) => withLeagueId.has(table.name));

describe('every table of a league', () => {
  it('is known to this test: at least the twenty tables of the first version have a league_id', () => {
    expect(withLeagueId.size).toBeGreaterThanOrEqual(20);
  });

  it('has row-level security enabled and forced', () => {
    expect(tenantTables().filter((table) => !table.enabled || !table.forced)).toEqual([]);
  });

  it('has a policy for reading and writing that compares league_id with the transaction’s league and survives an empty setting', () => {
    const expression =
      /^\(league_id = \(NULLIF\(current_setting\('app\.league_id'::text, true\), ''::text\)\)::uuid\)$/;
    const missing = tenantTables().filter(
      (table) =>
        !policies.some(
          (policy) =>
            policy.table === table.name &&
            policy.command === 'ALL' &&
            expression.test(policy.using ?? '') &&
            expression.test(policy.check ?? ''),
        ),
    );
    expect(missing).toEqual([]);
  });

  it('lets nothing be written through any other policy', () => {
    const others = policies.filter(
      (policy) => withLeagueId.has(policy.table) && policy.name !== 'of_this_league',
    );
    expect(others.filter((policy) => policy.command !== 'SELECT')).toEqual([]);
  });

  it('has a primary key that starts with league_id', () => {
    const first = new Map(keys.filter((key) => key.kind === 'p').map((key) => [key.table, key.columns[0]]));
    expect(tenantTables().filter((table) => first.get(table.name) !== 'league_id')).toEqual([]);
  });

  it('points at tables of a league only together with league_id, since foreign keys ignore row-level security', () => {
    const loose = keys.filter(
      (key) =>
        key.kind === 'f' &&
        withLeagueId.has(key.table) &&
        key.target !== null &&
        withLeagueId.has(key.target) &&
        !(key.columns[0] === 'league_id' && key.targetColumns?.[0] === 'league_id'),
    );
    expect(loose).toEqual([]);
  });
});

describe('the runtime role', () => {
  it('is no superuser, cannot bypass row-level security, and can make neither roles nor databases', async () => {
    const { rows } = await sql<{ super: boolean; bypass: boolean; role: boolean; db: boolean }>`
      select rolsuper as super, rolbypassrls as bypass, rolcreaterole as role, rolcreatedb as db from pg_roles where rolname = current_user`.execute(
      getDatabase().db,
    );
    expect(rows).toEqual([{ super: false, bypass: false, role: false, db: false }]);
  });

  it('owns no table, and is a member of no other role', async () => {
    const { rows } = await sql<{ me: string }>`select current_user as me`.execute(getDatabase().db);
    expect(tables.filter((table) => table.owner === rows[0]?.me)).toEqual([]);
    const memberships =
      await sql`select 1 from pg_auth_members m join pg_roles r on r.oid = m.member where r.rolname = current_user`.execute(
        getDatabase().db,
      );
    expect(memberships.rows).toEqual([]);
  });

  it('has no right on any table of the job queue', async () => {
    const { rows } = await sql<{ table: string }>`
      select c.oid::regclass::text as table from pg_class c join pg_namespace n on n.oid = c.relnamespace
      where n.nspname = 'graphile_worker' and c.relkind in ('r', 'v')
        and has_table_privilege(current_user, c.oid, 'select, insert, update, delete')`.execute(
      getDatabase().db,
    );
    expect(rows).toEqual([]);
  });

  it('sees nothing at all without a scope, in any table that has row-level security', async () => {
    const { db } = getDatabase();
    for (const table of tables.filter((entry) => entry.enabled)) {
      const readable = await sql<{
        ok: boolean;
      }>`select has_table_privilege(current_user, ${`public.${table.name}`}, 'select') as ok`.execute(db);
      if (!readable.rows[0]?.ok) continue;
      const { rows } = await sql<{
        n: number;
      }>`select count(*)::int as n from ${sql.table(table.name)}`.execute(db);
      expect([table.name, rows[0]?.n]).toEqual([table.name, 0]);
    }
  });

  it('can only queue tasks that exist', async () => {
    await expect(
      sql`select enqueue_job('drop-everything', '{}'::json, 'k', null)`.execute(getDatabase().db),
    ).rejects.toThrow('unknown task');
  });
});

describe('tables that belong to no league', () => {
  it('are only those that this list names, so that a forgotten league_id is noticed', () => {
    const open = tables.filter((table) => !withLeagueId.has(table.name)).map((table) => table.name);
    expect(open.filter((name) => !name.startsWith('kysely_'))).toEqual([
      'emails',
      'leagues',
      'password_resets',
      'rate_limits',
      'sign_ups',
      'system_events',
      'users',
    ]);
  });

  it('that hold people or messages are under forced row-level security too', () => {
    const guarded = ['emails', 'leagues', 'password_resets', 'sign_ups', 'system_events', 'users'];
    expect(
      tables.filter((table) => guarded.includes(table.name) && !(table.enabled && table.forced)),
    ).toEqual([]);
  });
});
