import { sql } from 'kysely';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import type { PlayerWrites } from '@/lib/domain/roster/list-player-writes';
import type { LeagueTx } from '../tenant';

/** A player of a roster with who last changed them; null for the program or nobody yet. */
export type StoredEntry = RosterEntry & { position: number; changedBy: string | null; changedAt: Date };

/** The players of a roster in their order. */
export async function listPlayers(tx: LeagueTx, rosterId: string): Promise<StoredEntry[]> {
  const rows = await tx
    .selectFrom('players as p')
    .leftJoin('users as u', 'u.id', 'p.updated_by')
    .select([
      'p.id',
      'p.position',
      'p.name',
      'p.name_on_back',
      'p.number',
      'p.role',
      'p.sizes',
      'p.extra',
      'p.updated_at',
      'u.name as editor',
    ])
    .where('p.league_id', '=', tx.leagueId)
    .where('p.roster_id', '=', rosterId)
    .orderBy('p.position')
    .orderBy('p.id')
    .execute();
  return rows.map((row) => ({
    id: row.id,
    position: row.position,
    name: row.name,
    nameOnBack: row.name_on_back,
    number: row.number,
    role: row.role,
    sizes: row.sizes,
    extra: row.extra,
    changedBy: row.editor,
    changedAt: row.updated_at,
  }));
}

const toColumns = (player: RosterEntry) => ({
  name: player.name,
  name_on_back: player.nameOnBack,
  number: player.number,
  role: player.role,
  sizes: JSON.stringify(player.sizes),
  extra: JSON.stringify(player.extra),
});

/**
 * Writes what changed in the list of players of a locked roster. False when a new player's id is taken by a player of
 * another roster, which no honest screen does; the transaction can then only be given up.
 */
export async function writePlayers(
  tx: LeagueTx,
  rosterId: string,
  writes: PlayerWrites,
  by: { now: Date; userId: string },
): Promise<boolean> {
  const stamp = { updated_at: by.now, updated_by: by.userId };
  if (writes.removed.length > 0) {
    await tx
      .deleteFrom('players')
      .where('league_id', '=', tx.leagueId)
      .where('roster_id', '=', rosterId)
      .where('id', 'in', writes.removed)
      .execute();
  }
  for (const player of writes.changed) {
    await tx
      .updateTable('players')
      .set({ ...toColumns(player), ...stamp })
      .where('league_id', '=', tx.leagueId)
      .where('roster_id', '=', rosterId)
      .where('id', '=', player.id)
      .execute();
  }
  if (writes.moved.length > 0) {
    await sql`
      update players set position = place.position
      from unnest(${writes.moved.map(({ id }) => id)}::uuid[], ${writes.moved.map(({ position }) => position)}::int[])
        as place (id, position)
      where players.league_id = ${tx.leagueId} and players.roster_id = ${rosterId} and players.id = place.id
    `.execute(tx);
  }
  if (writes.added.length === 0) return true;
  const inserted = await tx
    .insertInto('players')
    .values(
      writes.added.map(({ player, position }) => ({
        league_id: tx.leagueId,
        id: player.id,
        roster_id: rosterId,
        position,
        ...toColumns(player),
        number_key: null,
        ...stamp,
      })),
    )
    .onConflict((conflict) => conflict.doNothing())
    .returning('id')
    .execute();
  return inserted.length === writes.added.length;
}

/** Keeps the key by which each player's number is told from the others of a roster; null where it may repeat. */
export async function setNumberKeys(
  tx: LeagueTx,
  rosterId: string,
  keys: readonly { id: string; key: string | null }[],
): Promise<void> {
  await sql`
    update players set number_key = keyed.key
    from unnest(${keys.map(({ id }) => id)}::uuid[], ${keys.map(({ key }) => key)}::text[]) as keyed (id, key)
    where players.league_id = ${tx.leagueId} and players.roster_id = ${rosterId} and players.id = keyed.id
  `.execute(tx);
}
