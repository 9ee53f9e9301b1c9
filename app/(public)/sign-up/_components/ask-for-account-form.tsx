'use client';

import { useState, type FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import type { ActionResult } from '@/lib/web/action-result';

/** Name and address; the password comes once the address is known to be theirs. */
export function AskForAccountForm({
  ask,
}: {
  ask: (input: { name: string; email: string }) => Promise<ActionResult<void>>;
}) {
  const [sentTo, setSentTo] = useState<string>();
  const { submit, pending, failure, fields } = useSubmit(ask, () => undefined);

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const email = readText(form, 'email');
    setSentTo(undefined);
    await submit({ name: readText(form, 'name'), email });
    setSentTo(email);
  };

  const done = sentTo !== undefined && !failure && !pending;
  return (
    <form method="post" onSubmit={(event) => void send(event)} className="grid gap-4">
      <FormFailure failure={failure} />
      {done && (
        <Notice tone="set" title="Check your e-mail" live="polite">
          A letter is on its way to {sentTo}. Follow its link within 24 hours. Nothing there after a few
          minutes? Look among the junk, or correct the address below and send it again.
        </Notice>
      )}
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        error={fields['name']}
      />
      <TextField
        label="E-mail address"
        name="email"
        type="email"
        inputMode="email"
        autoComplete="email"
        required
        maxLength={254}
        hint="We send one letter, to see that it is yours. You choose a password after that."
        error={fields['email']}
      />
      <SubmitButton pending={pending} wide look={done ? 'secondary' : 'primary'}>
        {done ? 'Send it again' : 'Send me the link'}
      </SubmitButton>
    </form>
  );
}
