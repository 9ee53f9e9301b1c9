import type { Metadata } from 'next';
import { ButtonLink, DownloadLink } from '@/components/ui/button';
import { PageHeader } from '@/components/ui/page-header';
import { countOf } from '@/lib/domain/text/count-of';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { TeamsTable } from './_components/teams-table';
import { removeTeamAction } from './actions';

export const metadata: Metadata = { title: 'Teams' };

export default async function TeamsPage({ params }: { params: Promise<{ league: string; season: string }> }) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.teams(league, season));
  const list = await showNotFound(listTeams(ctx, { season }));
  return (
    <>
      <PageHeader
        title="Teams"
        subtitle={`${countOf(list.teams.length, 'team')} in ${countOf(list.divisions.length, 'division')}.`}
        actions={
          <>
            {list.teams.length > 0 && (
              <DownloadLink href={paths.api.teamsCsv(league, season)}>Export</DownloadLink>
            )}
            {list.mayChange && (
              <>
                <ButtonLink href={paths.importTeams(league, season)}>Import teams</ButtonLink>
                <ButtonLink look="primary" href={paths.newTeam(league, season)}>
                  Add a team
                </ButtonLink>
              </>
            )}
          </>
        }
      />
      <TeamsTable league={league} season={season} list={list} onRemove={removeTeamAction} />
    </>
  );
}
