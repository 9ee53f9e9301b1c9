'use client';

import { useId, useSyncExternalStore } from 'react';
import { Field, SelectField, TextField } from '@/components/ui/field';
import { RadioGroup } from '@/components/ui/radio-group';
import { TextInput } from '@/components/ui/text-input';
import { formatTime } from '@/lib/domain/dates/format';
import { isTimeZone } from '@/lib/domain/dates/zone';

export type LeagueValues = {
  name: string;
  timeZone: string;
  unit: 'in' | 'mm';
  paper: 'A4' | 'Letter';
  currency: string;
};
export type LeagueChoices = {
  timeZones: readonly string[];
  currencies: readonly { value: string; label: string }[];
};

/** What every league needs said: its name, where its clocks are, and what it measures, prints and pays in. */
export function LeagueFields({
  values,
  onChange,
  choices,
  errors,
}: {
  values: LeagueValues;
  onChange: (values: LeagueValues) => void;
  choices: LeagueChoices;
  errors: Record<string, string | undefined>;
}) {
  const set = (part: Partial<LeagueValues>) => onChange({ ...values, ...part });
  return (
    <>
      <TextField
        label="Name of the league"
        name="name"
        required
        maxLength={120}
        value={values.name}
        onChange={(event) => set({ name: event.target.value })}
        error={errors['name']}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <TimeZoneField
          value={values.timeZone}
          onChange={(timeZone) => set({ timeZone })}
          timeZones={choices.timeZones}
          error={errors['timeZone']}
        />
        <SelectField
          label="Currency"
          name="currency"
          required
          options={choices.currencies}
          value={values.currency}
          onChange={(event) => set({ currency: event.target.value })}
          error={errors['currency']}
        />
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <RadioGroup
          legend="Lengths are shown in"
          name="unit"
          value={values.unit}
          onChange={(unit) => set({ unit: unit === 'in' ? 'in' : 'mm' })}
          options={[
            { value: 'mm', label: 'Millimetres' },
            { value: 'in', label: 'Inches' },
          ]}
          error={errors['unit']}
        />
        <RadioGroup
          legend="Lists and labels are printed on"
          name="paper"
          value={values.paper}
          onChange={(paper) => set({ paper: paper === 'Letter' ? 'Letter' : 'A4' })}
          options={[
            { value: 'A4', label: 'A4' },
            { value: 'Letter', label: 'Letter' },
          ]}
          error={errors['paper']}
        />
      </div>
    </>
  );
}

const never = () => () => {};

/** The zone of the reader's own clock; empty on the server, which has none. */
export const useOwnTimeZone = (): string =>
  useSyncExternalStore(
    never,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => '',
  );

function TimeZoneField({
  value,
  onChange,
  timeZones,
  error,
}: {
  value: string;
  onChange: (value: string) => void;
  timeZones: readonly string[];
  error: string | undefined;
}) {
  const listId = useId();
  // Only in the browser: the server's minute may be over before the page is here.
  const isBrowser = useOwnTimeZone() !== '';
  const shows = isBrowser && isTimeZone(value) ? `Clocks there show ${formatTime(new Date(), value)}.` : '';
  return (
    <>
      <Field
        label="Time zone"
        required
        error={error}
        hint={`Every time is shown on clocks of this zone. Type a city to find it. ${shows}`}
      >
        {(wiring) => (
          <TextInput
            {...wiring}
            name="timeZone"
            list={listId}
            autoComplete="off"
            spellCheck={false}
            maxLength={60}
            value={value}
            onChange={(event) => onChange(event.target.value)}
          />
        )}
      </Field>
      <datalist id={listId}>
        {timeZones.map((zone) => (
          <option key={zone} value={zone} />
        ))}
      </datalist>
    </>
  );
}
