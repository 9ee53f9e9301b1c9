'use client';

import { useId } from 'react';
import { Field, TextField } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import type { Draft } from './draft';

type Season = Draft['season'];

/** Name, sport and the days a season hangs on. */
export function SeasonStep({
  values,
  onChange,
  sports,
  timeZone,
  errors,
}: {
  values: Season;
  onChange: (values: Season) => void;
  sports: readonly string[];
  timeZone: string;
  errors: Record<string, string>;
}) {
  const listId = useId();
  const set = (part: Partial<Season>) => onChange({ ...values, ...part });
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          label="Name of the season"
          name="seasonName"
          required
          maxLength={80}
          hint="Such as Spring 2027."
          value={values.name}
          onChange={(event) => set({ name: event.target.value })}
          error={errors['name']}
        />
        <Field label="Sport" required hint="Choose one, or write another." error={errors['sport']}>
          {(wiring) => (
            <>
              <TextInput
                {...wiring}
                name="sport"
                list={listId}
                autoComplete="off"
                maxLength={60}
                value={values.sport}
                onChange={(event) => set({ sport: event.target.value })}
              />
              <datalist id={listId}>
                {sports.map((sport) => (
                  <option key={sport} value={sport} />
                ))}
              </datalist>
            </>
          )}
        </Field>
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          label="Rosters open on"
          name="rosterOpensOn"
          type="date"
          required
          value={values.rosterOpensOn}
          onChange={(event) => set({ rosterOpensOn: event.target.value })}
          error={errors['rosterOpensOn']}
        />
        <TextField
          label="Rosters freeze at"
          name="freezesAt"
          type="datetime-local"
          required
          hint={`On clocks of ${timeZone}. After it a roster changes by request only.`}
          value={values.freezesAt}
          onChange={(event) => set({ freezesAt: event.target.value })}
          error={errors['freezesAt']}
        />
        <TextField
          label="Hand-out day"
          name="handOutOn"
          type="date"
          required
          hint="When the players get their kit."
          value={values.handOutOn}
          onChange={(event) => set({ handOutOn: event.target.value })}
          error={errors['handOutOn']}
        />
        <TextField
          label="First match"
          name="firstMatchOn"
          type="date"
          required
          value={values.firstMatchOn}
          onChange={(event) => set({ firstMatchOn: event.target.value })}
          error={errors['firstMatchOn']}
        />
      </div>
    </>
  );
}
