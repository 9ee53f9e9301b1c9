'use client';

import { useRef, useState, type FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { LeagueFields, useOwnTimeZone, type LeagueChoices } from '@/app/_components/league-fields';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { TextareaField } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { listSeasonFaults, type SeasonDays } from '@/lib/domain/dates/list-season-faults';
import type { ActionResult } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';
import { DivisionStep } from './division-step';
import {
  findStepOf,
  pickFaults,
  startDraft,
  steps,
  stepTitles,
  type Draft,
  type KitChoice,
  type PresetChoice,
  type Step,
} from './draft';
import { SeasonStep } from './season-step';
import { StepList } from './step-list';

/** Four steps on one page: going back and forth loses nothing, and nothing is made before the last. */
export function CreateLeagueForm({
  create,
  choices,
  days,
  presets,
  kits,
}: {
  create: (input: Draft) => Promise<ActionResult<{ league: string; season: string }>>;
  choices: LeagueChoices;
  days: SeasonDays;
  presets: readonly PresetChoice[];
  kits: readonly KitChoice[];
}) {
  const ownZone = useOwnTimeZone();
  const [draft, setDraft] = useState<Draft>(() => startDraft(days, kits));
  const [step, setStep] = useState<Step>('league');
  const title = useRef<HTMLHeadingElement>(null);
  const { submit, pending, failure, fields } = useSubmit(create, ({ league, season }) => {
    window.location.assign(paths.readiness(league, season));
    return 'leaving';
  });
  // Until somebody writes another one, the zone of their own clock.
  const shown = { ...draft, league: { ...draft.league, timeZone: draft.league.timeZone || ownZone } };
  const [orderFaults, setOrderFaults] = useState<Record<string, string>>({});
  const faults = { ...pickFaults(fields, step), ...(step === 'season' ? orderFaults : {}) };
  const at = steps.indexOf(step);
  const next = steps[at + 1];

  const go = (to: Step) => {
    setStep(to);
    // The keyboard and the screen reader go on at the top of the step.
    requestAnimationFrame(() => title.current?.focus());
  };
  const send = async (event: FormEvent) => {
    event.preventDefault();
    const wrong = step === 'season' ? findOrderFaults(draft.season) : {};
    setOrderFaults(wrong);
    if (Object.keys(wrong).length > 0) return;
    if (next !== undefined) return go(next);
    await submit(shown);
  };
  const blamed = findStepOf(fields);

  return (
    <div className="grid max-w-180 gap-5">
      <StepList step={step} blamed={failure ? blamed : undefined} onGo={go} />
      <Card>
        <form method="post" onSubmit={(event) => void send(event)} className="grid gap-5">
          <h2 ref={title} tabIndex={-1} className="type-section outline-none">
            {stepTitles[step]}
          </h2>
          <FormFailure failure={failure && describeFailure(failure, blamed, step)} />
          {step === 'league' && (
            <LeagueFields
              values={shown.league}
              onChange={(league) => setDraft({ ...draft, league })}
              choices={choices}
              errors={faults}
            />
          )}
          {step === 'season' && (
            <SeasonStep
              values={draft.season}
              onChange={(season) => setDraft({ ...draft, season })}
              sports={[...new Set(presets.map((preset) => preset.sport))]}
              timeZone={shown.league.timeZone}
              errors={faults}
            />
          )}
          {step === 'division' && (
            <DivisionStep
              values={draft.division}
              onChange={(division) => setDraft({ ...draft, division })}
              sport={draft.season.sport}
              presets={presets}
              kits={kits}
              errors={faults}
            />
          )}
          {step === 'managers' && (
            <TextareaField
              label="E-mail addresses of team managers"
              name="managers"
              required={false}
              rows={6}
              hint="A line each, or with commas between. Each gets an invitation; you name their teams on the People page once you have added them. You can also invite everybody later."
              value={draft.managers}
              onChange={(event) => setDraft({ ...draft, managers: event.target.value })}
              error={fields['managers']}
            />
          )}
          <div className="flex flex-wrap justify-between gap-2">
            {at > 0 ? <Button onClick={() => go(steps[at - 1] ?? step)}>Back</Button> : <span />}
            <SubmitButton pending={pending}>
              {next === undefined ? 'Create the league' : `Next: ${stepTitles[next].toLowerCase()}`}
            </SubmitButton>
          </div>
        </form>
      </Card>
    </div>
  );
}

/** The server says the same; said here, it is said while the dates are in sight. */
function findOrderFaults(season: Draft['season']): Record<string, string> {
  const { freezeOn, ...others } = listSeasonFaults({ ...season, freezeOn: season.freezesAt.slice(0, 10) });
  return { ...others, ...(freezeOn !== undefined && { freezesAt: freezeOn }) };
}

/** On a step without a fault of its own, says which one to go back to. */
function describeFailure(
  failure: { message: string; fields: Record<string, string> },
  blamed: Step | undefined,
  step: Step,
) {
  if (blamed === undefined) return failure;
  const own = pickFaults(failure.fields, step);
  if (Object.keys(own).length > 0 || failure.fields[step] !== undefined)
    return { message: failure.message, fields: failure.fields };
  return {
    message: `“${stepTitles[blamed]}” needs another look. Nothing was created yet, and what you typed is still here.`,
    fields: {},
  };
}
