import { redirect } from 'next/navigation';
import { can } from '@/lib/domain/access/permissions';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';

type Props = { params: Promise<{ league: string }> };

/** The address of a league alone leads to the page its reader most likely came for. */
export default async function LeaguePage({ params }: Props) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.league(league));
  const season = ctx.league.currentSeason?.slug;
  if (season !== undefined && can(ctx.actor, 'readiness.read')) redirect(paths.readiness(league, season));
  if (season === undefined && can(ctx.actor, 'season.write')) redirect(paths.newSeason(league));
  if (season !== undefined && can(ctx.actor, 'match.check')) redirect(paths.matchCheck(league, season));
  redirect(can(ctx.actor, 'batch.read') ? paths.shop() : paths.leagues());
}
