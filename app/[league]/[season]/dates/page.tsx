import type { Metadata } from 'next';
import { DatePlan } from '@/components/date-plan/date-plan';
import { Card } from '@/components/ui/card';
import { PageHeader } from '@/components/ui/page-header';
import { changeSeasonAction } from '@/app/[league]/seasons/actions';
import { SeasonForm } from '@/app/[league]/seasons/_components/season-form';
import { formatDay, formatInstant, formatShortDay } from '@/lib/domain/dates/format';
import { listPlanDates } from '@/lib/domain/dates/plan-dates';
import { toDay, toLocalInput } from '@/lib/domain/dates/zone';
import { getSeason } from '@/lib/use-cases/seasons/get-season';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';

export const metadata: Metadata = { title: 'Dates' };

export default async function DatesPage({ params }: { params: Promise<{ league: string; season: string }> }) {
  const { league, season: slug } = await params;
  const { ctx } = await requireLeague(league, paths.dates(league, slug));
  const { season, mayChange } = await showNotFound(getSeason(ctx, { season: slug }));
  const { timeZone } = ctx.league;
  const today = toDay(ctx.now, timeZone);
  const year = Number(today.slice(0, 4));
  return (
    <>
      <PageHeader
        title="Dates"
        subtitle={`${season.name}: rosters freeze ${formatInstant(season.freezesAt, timeZone, year)}, hand-out ${formatDay(season.handOutOn, year)}.`}
      />
      {!mayChange && (
        <Card title="Date plan">
          <DatePlan
            label="Dates of the season"
            dates={listPlanDates(season, timeZone, today)}
            today={today}
            todayLabel={`today, ${formatShortDay(today)}`}
          />
        </Card>
      )}
      {mayChange && (
        <SeasonForm
          key={season.rowVersion}
          league={league}
          timeZone={timeZone}
          today={today}
          season={{ id: season.id, slug: season.slug, rowVersion: season.rowVersion }}
          onOpen={null}
          onChange={changeSeasonAction}
          start={{
            name: season.name,
            sport: season.sport,
            rosterOpensOn: season.rosterOpensOn,
            freezesAt: toLocalInput(season.freezesAt, timeZone),
            releaseOn: season.releaseOn ?? '',
            handOutOn: season.handOutOn,
            firstMatchOn: season.firstMatchOn,
          }}
        />
      )}
    </>
  );
}
