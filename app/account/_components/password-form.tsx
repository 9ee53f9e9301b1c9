'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { passwordHint } from '@/app/_components/choose-password-form';
import { enter } from '@/app/_components/enter';
import { FormFailure } from '@/app/_components/form-failure';
import { PasswordField } from '@/app/_components/password-field';
import { useSubmit } from '@/app/_components/use-submit';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import type { ActionResult } from '@/lib/web/action-result';

/** Changes the password; every session ends by it, and this one begins anew. */
export function PasswordForm({
  email,
  change,
}: {
  email: string;
  change: (input: { oldPassword: string; newPassword: string }) => Promise<ActionResult<{ email: string }>>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [oldPassword, setOld] = useState('');
  const [newPassword, setNew] = useState('');
  const { submit, pending, failure, fields } = useSubmit(change, async () => {
    await enter(email, newPassword);
    setOld('');
    setNew('');
    showToast({ tone: 'set', title: 'Password changed', body: 'You were signed out on every other device.' });
    router.refresh();
  });
  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    void submit({ oldPassword, newPassword });
  };
  return (
    <form method="post" onSubmit={send} className="grid gap-4">
      <FormFailure failure={failure} />
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="Password you have now"
        name="oldPassword"
        kind="current"
        error={fields['oldPassword']}
        value={oldPassword}
        onChange={setOld}
      />
      <PasswordField
        label="New password"
        name="newPassword"
        kind="new"
        hint={passwordHint}
        error={fields['newPassword']}
        value={newPassword}
        onChange={setNew}
      />
      <div>
        <SubmitButton pending={pending} look="secondary">
          Change the password
        </SubmitButton>
      </div>
    </form>
  );
}
