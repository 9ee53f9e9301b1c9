'use client';

import { useState, type FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import type { ActionResult } from '@/lib/web/action-result';

/** Asks for the letter. What it says afterwards is the same whether or not there is such an account. */
export function AskForResetForm({ ask }: { ask: (input: { email: string }) => Promise<ActionResult<void>> }) {
  const [sentTo, setSentTo] = useState<string>();
  const { submit, pending, failure, fields } = useSubmit(ask, () => undefined);

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const email = readText(new FormData(event.currentTarget), 'email');
    setSentTo(undefined);
    await submit({ email });
    setSentTo(email);
  };

  const done = sentTo !== undefined && !failure && !pending;
  return (
    <form method="post" onSubmit={(event) => void send(event)} className="grid gap-4">
      <FormFailure failure={failure} />
      {done && (
        <Notice tone="set" title="Check your e-mail" live="polite">
          If {sentTo} has an account, a letter is on its way. Nothing there after a few minutes? Look among
          the junk, or try the address you were invited with.
        </Notice>
      )}
      <TextField
        label="E-mail address"
        name="email"
        type="email"
        inputMode="email"
        autoComplete="username"
        required
        maxLength={254}
        error={fields['email']}
      />
      <SubmitButton pending={pending} wide look={done ? 'secondary' : 'primary'}>
        {done ? 'Send it again' : 'Send me the link'}
      </SubmitButton>
    </form>
  );
}
