import { sql } from 'kysely';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import type { BatchState } from '@/lib/domain/batch/batch-state';
import type { LeagueTx, UserTx } from '../tenant';

export type BatchRow = {
  id: string;
  code: string;
  state: BatchState;
  seasonId: string;
  shop: { id: string; name: string };
  promisedOn: string | null;
  createdAt: Date;
  releasedAt: Date | null;
  rowVersion: number;
};

const readBatches = (tx: LeagueTx) =>
  tx
    .selectFrom('batches as b')
    .innerJoin('shops as s', (join) =>
      join.onRef('s.league_id', '=', 'b.league_id').onRef('s.id', '=', 'b.shop_id'),
    )
    .select([
      'b.id',
      'b.code',
      'b.state',
      'b.season_id',
      'b.shop_id',
      's.name as shop_name',
      'b.promised_on',
      'b.created_at',
      'b.released_at',
      'b.row_version',
    ])
    .where('b.league_id', '=', tx.leagueId);

type RawBatch = Awaited<ReturnType<ReturnType<typeof readBatches>['executeTakeFirstOrThrow']>>;

const toBatchRow = (row: RawBatch): BatchRow => ({
  id: row.id,
  code: row.code,
  state: row.state,
  seasonId: row.season_id,
  shop: { id: row.shop_id, name: row.shop_name },
  promisedOn: row.promised_on,
  createdAt: row.created_at,
  releasedAt: row.released_at,
  rowVersion: row.row_version,
});

/** The batches of a season with how many teams and players each holds, newest first. */
export async function listBatches(tx: LeagueTx, seasonId: string) {
  const rows = await readBatches(tx)
    .select((eb) => [
      eb
        .selectFrom('batch_teams as bt')
        .whereRef('bt.league_id', '=', 'b.league_id')
        .whereRef('bt.batch_id', '=', 'b.id')
        .select((inner) => inner.fn.countAll<number>().as('n'))
        .as('teams'),
      eb
        .selectFrom('batch_teams as bt')
        .innerJoin('players as p', (join) =>
          join.onRef('p.league_id', '=', 'bt.league_id').onRef('p.roster_id', '=', 'bt.roster_id'),
        )
        .whereRef('bt.league_id', '=', 'b.league_id')
        .whereRef('bt.batch_id', '=', 'b.id')
        .select((inner) => inner.fn.countAll<number>().as('n'))
        .as('players'),
    ])
    .where('b.season_id', '=', seasonId)
    .orderBy('b.number', 'desc')
    .execute();
  return rows.map((row) => ({ ...toBatchRow(row), teams: row.teams ?? 0, players: row.players ?? 0 }));
}

/** The batch with this code (upper or lower case); undefined when the league has none. */
export async function findBatch(tx: LeagueTx, code: string): Promise<BatchRow | undefined> {
  const row = await readBatches(tx).where('b.code', '=', code.toUpperCase()).executeTakeFirst();
  return row && toBatchRow(row);
}

/** The batch with this id; undefined when the league has none. */
export async function findBatchById(tx: LeagueTx, batchId: string): Promise<BatchRow | undefined> {
  const row = await readBatches(tx).where('b.id', '=', batchId).executeTakeFirst();
  return row && toBatchRow(row);
}

/** Locks the batch against any other change until the transaction ends; undefined when there is none. */
export async function lockBatch(tx: LeagueTx, batchId: string): Promise<BatchRow | undefined> {
  await tx
    .selectFrom('batches')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', batchId)
    .forNoKeyUpdate()
    .execute();
  return findBatchById(tx, batchId);
}

/** Makes a held batch with the league's next number, never given before, and answers its code, such as B-07. */
export async function insertBatch(
  tx: LeagueTx,
  batch: {
    id: string;
    seasonId: string;
    shopId: string;
    promisedOn: string | null;
    now: Date;
    userId: string;
  },
): Promise<string> {
  // One statement reads and writes the league's row, so that two batches made at the same moment wait for each other.
  const { last_batch_number: number } = await tx
    .updateTable('leagues')
    .set((eb) => ({
      last_batch_number: sql<number>`greatest(last_batch_number, ${eb
        .selectFrom('batches')
        .select((inner) => inner.fn.coalesce(inner.fn.max('number'), sql<number>`0`).as('last'))
        .where('league_id', '=', tx.leagueId)}) + 1`,
    }))
    .where('id', '=', tx.leagueId)
    .returning('last_batch_number')
    .executeTakeFirstOrThrow();
  const code = `B-${String(number).padStart(2, '0')}`;
  await tx
    .insertInto('batches')
    .values({
      league_id: tx.leagueId,
      id: batch.id,
      number,
      code,
      season_id: batch.seasonId,
      shop_id: batch.shopId,
      state: 'held',
      promised_on: batch.promisedOn,
      created_at: batch.now,
      created_by: batch.userId,
    })
    .execute();
  return code;
}

/** Puts exactly these rosters into a held batch. A roster that another batch holds breaks a unique constraint. */
export async function replaceBatchRosters(
  tx: LeagueTx,
  batchId: string,
  rosterIds: readonly string[],
): Promise<void> {
  await tx
    .deleteFrom('batch_teams')
    .where('league_id', '=', tx.leagueId)
    .where('batch_id', '=', batchId)
    .execute();
  if (rosterIds.length === 0) return;
  await tx
    .insertInto('batch_teams')
    .values(rosterIds.map((roster_id) => ({ league_id: tx.leagueId, batch_id: batchId, roster_id })))
    .execute();
}

const readBatchRosters = (tx: LeagueTx, batchId: string) =>
  tx
    .selectFrom('batch_teams as bt')
    .innerJoin('rosters as r', (join) =>
      join.onRef('r.league_id', '=', 'bt.league_id').onRef('r.id', '=', 'bt.roster_id'),
    )
    .innerJoin('teams as t', (join) =>
      join.onRef('t.league_id', '=', 'r.league_id').onRef('t.id', '=', 'r.team_id'),
    )
    .select(['r.id as rosterId', 'r.state', 't.id as teamId', 't.name as team'])
    .where('bt.league_id', '=', tx.leagueId)
    .where('bt.batch_id', '=', batchId)
    .orderBy('t.name');

/** The rosters a batch holds, by team name. */
export const listBatchRosters = (tx: LeagueTx, batchId: string) => readBatchRosters(tx, batchId).execute();

/** The rosters a batch holds, locked against changes of state until the transaction ends. The batch is locked already. */
export async function lockBatchRosters(tx: LeagueTx, batchId: string) {
  const held = await listBatchRosters(tx, batchId);
  await lockRostersOfTeams(
    tx,
    held.map((roster) => roster.teamId),
  );
  return listBatchRosters(tx, batchId);
}

/** Changes the shop or the promised day of a held batch; false when the row version is no longer the given one. */
export async function updateHeldBatch(
  tx: LeagueTx,
  batch: { id: string; rowVersion: number; shopId: string; promisedOn: string | null },
): Promise<boolean> {
  const result = await tx
    .updateTable('batches')
    .set({ shop_id: batch.shopId, promised_on: batch.promisedOn, row_version: batch.rowVersion + 1 })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', batch.id)
    .where('row_version', '=', batch.rowVersion)
    .executeTakeFirst();
  return result.numUpdatedRows === 1n;
}

/** Removes a held batch; its rosters are free again. */
export async function deleteBatch(tx: LeagueTx, batchId: string): Promise<void> {
  await tx
    .deleteFrom('batches')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', batchId)
    .where('state', '=', 'held')
    .execute();
}

/** Moves a batch to a state and notes when and by whom; a release brings its snapshot along. */
export async function updateBatchState(
  tx: LeagueTx,
  step: {
    batchId: string;
    eventId: string;
    state: BatchState;
    now: Date;
    userId: string;
    note: string;
    release?: { snapshotJson: string; sha256: string };
  },
): Promise<void> {
  await tx
    .updateTable('batches')
    .set((eb) => ({
      state: step.state,
      row_version: eb('row_version', '+', 1),
      ...(step.release && {
        snapshot: step.release.snapshotJson,
        snapshot_sha256: step.release.sha256,
        released_at: step.now,
      }),
    }))
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', step.batchId)
    .execute();
  await tx
    .insertInto('batch_events')
    .values({
      league_id: tx.leagueId,
      id: step.eventId,
      batch_id: step.batchId,
      state: step.state,
      at: step.now,
      user_id: step.userId,
      note: step.note,
    })
    .execute();
}

/** When the batch came into each state, oldest first. */
export async function listBatchEvents(tx: LeagueTx, batchId: string) {
  return tx
    .selectFrom('batch_events as e')
    .leftJoin('users as u', 'u.id', 'e.user_id')
    .select(['e.state', 'e.at', 'e.note', 'u.name as by'])
    .where('e.league_id', '=', tx.leagueId)
    .where('e.batch_id', '=', batchId)
    .orderBy('e.at')
    .execute();
}

/** What a released batch holds; undefined while it is held. */
export async function findSnapshot(
  tx: LeagueTx,
  batchId: string,
): Promise<{ snapshot: BatchSnapshot; sha256: string } | undefined> {
  const row = await tx
    .selectFrom('batches')
    .select(['snapshot', 'snapshot_sha256'])
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', batchId)
    .executeTakeFirst();
  if (!row?.snapshot || row.snapshot_sha256 === null) return undefined;
  return { snapshot: row.snapshot, sha256: row.snapshot_sha256 };
}

/** The shops of a league by name. */
export function listShops(tx: LeagueTx) {
  return tx
    .selectFrom('shops')
    .select(['id', 'name'])
    .where('league_id', '=', tx.leagueId)
    .orderBy('name')
    .execute();
}

/** The addresses of those who work for a shop now, to tell them of a release. */
export function listShopAddresses(tx: LeagueTx, shopId: string) {
  return tx
    .selectFrom('memberships as m')
    .innerJoin('users as u', 'u.id', 'm.user_id')
    .select(['u.email'])
    .where('m.league_id', '=', tx.leagueId)
    .where('m.shop_id', '=', shopId)
    .where('m.ended_at', 'is', null)
    .orderBy('u.email')
    .execute();
}

/** Released batches of every shop the person works for, over all leagues, with the state of each bundle. */
export async function listBatchesOfMyShops(tx: UserTx) {
  return tx
    .selectFrom('batches as b')
    .innerJoin('leagues as l', 'l.id', 'b.league_id')
    .leftJoin('bundles as z', (join) =>
      join.onRef('z.league_id', '=', 'b.league_id').onRef('z.batch_id', '=', 'b.id'),
    )
    .select([
      'b.id',
      'b.code',
      'b.state',
      'b.promised_on as promisedOn',
      'b.released_at as releasedAt',
      'l.slug as leagueSlug',
      'l.name as leagueName',
      'l.time_zone as timeZone',
      'z.state as bundleState',
      'z.done',
      'z.total',
      // Names come from the snapshot: other tables of a league are closed to a view over leagues.
      sql<number>`jsonb_array_length(b.snapshot -> 'teams')`.as('teams'),
      sql<string>`b.snapshot -> 'batch' ->> 'shop'`.as('shop'),
    ])
    .where('b.state', '!=', 'held')
    .orderBy('b.released_at', 'desc')
    .execute();
}

/** Locks the rosters of these teams against changes of state until the transaction ends, always in the same order. */
export async function lockRostersOfTeams(tx: LeagueTx, teamIds: readonly string[]): Promise<void> {
  if (teamIds.length === 0) return;
  await tx
    .selectFrom('rosters')
    .select('id')
    .where('league_id', '=', tx.leagueId)
    .where('team_id', 'in', [...teamIds])
    .orderBy('id')
    .forNoKeyUpdate()
    .execute();
}

/** Freezes those of the given rosters that are signed off. */
export async function freezeRosters(tx: LeagueTx, rosterIds: readonly string[], now: Date): Promise<void> {
  await tx
    .updateTable('rosters')
    .set({ state: 'frozen', frozen_at: now })
    .where('league_id', '=', tx.leagueId)
    .where('id', 'in', [...rosterIds])
    .where('state', '=', 'signed off')
    .execute();
}
