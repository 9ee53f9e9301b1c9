import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { notFound } from '@/lib/platform/errors';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { importTeamsAction, readTeamFileAction } from '../actions';
import { ImportTeams } from './_components/import-teams';

export const metadata: Metadata = { title: 'Import teams' };

export default async function ImportTeamsPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.importTeams(league, season));
  const { divisions, teams, mayChange } = await showNotFound(listTeams(ctx, { season }));
  if (!mayChange) return showNotFound(Promise.reject(notFound('page')));
  return (
    <>
      <PageHeader
        title="Import teams"
        subtitle="One team a row, with its division and colours. Nothing changes until you have seen what it would do."
        back={<BackLink href={paths.teams(league, season)}>Teams</BackLink>}
      />
      <ImportTeams
        league={league}
        season={season}
        divisions={divisions}
        known={teams.map(({ name, divisionId, kits }) => ({ name, divisionId, kits }))}
        onRead={readTeamFileAction}
        onImport={importTeamsAction}
      />
    </>
  );
}
