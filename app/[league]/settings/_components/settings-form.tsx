'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { LeagueFields, type LeagueChoices, type LeagueValues } from '@/app/_components/league-fields';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { TextareaField, TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { Seam } from '@/components/ui/seam';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import type { LeagueAction } from '@/lib/web/action-result';

type Settings = LeagueValues & { contactEmail: string | null; shipTo: string; rowVersion: number };

/** The league's settings. When somebody else saved first, what was typed stays, and theirs can be taken instead. */
export function SettingsForm({
  league,
  settings,
  choices,
  change,
}: {
  league: string;
  settings: Settings;
  choices: LeagueChoices;
  change: LeagueAction<Settings, { rowVersion: number }>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [values, setValues] = useState(settings);
  const { submit, pending, failure, fields, forget } = useSubmit(change, ({ rowVersion }) => {
    setValues((now) => ({ ...now, rowVersion }));
    showToast({ tone: 'set', title: 'Saved the settings' });
    router.refresh();
  });
  // The page was refreshed and brought a newer version than the one this form was opened with.
  const theirs = settings.rowVersion > values.rowVersion ? settings : null;
  const take = (next: Settings) => {
    setValues(next);
    forget();
  };
  const send = (event: FormEvent) => {
    event.preventDefault();
    void submit(league, values);
  };

  return (
    <form method="post" onSubmit={send} className="grid gap-5">
      {failure?.code === 'conflict' || theirs ? (
        <Notice tone="care" live="assertive" title="Somebody else saved these settings first">
          <p>
            {theirs
              ? `Theirs: ${describe(theirs)}. What you typed is still below.`
              : 'Nothing of yours was saved. What you typed is still below.'}
          </p>
          <div className="mt-2 flex flex-wrap gap-2">
            {theirs ? (
              <>
                <Button size="sm" onClick={() => take(theirs)}>
                  Take theirs
                </Button>
                <Button size="sm" onClick={() => take({ ...values, rowVersion: theirs.rowVersion })}>
                  Keep mine
                </Button>
              </>
            ) : (
              <Button size="sm" onClick={() => router.refresh()}>
                Look at theirs
              </Button>
            )}
          </div>
        </Notice>
      ) : (
        <FormFailure failure={failure} />
      )}
      <LeagueFields
        values={values}
        onChange={(part) => setValues({ ...values, ...part })}
        choices={choices}
        errors={fields}
      />
      <Seam />
      <TextField
        label="Contact address"
        name="contactEmail"
        type="email"
        inputMode="email"
        required={false}
        maxLength={254}
        hint="Whom to ask about the league’s kit."
        value={values.contactEmail ?? ''}
        onChange={(event) => setValues({ ...values, contactEmail: event.target.value })}
        error={fields['contactEmail']}
      />
      <TextareaField
        label="Ship to"
        name="shipTo"
        required={false}
        rows={4}
        maxLength={500}
        hint="Where the decorator sends cartons, line by line as on a label."
        value={values.shipTo}
        onChange={(event) => setValues({ ...values, shipTo: event.target.value })}
        error={fields['shipTo']}
      />
      <div>
        <SubmitButton pending={pending}>Save the settings</SubmitButton>
      </div>
    </form>
  );
}

const describe = (settings: Settings): string =>
  [
    settings.name,
    settings.timeZone,
    settings.currency,
    settings.unit,
    settings.paper,
    settings.contactEmail ?? 'no contact address',
    settings.shipTo.replaceAll('\n', ', ') || 'no address to ship to',
  ].join('; ');
