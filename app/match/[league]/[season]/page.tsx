import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { checkMatch } from '@/lib/use-cases/match/check-match';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { MatchChoice } from './_components/match-choice';
import { MatchReport } from './_components/match-report';

export const metadata: Metadata = { title: 'Match check' };

type Props = {
  params: Promise<{ league: string; season: string }>;
  searchParams: Promise<{ division?: string; home?: string; away?: string }>;
};

export default async function MatchCheckPage({ params, searchParams }: Props) {
  const { league, season } = await params;
  const { division = null, home = null, away = null } = await searchParams;
  const { ctx } = await requireLeague(league, paths.matchCheck(league, season));
  const { choice, match } = await showNotFound(checkMatch(ctx, { season, division, home, away }));
  return (
    <div className="mx-auto max-w-240">
      <PageHeader title="Match check" subtitle={`${ctx.league.name}, ${choice.season.name}`} />
      <MatchChoice choice={choice} path={paths.matchCheck(league, season)} />
      {match && <MatchReport match={match} />}
    </div>
  );
}
