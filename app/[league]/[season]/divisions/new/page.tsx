import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { formatInstant } from '@/lib/domain/dates/format';
import { starterKits } from '@/lib/domain/kit/starter-kits';
import { getDivisionForm } from '@/lib/use-cases/divisions/list-divisions';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { DivisionForm } from '../_components/division-form';
import { addDivisionAction } from '../actions';

export const metadata: Metadata = { title: 'Add a division' };

export default async function NewDivisionPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.newDivision(league, season));
  const { ruleSets, season: dates } = await showNotFound(getDivisionForm(ctx, { season, division: null }));
  return (
    <>
      <PageHeader
        title="Add a division"
        back={<BackLink href={paths.divisions(league, season)}>Divisions</BackLink>}
      />
      <DivisionForm
        league={league}
        season={season}
        ruleSets={ruleSets}
        seasonFreezes={formatInstant(dates.freezesAt, ctx.league.timeZone)}
        division={null}
        start={{
          name: '',
          ageBand: '',
          level: '',
          ruleSetId: ruleSets.length === 1 ? (ruleSets[0]?.id ?? '') : '',
          leastPlayers: '8',
          mostPlayers: '15',
          freezesAt: '',
          garments: [...(starterKits[0]?.garments ?? [])],
        }}
        onAdd={addDivisionAction}
        onChange={null}
        onRemove={null}
      />
    </>
  );
}
