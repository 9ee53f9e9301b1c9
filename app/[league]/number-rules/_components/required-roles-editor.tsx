'use client';

import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { TextInput } from '@/components/ui/text-input';

type RequiredRole = { role: string; least: number };

/** Roles every roster must have, such as one goalkeeper: a line each. */
export function RequiredRolesEditor({
  roles,
  onChange,
}: {
  roles: readonly RequiredRole[];
  onChange: (roles: RequiredRole[]) => void;
}) {
  const set = (index: number, part: Partial<RequiredRole>) =>
    onChange(roles.map((entry, at) => (at === index ? { ...entry, ...part } : entry)));
  return (
    <div className="grid gap-3 sm:col-span-2">
      {roles.map((entry, index) => (
        <fieldset key={index} className="grid items-end gap-3 sm:grid-cols-[minmax(0,1fr)_7rem_auto]">
          <legend className="sr-only">Role, line {index + 1}</legend>
          <Field label="Role every roster must have">
            {(wiring) => (
              <TextInput
                {...wiring}
                value={entry.role}
                maxLength={40}
                onChange={(event) => set(index, { role: event.target.value })}
              />
            )}
          </Field>
          <Field label="At least">
            {(wiring) => (
              <TextInput
                {...wiring}
                type="number"
                min={1}
                max={20}
                value={entry.least}
                onChange={(event) =>
                  set(index, { least: Math.min(20, Math.max(1, Number(event.target.value) || 1)) })
                }
              />
            )}
          </Field>
          <IconButton
            icon="close"
            label={`Remove ${entry.role || 'this role'}`}
            onClick={() => onChange(roles.filter((_, at) => at !== index))}
          />
        </fieldset>
      ))}
      <div>
        <Button size="sm" onClick={() => onChange([...roles, { role: '', least: 1 }])}>
          Require a role
        </Button>
      </div>
    </div>
  );
}
