'use client';

import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';

/**
 * A password with a switch to read what was typed. Props: `label`, `name`, `kind` (the one a person has, or a new one,
 * for password managers), `hint`, `error`, and `value` with `onChange` when the page fills it in.
 */
export function PasswordField({
  label,
  name,
  kind,
  hint,
  error,
  value,
  onChange,
}: {
  label: string;
  name: string;
  kind: 'current' | 'new';
  hint?: string | undefined;
  error?: string | undefined;
  value?: string;
  onChange?: (value: string) => void;
}) {
  const [shown, setShown] = useState(false);
  return (
    <Field label={label} hint={hint} error={error} required>
      {(wiring) => (
        <span className="relative block">
          <TextInput
            {...wiring}
            name={name}
            type={shown ? 'text' : 'password'}
            autoComplete={`${kind}-password`}
            autoCapitalize="none"
            autoCorrect="off"
            spellCheck={false}
            maxLength={200}
            className="pr-18"
            {...(value === undefined ? {} : { value })}
            onChange={(event) => onChange?.(event.target.value)}
          />
          <button
            type="button"
            aria-pressed={shown}
            aria-label={`Show ${label.toLowerCase()}`}
            onClick={() => setShown(!shown)}
            className="touch type-small text-damson hover:text-damson-deep rounded-control absolute top-0 right-0 px-3 font-[560]"
          >
            {shown ? 'Hide' : 'Show'}
          </button>
        </span>
      )}
    </Field>
  );
}
