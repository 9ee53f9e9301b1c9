'use client';

import { useRouter } from 'next/navigation';
import type { FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { TextField } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import type { ActionResult } from '@/lib/web/action-result';

/** The name others see. */
export function NameForm({
  name,
  change,
}: {
  name: string;
  change: (input: { name: string }) => Promise<ActionResult<{ name: string }>>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const { submit, pending, failure, fields } = useSubmit(change, (data) => {
    showToast({ tone: 'set', title: `You are shown as ${data.name} from now on` });
    router.refresh();
  });
  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    void submit({ name: readText(new FormData(event.currentTarget), 'name') });
  };
  return (
    <form method="post" onSubmit={send} className="grid gap-4">
      <FormFailure failure={failure} />
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={name}
        hint="Everybody in your leagues sees it; the history keeps it."
        error={fields['name']}
      />
      <div>
        <SubmitButton pending={pending} look="secondary">
          Save the name
        </SubmitButton>
      </div>
    </form>
  );
}
