'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { DatePlan } from '@/components/date-plan/date-plan';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { TextField } from '@/components/ui/field';
import { useToast } from '@/components/ui/toast';
import { daysBetween, isDay } from '@/lib/domain/dates/day';
import { formatShortDay, formatTime } from '@/lib/domain/dates/format';
import { listSeasonFaults } from '@/lib/domain/dates/list-season-faults';
import { listPlanDates } from '@/lib/domain/dates/plan-dates';
import { localDateTimeSchema, toInstant } from '@/lib/domain/dates/zone';
import { countOf } from '@/lib/domain/text/count-of';
import type { ActionResult, LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';

export type SeasonValues = {
  name: string;
  sport: string;
  rosterOpensOn: string;
  freezesAt: string;
  releaseOn: string;
  handOutOn: string;
  firstMatchOn: string;
};
type Sent = Omit<SeasonValues, 'releaseOn'> & { releaseOn: string | null };

/** The dates as typed, read on the league's clocks; null while one of them is no date yet. */
function readDates(values: SeasonValues, timeZone: string) {
  const { rosterOpensOn, handOutOn, firstMatchOn } = values;
  const releaseOn = values.releaseOn === '' ? null : values.releaseOn;
  const days = [rosterOpensOn, handOutOn, firstMatchOn, ...(releaseOn === null ? [] : [releaseOn])];
  if (!days.every(isDay) || !localDateTimeSchema.safeParse(values.freezesAt).success) return null;
  const { instant, note } = toInstant(values.freezesAt, timeZone);
  return { rosterOpensOn, handOutOn, firstMatchOn, releaseOn, freezesAt: instant, note };
}

/** What the typed freeze means where clocks change that night; null on every other day of the year. */
function sayClockChange(dates: ReturnType<typeof readDates>, timeZone: string): string | null {
  if (dates?.note === 'skipped hour')
    return `Clocks go forward over that hour: rosters freeze at ${formatTime(dates.freezesAt, timeZone)}.`;
  if (dates?.note === 'repeated hour')
    return 'Clocks go back and that hour comes twice: the first one counts.';
  return null;
}

/**
 * The name and the dates of a season, with the date plan drawn as they are typed; for a new one and for one that is
 * there. Entries stay on every failure. `today` is the league's calendar day.
 */
export function SeasonForm({
  league,
  start,
  timeZone,
  today,
  season,
  onOpen,
  onChange,
}: {
  league: string;
  start: SeasonValues;
  timeZone: string;
  today: string;
  season: { id: string; slug: string; rowVersion: number } | null;
  onOpen: LeagueAction<Sent, { slug: string }> | null;
  onChange: LeagueAction<
    { seasonId: string; rowVersion: number; fields: Sent },
    { rowVersion: number }
  > | null;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [values, setValues] = useState(start);
  const send = async (): Promise<ActionResult<{ slug: string }>> => {
    const fields = { ...values, releaseOn: values.releaseOn === '' ? null : values.releaseOn };
    if (!season && onOpen) return onOpen(league, fields);
    if (!season || !onChange) throw new Error('nothing to send the form to');
    const answer = await onChange(league, { seasonId: season.id, rowVersion: season.rowVersion, fields });
    return answer.ok ? { ok: true, data: { slug: season.slug } } : answer;
  };
  const {
    submit,
    pending,
    failure,
    fields: errors,
  } = useSubmit(send, ({ slug }) => {
    showToast({ tone: 'set', title: season ? 'The season is saved' : `${values.name} is open` });
    if (!season) router.push(paths.dates(league, slug));
    router.refresh();
    return season ? undefined : 'leaving';
  });
  const freezeOn = values.freezesAt.slice(0, 10);
  const { freezeOn: freezesAt, ...faults } = listSeasonFaults({ ...values, freezeOn });
  const live: Partial<Record<keyof SeasonValues, string>> = { ...faults, ...(freezesAt && { freezesAt }) };
  const dates = readDates(values, timeZone);
  const bind = (name: keyof SeasonValues) => ({
    name,
    value: values[name],
    onChange: (event: { target: { value: string } }) => setValues({ ...values, [name]: event.target.value }),
    error: live[name] ?? errors[name] ?? errors[`fields.${name}`],
  });
  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card title="Date plan" aside={dates && sayGaps(dates.rosterOpensOn, freezeOn, dates.handOutOn)}>
        {dates ? (
          <DatePlan
            label="Dates of the season"
            dates={listPlanDates(dates, timeZone, today)}
            today={today}
            todayLabel={`today, ${formatShortDay(today)}`}
          />
        ) : (
          <p className="text-dusk">Fill every date in below to see them on one line.</p>
        )}
      </Card>
      <Card title="Dates" aside={`on the clocks of ${timeZone.replaceAll('_', ' ')}`}>
        <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <TextField label="Rosters open" type="date" required {...bind('rosterOpensOn')} />
          <TextField
            label="Rosters freeze"
            type="datetime-local"
            required
            {...bind('freezesAt')}
            hint={
              sayClockChange(dates, timeZone) ??
              'Signed-off rosters freeze at this moment; later changes need a reason.'
            }
          />
          <TextField label="Release to the decorator" type="date" required={false} {...bind('releaseOn')} />
          <TextField label="Hand-out day" type="date" required {...bind('handOutOn')} />
          <TextField label="First match" type="date" required {...bind('firstMatchOn')} />
        </div>
      </Card>
      <Card title="Name">
        <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <TextField label="Name" required maxLength={80} {...bind('name')} hint="Such as Spring 2027." />
          <TextField label="Sport" required maxLength={60} {...bind('sport')} />
        </div>
      </Card>
      <FormFailure failure={failure} />
      <div>
        <Button type="submit" look="primary" pending={pending}>
          {season ? 'Save the season' : 'Open the season'}
        </Button>
      </div>
    </form>
  );
}

/** How long families and the shop have, once the days follow each other. */
function sayGaps(opens: string, freezes: string, handOut: string): string | null {
  const [collect, make] = [daysBetween(opens, freezes), daysBetween(freezes, handOut)];
  if (collect < 1 || make < 1) return null;
  return `${countOf(collect, 'day')} to collect, ${countOf(make, 'day')} to make and ship`;
}
