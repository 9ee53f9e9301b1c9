import { notFound } from 'next/navigation';
import type { ReactNode } from 'react';
import { listSeasonLinks } from '@/lib/use-cases/seasons/list-season-links';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';

type Props = { params: Promise<{ league: string; season: string }>; children: ReactNode };

/** A season that the league does not have is a page that does not exist, whatever stands after it. */
export default async function SeasonLayout({ params, children }: Props) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.league(league));
  const seasons = await listSeasonLinks(ctx);
  if (!seasons.some(({ slug }) => slug === season)) notFound();
  return children;
}
