'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Checkbox } from '@/components/ui/checkbox';
import { SelectField, TextField } from '@/components/ui/field';
import { useToast } from '@/components/ui/toast';
import type { Kit } from '@/lib/domain/kit/kit';
import type { TeamInput } from '@/lib/use-cases/teams/team-schemas';
import type { ActionResult, LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';
import { KitEditor } from './kit-editor';

type Values = { name: string; divisionId: string; home: Kit; away: Kit | null };

/** Name, division and both kits of a team with a live picture. Entries stay on every failure. */
export function TeamForm({
  league,
  season,
  divisions,
  team,
  start,
  onAdd,
  onChange,
}: {
  league: string;
  season: string;
  divisions: { id: string; name: string }[];
  team: { id: string; rowVersion: number } | null;
  start: Values;
  onAdd: LeagueAction<{ season: string; fields: TeamInput }, { slug: string }> | null;
  onChange: LeagueAction<
    { teamId: string; rowVersion: number; fields: TeamInput },
    { rowVersion: number }
  > | null;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [values, setValues] = useState(start);
  // A kit that was switched off comes back as it was.
  const [spare, setSpare] = useState<Kit>(
    start.away ?? { name: 'white', body: '#ffffff', sleeves: '#ffffff', number: '#000000', outline: null },
  );
  const send = async (): Promise<ActionResult<unknown>> => {
    const fields = {
      name: values.name,
      divisionId: values.divisionId,
      kits: { home: values.home, away: values.away },
    };
    if (team && onChange) return onChange(league, { teamId: team.id, rowVersion: team.rowVersion, fields });
    if (onAdd) return onAdd(league, { season, fields });
    throw new Error('nothing to send the form to');
  };
  const {
    submit,
    pending,
    failure,
    fields: errors,
  } = useSubmit(send, () => {
    showToast({ tone: 'set', title: `${values.name} is ${team ? 'saved' : 'added'}` });
    router.push(paths.teams(league, season));
    router.refresh();
    return 'leaving';
  });
  const errorsOf = (kit: 'home' | 'away') =>
    Object.fromEntries(
      Object.entries(errors)
        .filter(([path]) => path.startsWith(`fields.kits.${kit}.`))
        .map(([path, message]) => [path.slice(`fields.kits.${kit}.`.length), message]),
    );
  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card title="Team">
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            label="Name"
            required
            maxLength={80}
            value={values.name}
            error={errors['fields.name']}
            onChange={(event) => setValues({ ...values, name: event.target.value })}
          />
          <SelectField
            label="Division"
            required
            placeholder="Pick a division"
            options={divisions.map((division) => ({ value: division.id, label: division.name }))}
            value={values.divisionId}
            error={errors['fields.divisionId']}
            onChange={(event) => setValues({ ...values, divisionId: event.target.value })}
          />
        </div>
      </Card>
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Card title="Home kit">
          <KitEditor
            kit={values.home}
            errors={errorsOf('home')}
            onChange={(home) => setValues({ ...values, home })}
          />
        </Card>
        <Card
          title="Away kit"
          aside={
            <Checkbox
              className="-my-2.5"
              label="Has an away kit"
              checked={values.away !== null}
              onChange={(event) => {
                const on = event.target.checked;
                if (values.away) setSpare(values.away);
                setValues({ ...values, away: on ? spare : null });
              }}
            />
          }
        >
          {values.away ? (
            <KitEditor
              kit={values.away}
              errors={errorsOf('away')}
              onChange={(away) => setValues({ ...values, away })}
            />
          ) : (
            <p className="text-dusk">
              The team plays in its home kit only; a clash then needs the other side, or bibs.
            </p>
          )}
        </Card>
      </div>
      <FormFailure failure={failure} />
      <div>
        <Button type="submit" look="primary" pending={pending}>
          {team ? 'Save the team' : 'Add the team'}
        </Button>
      </div>
    </form>
  );
}
