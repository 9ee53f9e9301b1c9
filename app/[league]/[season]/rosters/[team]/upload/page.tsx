import type { Metadata } from 'next';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { ButtonLink } from '@/components/ui/button';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { isRosterEditable } from '@/lib/domain/roster/roster-state';
import { getRoster } from '@/lib/use-cases/rosters/get-roster';
import { listMappings } from '@/lib/use-cases/rosters/list-mappings';
import { countOf } from '@/lib/domain/text/count-of';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { importRosterAction } from '../actions';
import { UploadRoster } from './_components/upload-roster';

export const metadata: Metadata = { title: 'Add players from a file' };

type Props = { params: Promise<{ league: string; season: string; team: string }> };

export default async function UploadPage({ params }: Props) {
  const { league, season, team } = await params;
  const { ctx } = await requireLeague(league, paths.uploadRoster(league, season, team));
  const roster = await showNotFound(getRoster(ctx, { season, team }));
  const back = paths.roster(league, season, team);
  const open = roster.may.edit && isRosterEditable(roster.state);
  return (
    <>
      <PageHeader
        title="Add players from a file"
        subtitle={`${roster.team.name}, ${roster.division.name}: ${countOf(roster.players.length, 'player')} now.`}
        picture={<YokeTile kit={roster.team.kits.home} number="12" size="lg" />}
        back={<BackLink href={back}>Roster of {roster.team.name}</BackLink>}
      />
      {open ? (
        <UploadRoster
          league={league}
          path={back}
          roster={{
            id: roster.id,
            revision: roster.revision,
            players: roster.players.map((player, position) => ({ ...player, position })),
            garments: roster.garments,
            ruleSet: roster.rules?.ruleSet ?? null,
          }}
          kept={await showNotFound(listMappings(ctx, { rosterId: roster.id }))}
          readUrl={`${paths.api.roster(league, roster.id)}/read-file`}
          onImport={importRosterAction}
        />
      ) : (
        <Card>
          <EmptyState
            title={`This roster is ${roster.state}`}
            action={<ButtonLink href={back}>Back to the roster</ButtonLink>}
          >
            Players can only be added while it is open or returned.
          </EmptyState>
        </Card>
      )}
    </>
  );
}
