import type { Metadata } from 'next';
import { DatePlan } from '@/components/date-plan/date-plan';
import { Card } from '@/components/ui/card';
import { listPlanDates } from '@/lib/domain/dates/plan-dates';
import { formatDay, formatShortDay } from '@/lib/domain/dates/format';
import { listReadiness } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { ReadinessHead } from './_components/readiness-head';
import { ReadinessTable } from './_components/readiness-table';
import { remindManagersAction } from './actions';

export const metadata: Metadata = { title: 'Readiness' };

export default async function ReadinessPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season: slug } = await params;
  const { ctx } = await requireLeague(league, paths.readiness(league, slug));
  const { season, teams, today, may } = await showNotFound(listReadiness(ctx, { season: slug }));
  return (
    <>
      <ReadinessHead league={league} season={slug} teams={teams} may={may} onRemind={remindManagersAction} />
      <Card title="Date plan" aside={`hand-out day, ${formatDay(season.handOutOn)}`} className="mb-5">
        <DatePlan
          label="Dates of the season"
          dates={listPlanDates(season, ctx.league.timeZone, today)}
          today={today}
          todayLabel={`today, ${formatShortDay(today)}`}
        />
      </Card>
      <ReadinessTable league={league} season={slug} teams={teams} mayAddTeams={may.batch} />
    </>
  );
}
