'use client';

import { useState, type FormEvent } from 'react';
import { enter } from '@/app/_components/enter';
import { FormFailure } from '@/app/_components/form-failure';
import { PasswordField } from '@/app/_components/password-field';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import { TextLink } from '@/components/ui/text-link';
import type { ActionResult } from '@/lib/web/action-result';

/** For somebody who has an account: the password, which signs in and accepts. */
export function SignInToJoin({
  token,
  email,
  accept,
  onward,
  resetPath,
}: {
  token: string;
  email: string;
  accept: (input: { token: string }) => Promise<ActionResult<void>>;
  onward: string;
  resetPath: string;
}) {
  const [entering, setEntering] = useState(false);
  const [wrong, setWrong] = useState<string | null>(null);
  const { submit, pending, failure } = useSubmit(accept, () => {
    window.location.assign(onward);
    return 'leaving';
  });

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (entering || pending) return;
    const password = readText(new FormData(event.currentTarget), 'password');
    setWrong(null);
    setEntering(true);
    const says = await enter(email, password);
    if (says === null) await submit({ token });
    else setWrong(says);
    setEntering(false);
  };

  return (
    <form method="post" onSubmit={(event) => void send(event)} className="grid gap-4">
      <FormFailure failure={failure} />
      {wrong !== null && (
        <Notice tone="stop" live="assertive">
          {wrong}
        </Notice>
      )}
      <p>
        There is an account for <strong>{email}</strong>. Its password signs you in and accepts.
      </p>
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <PasswordField label="Password" name="password" kind="current" />
      <SubmitButton pending={entering || pending} wide>
        Sign in and accept
      </SubmitButton>
      <p className="type-small">
        <TextLink href={resetPath}>Set a new password by e-mail</TextLink>, then follow the invitation again.
      </p>
    </form>
  );
}
