import { findSeasonBySlug } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { notFound } from '@/lib/platform/errors';
import type { ActorContext } from '../context';

/** The dates of a season; everybody who belongs to the league may know them. */
export async function getSeason(ctx: ActorContext, input: { season: string }) {
  const season = await withLeague(ctx.league.id, (tx) => findSeasonBySlug(tx, input.season));
  if (!season) throw notFound('season');
  return { season, mayChange: can(ctx.actor, 'season.write') };
}
