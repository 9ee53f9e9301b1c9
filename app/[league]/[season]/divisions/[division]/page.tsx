import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { formatInstant } from '@/lib/domain/dates/format';
import { toLocalInput } from '@/lib/domain/dates/zone';
import { countOf } from '@/lib/domain/text/count-of';
import { notFound } from '@/lib/platform/errors';
import { getDivisionForm } from '@/lib/use-cases/divisions/list-divisions';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { DivisionForm } from '../_components/division-form';
import { changeDivisionAction, removeDivisionAction } from '../actions';

export const metadata: Metadata = { title: 'Change a division' };

type Props = { params: Promise<{ league: string; season: string; division: string }> };

export default async function DivisionPage({ params }: Props) {
  const { league, season, division: slug } = await params;
  const { ctx } = await requireLeague(league, paths.division(league, season, slug));
  const found = await showNotFound(getDivisionForm(ctx, { season, division: slug }));
  const { ruleSets, division, teams, season: dates } = found;
  if (!division) return showNotFound(Promise.reject(notFound('division')));
  return (
    <>
      <PageHeader
        title={division.name}
        subtitle={`${countOf(teams, 'team')}. A change of rules or limits is checked against every roster at once.`}
        back={<BackLink href={paths.divisions(league, season)}>Divisions</BackLink>}
      />
      <DivisionForm
        key={division.rowVersion}
        league={league}
        season={season}
        ruleSets={ruleSets}
        seasonFreezes={formatInstant(dates.freezesAt, ctx.league.timeZone)}
        division={{ id: division.id, name: division.name, rowVersion: division.rowVersion, teams }}
        start={{
          name: division.name,
          ageBand: division.ageBand,
          level: division.level,
          ruleSetId: division.ruleSetId,
          leastPlayers: String(division.leastPlayers),
          mostPlayers: String(division.mostPlayers),
          freezesAt: division.ownFreezesAt ? toLocalInput(division.ownFreezesAt, ctx.league.timeZone) : '',
          garments: division.garments,
        }}
        onAdd={null}
        onChange={changeDivisionAction}
        onRemove={removeDivisionAction}
      />
    </>
  );
}
