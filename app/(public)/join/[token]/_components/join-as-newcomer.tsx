'use client';

import { useRef, type FormEvent } from 'react';
import { passwordHint } from '@/app/_components/choose-password-form';
import { enter } from '@/app/_components/enter';
import { FormFailure } from '@/app/_components/form-failure';
import { PasswordField } from '@/app/_components/password-field';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { TextField } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import type { ActionResult } from '@/lib/web/action-result';

/** For somebody new: a name and a password, and the account and the role come together. */
export function JoinAsNewcomer({
  token,
  email,
  join,
  onward,
}: {
  token: string;
  email: string;
  join: (input: {
    token: string;
    name: string;
    password: string;
  }) => Promise<ActionResult<{ email: string }>>;
  onward: string;
}) {
  const password = useRef('');
  const { submit, pending, failure, fields } = useSubmit(join, async () => {
    await enter(email, password.current);
    window.location.assign(onward);
    return 'leaving' as const;
  });

  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const typed = new FormData(event.currentTarget);
    password.current = readText(typed, 'password');
    void submit({ token, name: readText(typed, 'name'), password: password.current });
  };

  return (
    <form method="post" onSubmit={send} className="grid gap-4">
      <FormFailure failure={failure} />
      <p>
        This opens an account for <strong>{email}</strong>.
      </p>
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        error={fields['name']}
      />
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="New password"
        name="password"
        kind="new"
        hint={passwordHint}
        error={fields['password']}
      />
      <SubmitButton pending={pending} wide>
        Open the account and join
      </SubmitButton>
    </form>
  );
}
