import type { LeagueTx } from '../tenant';
import type { SeasonFields } from './seasons';

/** A season as the pages use it; dates without a time are calendar days (YYYY-MM-DD) in the league's time zone. */
export type Season = SeasonFields & { id: string; slug: string; rowVersion: number };

/** Every season of the league, the latest first match first. */
export async function listSeasons(tx: LeagueTx): Promise<Season[]> {
  const rows = await tx
    .selectFrom('seasons')
    .selectAll()
    .where('league_id', '=', tx.leagueId)
    .orderBy('first_match_on', 'desc')
    .orderBy('name')
    .execute();
  return rows.map((row) => ({
    id: row.id,
    slug: row.slug,
    name: row.name,
    sport: row.sport,
    rosterOpensOn: row.roster_opens_on,
    freezesAt: row.freezes_at,
    releaseOn: row.release_on,
    handOutOn: row.hand_out_on,
    firstMatchOn: row.first_match_on,
    rowVersion: row.row_version,
  }));
}

/** The season with this slug; undefined when the league has none. */
export async function findSeasonBySlug(tx: LeagueTx, slug: string): Promise<Season | undefined> {
  return (await listSeasons(tx)).find((season) => season.slug === slug);
}
