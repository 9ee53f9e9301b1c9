import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { suggestSeasonDays } from '@/lib/domain/dates/list-season-faults';
import { toDay } from '@/lib/domain/dates/zone';
import { listSeasons } from '@/lib/use-cases/seasons/list-seasons';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { SeasonForm } from '../_components/season-form';
import { openSeasonAction } from '../actions';

export const metadata: Metadata = { title: 'Open a season' };

export default async function NewSeasonPage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.newSeason(league));
  const [latest] = await showNotFound(listSeasons(ctx));
  const today = toDay(ctx.now, ctx.league.timeZone);
  const days = suggestSeasonDays(today);
  return (
    <>
      <PageHeader
        title="Open a season"
        subtitle="The days are a suggestion; change them to your league’s."
        back={<BackLink href={paths.seasons(league)}>Seasons</BackLink>}
      />
      <SeasonForm
        league={league}
        timeZone={ctx.league.timeZone}
        today={today}
        season={null}
        onOpen={openSeasonAction}
        onChange={null}
        start={{
          name: '',
          sport: latest?.sport ?? '',
          rosterOpensOn: days.rosterOpensOn,
          freezesAt: `${days.freezeOn}T18:00`,
          releaseOn: '',
          handOutOn: days.handOutOn,
          firstMatchOn: days.firstMatchOn,
        }}
      />
    </>
  );
}
