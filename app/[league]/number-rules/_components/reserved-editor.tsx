'use client';

import { useWritten } from '@/app/_components/use-written';
import { Button } from '@/components/ui/button';
import { Field, FieldError, TextField } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { TextInput } from '@/components/ui/text-input';
import type { Reserved } from '@/lib/domain/rules/rule-set';

/** Numbers that only certain roles may wear, or nobody: a line each. */
export function ReservedEditor({
  reserved,
  error,
  onChange,
}: {
  reserved: readonly Reserved[];
  error: string | undefined;
  onChange: (reserved: Reserved[]) => void;
}) {
  const set = (index: number, part: Partial<Reserved>) =>
    onChange(reserved.map((entry, at) => (at === index ? { ...entry, ...part } : entry)));
  return (
    <div className="grid gap-3 sm:col-span-2">
      {reserved.length === 0 && (
        <p className="text-dusk">None. Add one to keep a number for a goalkeeper, or to keep it back.</p>
      )}
      {reserved.map((entry, index) => (
        <fieldset
          key={index}
          className="grid items-end gap-3 sm:grid-cols-[7rem_minmax(0,1fr)_minmax(0,1.4fr)_auto]"
        >
          <legend className="sr-only">Set aside, line {index + 1}</legend>
          <Field label="Numbers">
            {(wiring) => (
              <TextInput
                {...wiring}
                value={entry.labels}
                maxLength={120}
                onChange={(event) => set(index, { labels: event.target.value })}
              />
            )}
          </Field>
          <RolesField roles={entry.roles} onChange={(roles) => set(index, { roles })} />
          <Field label="Reason">
            {(wiring) => (
              <TextInput
                {...wiring}
                value={entry.reason}
                maxLength={200}
                onChange={(event) => set(index, { reason: event.target.value })}
              />
            )}
          </Field>
          <IconButton
            icon="close"
            label={`Remove ${entry.labels || 'this line'}`}
            onClick={() => onChange(reserved.filter((_, at) => at !== index))}
          />
        </fieldset>
      ))}
      {error !== undefined && <FieldError>{error}</FieldError>}
      <div>
        <Button size="sm" onClick={() => onChange([...reserved, { labels: '', roles: [], reason: '' }])}>
          Set a number aside
        </Button>
      </div>
    </div>
  );
}

function RolesField({ roles, onChange }: { roles: string[]; onChange: (roles: string[]) => void }) {
  const written = useWritten(roles, { read: splitWords, write: (words) => words.join(', ') }, onChange);
  return (
    <TextField
      label="Only for (empty: nobody)"
      value={written.value}
      maxLength={200}
      onChange={(event) => written.type(event.target.value)}
    />
  );
}

const splitWords = (text: string): string[] =>
  text
    .split(',')
    .map((word) => word.trim())
    .filter((word) => word !== '');
