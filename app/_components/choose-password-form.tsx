'use client';

import { useRef, type FormEvent } from 'react';
import { passwordLimits } from '@/lib/domain/access/password-policy';
import { SubmitButton } from '@/components/ui/submit-button';
import type { ActionResult } from '@/lib/web/action-result';
import { enter } from './enter';
import { FormFailure } from './form-failure';
import { PasswordField } from './password-field';
import { readText, useSubmit } from './use-submit';

export const passwordHint = `At least ${passwordLimits.least} characters. A few words in a row are easy to remember and hard to guess.`;

/**
 * Chooses a new password for what a link stands for, and signs in with it. Props: `token`, `email` (for password
 * managers), `choose` (the action), `onward` (where to go then), `button`.
 */
export function ChoosePasswordForm({
  token,
  email,
  choose,
  onward,
  button,
}: {
  token: string;
  email: string;
  choose: (input: { token: string; password: string }) => Promise<ActionResult<{ email: string }>>;
  onward: string;
  button: string;
}) {
  const password = useRef('');
  const { submit, pending, failure, fields } = useSubmit(choose, async (data) => {
    // If that fails, the page it leads to is the sign-in page, and it says so there.
    await enter(data.email, password.current);
    window.location.assign(onward);
    return 'leaving' as const;
  });

  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    password.current = readText(new FormData(event.currentTarget), 'password');
    void submit({ token, password: password.current });
  };

  return (
    <form method="post" onSubmit={send} className="grid gap-4">
      <FormFailure failure={failure} />
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="New password"
        name="password"
        kind="new"
        hint={passwordHint}
        error={fields['password']}
      />
      <SubmitButton pending={pending} wide>
        {button}
      </SubmitButton>
    </form>
  );
}
