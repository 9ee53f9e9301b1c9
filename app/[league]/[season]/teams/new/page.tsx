import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { notFound } from '@/lib/platform/errors';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { TeamForm } from '../_components/team-form';
import { addTeamAction } from '../actions';

export const metadata: Metadata = { title: 'Add a team' };

export default async function NewTeamPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.newTeam(league, season));
  const { divisions, mayChange } = await showNotFound(listTeams(ctx, { season }));
  if (!mayChange) return showNotFound(Promise.reject(notFound('page')));
  return (
    <>
      <PageHeader title="Add a team" back={<BackLink href={paths.teams(league, season)}>Teams</BackLink>} />
      <TeamForm
        league={league}
        season={season}
        divisions={divisions}
        team={null}
        start={{
          name: '',
          divisionId: divisions.length === 1 ? (divisions[0]?.id ?? '') : '',
          home: { name: 'navy', body: '#14375e', sleeves: '#14375e', number: '#ffffff', outline: null },
          away: { name: 'white', body: '#ffffff', sleeves: '#ffffff', number: '#14375e', outline: null },
        }}
        onAdd={addTeamAction}
        onChange={null}
      />
    </>
  );
}
