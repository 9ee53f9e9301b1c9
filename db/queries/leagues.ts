import type { LeagueTx } from '../tenant';

/** The league of this transaction by name and address; undefined when there is none with that id. */
export async function findLeagueName(
  tx: LeagueTx,
): Promise<{ name: string; slug: string; timeZone: string } | undefined> {
  const row = await tx
    .selectFrom('leagues')
    .select(['name', 'slug', 'time_zone'])
    .where('id', '=', tx.leagueId)
    .executeTakeFirst();
  return row && { name: row.name, slug: row.slug, timeZone: row.time_zone };
}

/** What a league admin can set. `shipTo` is an address on several lines, empty when there is none. */
export type LeagueFields = {
  name: string;
  timeZone: string;
  unit: 'in' | 'mm';
  paper: 'A4' | 'Letter';
  currency: string;
  contactEmail: string | null;
  shipTo: string;
};

const toColumns = (fields: LeagueFields) => ({
  name: fields.name,
  time_zone: fields.timeZone,
  unit: fields.unit,
  paper: fields.paper,
  currency: fields.currency,
  contact_email: fields.contactEmail,
  ship_to: fields.shipTo,
});

/** The settings of this transaction's league with their row version; undefined when the league is gone. */
export async function findLeagueSettings(
  tx: LeagueTx,
): Promise<(LeagueFields & { rowVersion: number }) | undefined> {
  const row = await tx.selectFrom('leagues').selectAll().where('id', '=', tx.leagueId).executeTakeFirst();
  return (
    row && {
      name: row.name,
      timeZone: row.time_zone,
      unit: row.unit,
      paper: row.paper,
      currency: row.currency,
      contactEmail: row.contact_email,
      shipTo: row.ship_to,
      rowVersion: row.row_version,
    }
  );
}

/** Rewrites the settings; false when somebody changed them since `rowVersion`. */
export async function updateLeague(
  tx: LeagueTx,
  fields: LeagueFields & { rowVersion: number },
): Promise<boolean> {
  const done = await tx
    .updateTable('leagues')
    .set({ ...toColumns(fields), row_version: fields.rowVersion + 1 })
    .where('id', '=', tx.leagueId)
    .where('row_version', '=', fields.rowVersion)
    .executeTakeFirst();
  return done.numUpdatedRows === 1n;
}

/**
 * Adds the league of this transaction under the address `slug`; false, and nothing is written, when any league of the
 * installation has that address (which this transaction can't see).
 */
export async function insertLeague(
  tx: LeagueTx,
  league: LeagueFields & { slug: string; now: Date },
): Promise<boolean> {
  const done = await tx
    .insertInto('leagues')
    .values({ id: tx.leagueId, slug: league.slug, created_at: league.now, ...toColumns(league) })
    .onConflict((conflict) => conflict.column('slug').doNothing())
    .executeTakeFirst();
  return done.numInsertedOrUpdatedRows === 1n;
}
