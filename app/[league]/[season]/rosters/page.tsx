import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { countOf } from '@/lib/domain/text/count-of';
import { listReadiness } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { RostersTable } from './_components/rosters-table';

export const metadata: Metadata = { title: 'Rosters' };

export default async function RostersPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.rosters(league, season));
  const { teams } = await showNotFound(listReadiness(ctx, { season }));
  const players = teams.reduce((sum, team) => sum + team.players, 0);
  return (
    <>
      <PageHeader
        title="Rosters"
        subtitle={`${countOf(teams.length, 'roster')}, ${countOf(players, 'player')}.`}
      />
      <RostersTable league={league} season={season} teams={teams} />
    </>
  );
}
