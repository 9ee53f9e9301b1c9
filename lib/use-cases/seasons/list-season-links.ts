import { listSeasons } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import type { ActorContext } from '../context';

/** The seasons of the league by name, for the way from one to another: whoever belongs to the league may know them. */
export async function listSeasonLinks(ctx: ActorContext): Promise<{ slug: string; name: string }[]> {
  const seasons = await withLeague(ctx.league.id, listSeasons);
  return seasons.map(({ slug, name }) => ({ slug, name }));
}
