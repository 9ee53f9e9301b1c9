'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { TextField } from '@/components/ui/field';
import { useToast } from '@/components/ui/toast';
import type { ActionResult } from '@/lib/web/action-result';
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

/** The name and the dates of a season; for a new one and for one that is there. Entries stay on every failure. */
export function SeasonForm({
  league,
  start,
  timeZone,
  season,
  onOpen,
  onChange,
}: {
  league: string;
  start: SeasonValues;
  timeZone: string;
  season: { id: string; slug: string; rowVersion: number } | null;
  onOpen: ((league: string, input: Sent) => Promise<ActionResult<{ slug: string }>>) | null;
  onChange:
    | ((
        league: string,
        input: { seasonId: string; rowVersion: number; fields: Sent },
      ) => Promise<ActionResult<{ rowVersion: number }>>)
    | null;
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
  });
  const bind = (name: keyof SeasonValues) => ({
    name,
    value: values[name],
    onChange: (event: { target: { value: string } }) => setValues({ ...values, [name]: event.target.value }),
    error: errors[name] ?? errors[`fields.${name}`],
  });
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card title="Dates and name" aside={`clocks of ${timeZone.replaceAll('_', ' ')}`}>
        <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <TextField label="Name" required maxLength={80} {...bind('name')} hint="Such as Spring 2027." />
          <TextField label="Sport" required maxLength={60} {...bind('sport')} />
          <TextField label="Rosters open" type="date" required {...bind('rosterOpensOn')} />
          <TextField
            label="Rosters freeze"
            type="datetime-local"
            required
            {...bind('freezesAt')}
            hint="Signed-off rosters freeze at this moment; later changes need a reason."
          />
          <TextField label="Release to the decorator" type="date" required={false} {...bind('releaseOn')} />
          <TextField label="Hand-out day" type="date" required {...bind('handOutOn')} />
          <TextField label="First match" type="date" required {...bind('firstMatchOn')} />
        </div>
        <div className="mt-5 grid gap-3">
          <FormFailure failure={failure} />
          <div>
            <Button type="submit" look="primary" pending={pending}>
              {season ? 'Save the season' : 'Open the season'}
            </Button>
          </div>
        </div>
      </Card>
    </form>
  );
}
