'use client';

import { SelectField, TextField } from '@/components/ui/field';
import { RadioGroup } from '@/components/ui/radio-group';
import type { Draft, KitChoice, PresetChoice } from './draft';

type Division = Draft['division'];
const ownRules = 'own';

/** Name, limits, number rules and kit of the first division. */
export function DivisionStep({
  values,
  onChange,
  sport,
  presets,
  kits,
  errors,
}: {
  values: Division;
  onChange: (values: Division) => void;
  sport: string;
  presets: readonly PresetChoice[];
  kits: readonly KitChoice[];
  errors: Record<string, string>;
}) {
  const set = (part: Partial<Division>) => onChange({ ...values, ...part });
  const wanted = sport.trim().toLowerCase();
  const fitting = presets.filter((preset) => preset.sport.toLowerCase() === wanted);
  const others = presets.filter((preset) => preset.sport.toLowerCase() !== wanted);
  const chosen = presets.find((preset) => preset.id === values.presetId);

  const choosePreset = (id: string) => {
    const preset = presets.find((entry) => entry.id === id);
    // A code that says how many players a team has is taken at its word; the league may say otherwise.
    const limits =
      preset && preset.most < 200
        ? { leastPlayers: String(preset.least), mostPlayers: String(preset.most) }
        : {};
    set({ presetId: preset?.id ?? null, ...limits });
  };

  return (
    <>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          label="Name of the division"
          name="divisionName"
          required
          maxLength={80}
          hint="Such as Under 12 mixed."
          value={values.name}
          onChange={(event) => set({ name: event.target.value })}
          error={errors['name']}
        />
        <TextField
          label="Age band"
          name="ageBand"
          required={false}
          maxLength={40}
          hint="Such as 10 to 12."
          value={values.ageBand}
          onChange={(event) => set({ ageBand: event.target.value })}
          error={errors['ageBand']}
        />
      </div>
      <SelectField
        label="Number rules"
        name="presetId"
        hint={
          chosen?.summary ??
          'Any number from 0 to 99, no two alike in a team. You adapt every rule later, under Number rules.'
        }
        options={[
          { value: ownRules, label: 'Rules of our own: any number from 0 to 99' },
          ...[...fitting, ...others].map((preset) => ({
            value: preset.id,
            label: preset.title,
            group: preset.sport,
          })),
        ]}
        value={values.presetId ?? ownRules}
        onChange={(event) => choosePreset(event.target.value)}
        error={errors['presetId']}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          label="Least players of a team"
          name="leastPlayers"
          type="number"
          inputMode="numeric"
          min={0}
          max={200}
          required
          value={values.leastPlayers}
          onChange={(event) => set({ leastPlayers: event.target.value })}
          error={errors['leastPlayers']}
        />
        <TextField
          label="Most players of a team"
          name="mostPlayers"
          type="number"
          inputMode="numeric"
          min={1}
          max={200}
          required
          value={values.mostPlayers}
          onChange={(event) => set({ mostPlayers: event.target.value })}
          error={errors['mostPlayers']}
        />
      </div>
      <RadioGroup
        legend="Kit to start from"
        name="starterKitId"
        options={kits.map((kit) => ({ value: kit.id, label: kit.name, hint: kit.says }))}
        value={values.starterKitId}
        onChange={(starterKitId) => set({ starterKitId })}
        hint="In ten sizes from youth extra small to adult double extra large."
        error={errors['starterKitId']}
      />
    </>
  );
}
