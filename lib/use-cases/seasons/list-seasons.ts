import { listSeasons as readSeasons } from '@/db/queries/season-view';
import { countBySeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { assertCan, type ActorContext } from '../context';

/** The seasons of the league, latest first, with how much each holds and which one people work in. */
export async function listSeasons(ctx: ActorContext) {
  assertCan(ctx.actor, 'season.write');
  return withLeague(ctx.league.id, async (tx) => {
    const counts = await countBySeason(tx);
    return (await readSeasons(tx)).map((season) => ({
      ...season,
      isCurrent: season.id === ctx.league.currentSeason?.id,
      ...(counts.get(season.id) ?? { divisions: 0, teams: 0, frozen: 0 }),
    }));
  });
}
