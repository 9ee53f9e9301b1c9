import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { countOf } from '@/lib/domain/text/count-of';
import { notFound } from '@/lib/platform/errors';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { TeamForm } from '../_components/team-form';
import { changeTeamAction } from '../actions';

export const metadata: Metadata = { title: 'Change a team' };

type Props = { params: Promise<{ league: string; season: string; team: string }> };

export default async function TeamPage({ params }: Props) {
  const { league, season, team: slug } = await params;
  const { ctx } = await requireLeague(league, paths.team(league, season, slug));
  const { divisions, teams, mayChange } = await showNotFound(listTeams(ctx, { season }));
  const team = teams.find((entry) => entry.slug === slug);
  if (!mayChange || !team) return showNotFound(Promise.reject(notFound('team')));
  return (
    <>
      <PageHeader
        title={team.name}
        subtitle={`${team.division}, ${countOf(team.players, 'player')}, ${countOf(team.managers, 'manager')}.`}
        picture={<YokeTile kit={team.kits.home} number="12" size="lg" />}
        back={<BackLink href={paths.teams(league, season)}>Teams</BackLink>}
        actions={<ButtonLink href={paths.roster(league, season, slug)}>Open the roster</ButtonLink>}
      />
      <TeamForm
        key={team.rowVersion}
        league={league}
        season={season}
        divisions={divisions}
        team={{ id: team.id, rowVersion: team.rowVersion }}
        start={{ name: team.name, divisionId: team.divisionId, ...team.kits }}
        onAdd={null}
        onChange={changeTeamAction}
      />
    </>
  );
}
