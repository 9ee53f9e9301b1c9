'use client';

import { Switch as Radix } from 'radix-ui';
import { useId, type ReactNode } from 'react';

/** A setting that takes effect at once. Props: `label`, `hint`, `checked`, `onChange(checked)`, `disabled`. In a form use Checkbox. */
export function Switch({
  label,
  hint,
  checked,
  onChange,
  disabled = false,
}: {
  label: ReactNode;
  hint?: ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean;
}) {
  const id = useId();
  return (
    <div className="touch flex items-center justify-between gap-4 py-1">
      <label htmlFor={id} className="min-w-0">
        <span className="block">{label}</span>
        {hint !== undefined && <span className="type-small text-dusk block">{hint}</span>}
      </label>
      <Radix.Root
        id={id}
        checked={checked}
        onCheckedChange={onChange}
        disabled={disabled}
        className="true-colour border-dusk bg-linen data-[state=checked]:border-ink data-[state=checked]:bg-ink relative h-6 w-10.5 before:absolute before:-inset-2.5 shrink-0 rounded-full border disabled:opacity-50"
      >
        <Radix.Thumb className="bg-dusk data-[state=checked]:bg-on-ink block size-4 translate-x-1 rounded-full transition-transform data-[state=checked]:translate-x-5" />
      </Radix.Root>
    </div>
  );
}
