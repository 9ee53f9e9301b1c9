'use client';

import { useId } from 'react';
import { Checkbox } from '@/components/ui/checkbox';
import { Field, TextField } from '@/components/ui/field';
import { StatusTag } from '@/components/ui/tag';
import { TextInput } from '@/components/ui/text-input';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { hexSchema, type Kit } from '@/lib/domain/kit/kit';
import { numberContrast } from '@/lib/domain/kit/kit-clash';

const isHex = (text: string): boolean => hexSchema.safeParse(text).success;
const tones = { clear: 'set', thin: 'care', poor: 'stop' } as const;

/** One kit: its colour's name, body, sleeves, number and outline, drawn as it is chosen, and whether the number reads. */
export function KitEditor({
  kit,
  errors,
  onChange,
}: {
  kit: Kit;
  errors: Record<string, string>;
  onChange: (kit: Kit) => void;
}) {
  const drawable = [kit.body, kit.sleeves, kit.number, ...(kit.outline === null ? [] : [kit.outline])].every(
    isHex,
  );
  const contrast = drawable ? numberContrast(kit) : null;
  const set = (part: Partial<Kit>) => onChange({ ...kit, ...part });
  return (
    <div className="grid gap-4 sm:grid-cols-[6.5rem_minmax(0,1fr)]">
      <div className="grid content-start justify-items-center gap-3">
        {drawable ? (
          <YokeTile kit={kit} number="12" size="xl" label={kit.name} />
        ) : (
          <p className="text-dusk">Finish the colours to see it.</p>
        )}
      </div>
      <div className="grid gap-3">
        <TextField
          label="Colour name"
          required
          maxLength={40}
          value={kit.name}
          error={errors['name']}
          onChange={(event) => set({ name: event.target.value })}
        />
        <div className="grid gap-3 sm:grid-cols-2">
          <ColourField
            label="Body"
            value={kit.body}
            error={errors['body']}
            onChange={(body) => set({ body })}
          />
          <ColourField
            label="Sleeves"
            value={kit.sleeves}
            error={errors['sleeves']}
            onChange={(sleeves) => set({ sleeves })}
          />
          <ColourField
            label="Number"
            value={kit.number}
            error={errors['number']}
            onChange={(number) => set({ number })}
          />
          {kit.outline !== null && (
            <ColourField
              label="Number outline"
              value={kit.outline}
              error={errors['outline']}
              onChange={(outline) => set({ outline })}
            />
          )}
        </div>
        <Checkbox
          label="The number has an outline"
          checked={kit.outline !== null}
          onChange={(event) => set({ outline: event.target.checked ? kit.sleeves : null })}
        />
        {contrast && (
          <p className="flex flex-wrap items-center gap-2">
            <StatusTag tone={tones[contrast.verdict]}>{contrast.verdict}</StatusTag>
            <span className="type-small text-dusk">{contrast.says}</span>
          </p>
        )}
      </div>
    </div>
  );
}

function ColourField({
  label,
  value,
  error,
  onChange,
}: {
  label: string;
  value: string;
  error: string | undefined;
  onChange: (value: string) => void;
}) {
  const id = useId();
  return (
    <Field
      label={label}
      id={id}
      error={error ?? (isHex(value) ? undefined : 'Write # and six digits, such as #14375e.')}
    >
      {(wiring) => (
        <span className="flex gap-2">
          <input
            type="color"
            aria-label={`${label}, from the palette`}
            value={isHex(value) ? value : '#000000'}
            onChange={(event) => onChange(event.target.value)}
            className="touch-square border-thread rounded-control bg-card shrink-0 border p-1"
          />
          <TextInput
            {...wiring}
            code
            maxLength={7}
            spellCheck={false}
            value={value}
            onChange={(event) => onChange(event.target.value.trim())}
          />
        </span>
      )}
    </Field>
  );
}
