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
