import { sql } from 'kysely';
import { beforeAll, describe, expect, it } from 'vitest';
import { withLeague, withUser, type LeagueTx, type UserTx } from '@/db/tenant';
import { buildBundle } from '@/lib/use-cases/batches/build-bundle';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { endRole } from '@/lib/use-cases/people/end-role';
import { invitePerson } from '@/lib/use-cases/people/invite-person';
import { importRoster } from '@/lib/use-cases/rosters/import-roster';
import { saveDraft } from '@/lib/use-cases/rule-sets/save-draft';
import {
  buildMember,
  buildShop,
  buildTeam,
  buildWorld,
  moveRoster,
  type FurnishedLeague,
} from '../factories/league';
import { queryAsAdmin } from '../support/database';

// Forgets the program and writes SQL as the role it runs as: what the database alone keeps apart. Tables and keys
// come from the catalogue, so that a table added tomorrow is tried without a line here.

type Key = { table: string; name: string; columns: string[]; target: string; targetColumns: string[] };
type Outcome = { rows: number } | { refused: string };

let mine: FurnishedLeague;
let theirs: FurnishedLeague;
let tables: string[] = [];
let keys: Key[] = [];
/** Of the attacked league: a released batch and a held one, both of the shop of its decorator. */
let released: { code: string; batchId: string };

/** Fills what a furnished league leaves empty, so that no table is tried with nothing in it. */
async function fill(world: FurnishedLeague): Promise<{ code: string; batchId: string }> {
  const hold = (teamId: string, shopId = world.shop.id) =>
    holdBatch(world.admin, { season: world.season.slug, teamIds: [teamId], shopId, promisedOn: null });
  await moveRoster(world.league, world.teams[1].rosterId, 'signed off');
  const { code } = await hold(world.teams[1].id);
  const { batch } = await getBatch(world.admin, { code });
  await releaseBatch(world.admin, { batchId: batch.id });
  await buildBundle(world.admin, { leagueId: world.league.id, batchId: batch.id });
  const next = await buildTeam(world.league, world.division, { players: [{}], state: 'signed off' });
  await hold(next.id);
  const elsewhere = await buildTeam(world.league, world.division, { players: [{}], state: 'signed off' });
  const other = await hold(elsewhere.id, (await buildShop(world.league)).id);
  await releaseBatch(world.admin, { batchId: (await getBatch(world.admin, other)).batch.id });
  await invitePerson(world.admin, {
    email: 'guest@club.example',
    role: 'team manager',
    teamIds: [world.teams[0].id],
    shop: null,
  });
  await invitePerson(world.admin, {
    email: 'press@club.example',
    role: 'decorator',
    teamIds: [],
    shop: { kind: 'existing', id: world.shop.id },
  });
  await importRoster(world.manager, {
    rosterId: world.teams[0].rosterId,
    revision: 1,
    mode: 'add',
    lines: [],
    decisions: [],
    refused: 0,
    remember: { signature: 'name', mapping: { headerRow: 1, columns: [{ field: 'name' }] } },
  });
  await saveDraft(world.admin, {
    ruleSetId: world.ruleSet.id,
    rowVersion: null,
    ruleSet: world.ruleSet.rules,
  });
  // What a sign-off would have written, so that this key points somewhere.
  await withLeague(world.league.id, (tx) =>
    tx
      .updateTable('rosters')
      .set({ rule_set_version_id: world.ruleSet.versionId })
      .where('id', '=', world.teams[1].rosterId)
      .execute(),
  );
  return { code, batchId: batch.id };
}

const countOf = async (table: string, leagueId: string): Promise<number> => {
  const [row] = await queryAsAdmin<{ n: number }>(
    `select count(*)::int as n from ${table} where league_id = $1`,
    [leagueId],
  );
  return row?.n ?? 0;
};

/** Everything stored of a league, as one hash per table. */
async function fingerprint(leagueId: string): Promise<Record<string, string | null>> {
  const result: Record<string, string | null> = {};
  for (const table of [...tables, 'leagues']) {
    const [row] = await queryAsAdmin<{ hash: string | null }>(
      `select md5(string_agg(t::text, '|' order by t::text)) as hash from ${table} t
       where ${table === 'leagues' ? 'id' : 'league_id'} = $1`,
      [leagueId],
    );
    result[table] = row?.hash ?? null;
  }
  return result;
}

/** Runs one statement in the intruder's own league and answers how many rows it met, or the SQLSTATE that refused it. */
const tryIn = async (league: FurnishedLeague, text: ReturnType<typeof sql>): Promise<Outcome> => {
  const run = async (tx: LeagueTx): Promise<Outcome> => {
    const result = await text.execute(tx);
    await sql`set constraints all immediate`.execute(tx);
    return { rows: Number(result.numAffectedRows ?? result.rows.length) };
  };
  return withLeague(league.league.id, run).catch((error: unknown) => ({
    refused: String((error as { code?: unknown }).code ?? error),
  }));
};

const notAllowed = { refused: '42501' };

beforeAll(async () => {
  [mine, theirs] = await buildWorld({ leagues: 2 });
  await fill(mine);
  released = await fill(theirs);
  tables = (
    await queryAsAdmin<{ name: string }>(
      `select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'league_id' order by 1`,
    )
  ).map((row) => row.name);
  keys = await queryAsAdmin<Key>(`
    select c.conrelid::regclass::text as table, c.conname as name, c.confrelid::regclass::text as target,
      array(select a.attname::text from unnest(c.conkey) with ordinality k(n, i) join pg_attribute a on a.attrelid = c.conrelid and a.attnum = k.n order by i) as columns,
      array(select a.attname::text from unnest(c.confkey) with ordinality k(n, i) join pg_attribute a on a.attrelid = c.confrelid and a.attnum = k.n order by i) as "targetColumns"
    from pg_constraint c where c.connamespace = 'public'::regnamespace and c.contype = 'f' order by 1, 2`);
});

describe('SQL as the runtime role, inside one league', () => {
  it('is tried on tables that all hold something of both leagues', async () => {
    expect(tables.length).toBeGreaterThanOrEqual(20);
    for (const table of tables) {
      for (const league of [mine, theirs]) {
        const rows = await countOf(table, league.league.id);
        expect([table, league.league.slug, rows > 0]).toEqual([table, league.league.slug, true]);
      }
    }
  });

  it('neither sees, changes, removes nor adds a row of the other, in any table', async () => {
    const before = await fingerprint(theirs.league.id);
    const id = theirs.league.id;
    for (const name of tables) {
      const table = sql.table(name);
      const [row] = await queryAsAdmin<{ line: string }>(
        `select to_json(t)::text as line from ${name} t where league_id = $1 limit 1`,
        [id],
      );
      const seen = await tryIn(mine, sql`select 1 from ${table} where league_id = ${id}`);
      const all = await tryIn(mine, sql`select 1 from ${table} where league_id <> ${mine.league.id}`);
      expect([name, seen, all]).toEqual([name, { rows: 0 }, { rows: 0 }]);
      for (const statement of [
        sql`update ${table} set league_id = league_id where league_id = ${id}`,
        sql`update ${table} set league_id = ${mine.league.id} where league_id = ${id}`,
        sql`delete from ${table} where league_id = ${id}`,
      ]) {
        const outcome = await tryIn(mine, statement);
        expect([{ rows: 0 }, notAllowed].map((good) => JSON.stringify(good))).toContain(
          JSON.stringify(outcome),
        );
      }
      const copied = await tryIn(
        mine,
        sql`insert into ${table} select * from json_populate_record(null::${table}, ${row?.line ?? ''}::json)`,
      );
      expect([name, copied]).toEqual([name, notAllowed]);
    }
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('pushes no row of its own over into the other', async () => {
    const before = await fingerprint(theirs.league.id);
    for (const name of tables) {
      const table = sql.table(name);
      const outcome = await tryIn(
        mine,
        sql`update ${table} set league_id = ${theirs.league.id} where ctid = (select ctid from ${table} limit 1)`,
      );
      // A sealed player and a kept version are held by their triggers before the policy is asked.
      expect([name, outcome]).toEqual([
        name,
        { refused: expect.stringMatching(/^(42501|23514)$/) as unknown },
      ]);
    }
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('points no row of its own at anything of the other, by any foreign key', async () => {
    const crossing = keys.filter((key) => tables.includes(key.target));
    expect(crossing.length).toBeGreaterThanOrEqual(25);
    const before = await fingerprint(mine.league.id);
    for (const key of crossing) {
      const own = key.columns.slice(1);
      const target = key.targetColumns.slice(1);
      const [aim] = await queryAsAdmin<Record<string, string>>(
        `select ${target.join(', ')} from ${key.target} where league_id = $1 limit 1`,
        [theirs.league.id],
      );
      const set = sql.join(
        own.map((column, i) => sql`${sql.ref(column)} = ${aim?.[target[i] ?? '']}`),
        sql`, `,
      );
      const filled = sql.join(
        own.map((column) => sql`${sql.ref(column)} is not null`),
        sql` and `,
      );
      const table = sql.table(key.table);
      const rows = await withLeague(
        mine.league.id,
        async (tx) =>
          (
            await sql<{ at: string }>`select ctid::text as at from ${table} where ${filled} limit 9`.execute(
              tx,
            )
          ).rows,
      );
      const outcomes: string[] = [];
      for (const { at } of rows) {
        const outcome = await tryIn(mine, sql`update ${table} set ${set} where ctid = ${at}::tid`);
        outcomes.push('refused' in outcome ? outcome.refused : `${outcome.rows} written`);
      }
      // What is kept for good is held by its trigger first (23514); some row must come as far as the key (23503).
      expect([key.table, key.name, [...new Set(outcomes)].sort()]).toEqual([
        key.table,
        key.name,
        outcomes.includes('23514') ? ['23503', '23514'] : ['23503'],
      ]);
    }
    expect(await fingerprint(mine.league.id)).toEqual(before);
  });

  it('reads and writes nothing at all of the other league’s own row, nor the accounts of its people', async () => {
    const id = theirs.league.id;
    expect(await tryIn(mine, sql`select 1 from leagues where id = ${id}`)).toEqual({ rows: 0 });
    expect(await tryIn(mine, sql`update leagues set name = 'Taken' where id = ${id}`)).toEqual({ rows: 0 });
    const stranger = theirs.members.manager.person.id;
    expect(await tryIn(mine, sql`select 1 from users where id = ${stranger}`)).toEqual({ rows: 0 });
    expect(await tryIn(mine, sql`update users set name = 'Taken' where id = ${stranger}`)).toEqual({
      rows: 0,
    });
  });
});

describe('a decorator who looks over all their leagues', () => {
  const see = (userId: string, table: string, where = sql`true`) =>
    withUser(userId, async (tx: UserTx) => {
      const { rows } = await sql<{ id: string }>`select * from ${sql.table(table)} where ${where}`.execute(
        tx,
      );
      return rows;
    });

  it('sees the released batches of their own shop and the bundles of those, never a held one', async () => {
    const decorator = theirs.members.decorator.person.id;
    const inTheirs = sql`league_id = ${theirs.league.id}`;
    expect((await see(decorator, 'batches', inTheirs)).map((row) => row.id)).toEqual([released.batchId]);
    expect(await see(decorator, 'bundles', inTheirs)).toMatchObject([{ batch_id: released.batchId }]);
    expect(await see(decorator, 'batches', sql`state = 'held'`)).toEqual([]);
    expect(await see(decorator, 'batches')).toHaveLength(2);
  });

  it('sees no other table of any league but seasons and their own memberships', async () => {
    const decorator = theirs.members.decorator.person.id;
    const open = new Set(['batches', 'bundles', 'memberships', 'seasons']);
    for (const table of tables.filter((name) => !open.has(name))) {
      expect([table, await see(decorator, table)]).toEqual([table, []]);
    }
    for (const row of await see(decorator, 'memberships')) expect(row).toMatchObject({ user_id: decorator });
  });

  it('writes nothing that way', async () => {
    const decorator = theirs.members.decorator.person.id;
    const before = await fingerprint(theirs.league.id);
    for (const table of ['batches', 'bundles', 'memberships', 'seasons']) {
      const met = await withUser(decorator, (tx) =>
        sql`update ${sql.table(table)} set league_id = league_id`.execute(tx),
      );
      expect([table, met.numAffectedRows]).toEqual([table, 0n]);
    }
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('sees nothing of a league from the moment their membership there ends, and still the rest', async () => {
    const decorator = theirs.members.decorator.person.id;
    await endRole(theirs.admin, { membershipId: theirs.members.decorator.id });
    for (const table of ['batches', 'bundles', 'seasons']) {
      const rows = await see(decorator, table);
      expect([table, rows.length > 0]).toEqual([table, true]);
      for (const row of rows) expect(row).toMatchObject({ league_id: mine.league.id });
    }
  });

  it('sees nothing as somebody who works for another shop, or for none', async () => {
    const shop = await buildShop(theirs.league);
    const other = await buildMember(theirs.league, 'decorator', { shopId: shop.id });
    for (const userId of [other.person.id, theirs.members.referee.person.id]) {
      expect(await see(userId, 'batches')).toEqual([]);
      expect(await see(userId, 'bundles')).toEqual([]);
    }
  });
});
