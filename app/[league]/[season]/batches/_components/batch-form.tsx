'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useSubmit } from '@/app/_components/use-submit';
import { Button, ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Checkbox } from '@/components/ui/checkbox';
import { EmptyState } from '@/components/ui/empty-state';
import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SearchInput } from '@/components/ui/search-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useToast } from '@/components/ui/toast';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { formatDay } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import type { BatchOptions } from '@/lib/use-cases/batches/list-batches';
import type { ActionResult } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';

type Values = { teamIds: string[]; shopId: string; promisedOn: string };
type Answer = Promise<ActionResult<{ code: string }>>;
type Chosen = { teamIds: string[]; shopId: string; promisedOn: string | null };

type Props = {
  league: string;
  season: string;
  options: BatchOptions;
  start: Values;
  /** The batch that is being changed, null for a new one. */
  held: { batchId: string; code: string; rowVersion: number } | null;
  onHold: ((league: string, input: Chosen & { season: string }) => Answer) | null;
  onChange: ((league: string, input: Chosen & { batchId: string; rowVersion: number }) => Answer) | null;
};

/** Picks the teams, the shop and the promised day of a batch; everything picked stays when saving fails. */
export function BatchForm({ league, season, options, start, held, onHold, onChange }: Props) {
  const router = useRouter();
  const showToast = useToast();
  const [values, setValues] = useState(start);
  const [find, setFind] = useState('');

  const chosen = new Set(values.teamIds);
  const shown = options.teams.filter((team) =>
    holdsEveryWord(foldForSearch(`${team.name} ${team.division}`), find),
  );
  const divisions = [...new Set(shown.map((team) => team.division))];
  const players = options.teams.reduce((sum, team) => sum + (chosen.has(team.id) ? team.players : 0), 0);

  const choose = (ids: readonly string[], on: boolean) => {
    const next = new Set(values.teamIds);
    for (const id of ids)
      if (on) next.add(id);
      else next.delete(id);
    setValues({ ...values, teamIds: [...next] });
  };

  const send = async (): Answer => {
    const { promisedOn, ...rest } = values;
    const picked = { ...rest, promisedOn: promisedOn === '' ? null : promisedOn };
    if (held && onChange) return onChange(league, { ...picked, ...held });
    if (onHold) return onHold(league, { ...picked, season });
    throw new Error('nothing to send the batch to');
  };
  const { submit, pending, failure, fields } = useSubmit(send, ({ code }) => {
    showToast({ tone: 'set', title: `Batch ${code} holds ${countOf(values.teamIds.length, 'team')}` });
    router.push(paths.batch(league, season, code));
    return 'leaving';
  });

  if (options.teams.length === 0) {
    return (
      <Card>
        <EmptyState
          title="No team is ready for a batch"
          action={
            <ButtonLink href={paths.readiness(league, season)}>
              See what holds {countOf(options.notReady, 'team')}
            </ButtonLink>
          }
        >
          A roster must be signed off, and in no other batch, before its team can go into one.
        </EmptyState>
      </Card>
    );
  }

  return (
    <form
      className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_20rem]"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card flush title="Teams" aside={`${chosen.size} of ${options.teams.length} picked`}>
        <div className="border-hem flex flex-wrap items-center gap-2 border-b px-4 pb-3">
          <SearchInput label="Find a team" value={find} onChange={(event) => setFind(event.target.value)} />
          <Button
            size="sm"
            onClick={() =>
              choose(
                shown.map((team) => team.id),
                true,
              )
            }
          >
            Pick all {shown.length}
          </Button>
          <Button
            size="sm"
            look="quiet"
            onClick={() =>
              choose(
                shown.map((team) => team.id),
                false,
              )
            }
          >
            Pick none
          </Button>
        </div>
        {shown.length === 0 && <p className="text-dusk px-4 py-6">No ready team matches “{find}”.</p>}
        {divisions.map((division) => (
          <fieldset key={division} className="border-hem border-b last:border-b-0">
            <legend className="type-fine text-dusk float-left w-full px-4 pt-3 pb-1 font-[560]">
              {division}
            </legend>
            <ul className="clear-both pb-2">
              {shown
                .filter((team) => team.division === division)
                .map((team) => (
                  <li key={team.id} className="px-4">
                    <Checkbox
                      checked={chosen.has(team.id)}
                      onChange={(event) => choose([team.id], event.target.checked)}
                      label={
                        <span className="flex items-center gap-3">
                          <YokeTile kit={team.kit} size="xs" />
                          <span className="min-w-0 font-[560] break-words">{team.name}</span>
                          <span className="text-dusk shrink-0">{countOf(team.players, 'player')}</span>
                        </span>
                      }
                    />
                  </li>
                ))}
            </ul>
          </fieldset>
        ))}
      </Card>

      <Card title="For the shop" className="lg:sticky lg:top-5">
        <div className="grid gap-4">
          <Field label="Shop" required error={fields['shopId']}>
            {(wiring) => (
              <Select
                {...wiring}
                placeholder="Pick a shop"
                options={options.shops.map((shop) => ({ value: shop.id, label: shop.name }))}
                value={values.shopId}
                onChange={(event) => setValues({ ...values, shopId: event.target.value })}
              />
            )}
          </Field>
          {options.shops.length === 0 && (
            <Notice tone="care">
              No shop yet. Invite a decorator on the People page and name their shop; then come back.
            </Notice>
          )}
          <Field
            label="Promised for"
            required={false}
            error={fields['promisedOn']}
            hint={`Hand-out day is ${formatDay(options.season.handOutOn)}.`}
          >
            {(wiring) => (
              <TextInput
                {...wiring}
                type="date"
                value={values.promisedOn}
                max={options.season.handOutOn}
                onChange={(event) => setValues({ ...values, promisedOn: event.target.value })}
              />
            )}
          </Field>
          <dl className="grid grid-cols-2 gap-2">
            <div>
              <dt className="text-dusk">Teams</dt>
              <dd className="type-jersey text-3xl">{chosen.size}</dd>
            </div>
            <div>
              <dt className="text-dusk">Players</dt>
              <dd className="type-jersey text-3xl">{players}</dd>
            </div>
          </dl>
          {failure !== undefined && (
            <Notice tone="stop" live="assertive">
              {failure.message}
            </Notice>
          )}
          <Button
            type="submit"
            look="primary"
            wide
            pending={pending}
            unavailable={
              chosen.size === 0
                ? 'Pick at least one team.'
                : values.shopId === ''
                  ? 'Pick a shop.'
                  : undefined
            }
          >
            {held
              ? `Keep ${countOf(chosen.size, 'team')} in ${held.code}`
              : `Hold a batch of ${countOf(chosen.size, 'team')}`}
          </Button>
        </div>
      </Card>
    </form>
  );
}
