'use client';

import { useRef, useState, type FormEvent } from 'react';
import { enter } from '@/app/_components/enter';
import { PasswordField } from '@/app/_components/password-field';
import { readText } from '@/app/_components/use-submit';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { Seam } from '@/components/ui/seam';
import { SubmitButton } from '@/components/ui/submit-button';
import { TextLink } from '@/components/ui/text-link';
import { DemoSignIns } from './demo-sign-ins';

/** Address and password. `onward` is this page again: it sends whoever is signed in to where they wanted to go. */
export function SignInForm({
  onward,
  resetPath,
  failed,
  demo,
}: {
  onward: string;
  resetPath: string;
  failed: boolean;
  demo: boolean;
}) {
  // The inputs keep their own text: a browser may have filled them before this code has run.
  const form = useRef<HTMLFormElement>(null);
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<string | null>(
    failed ? 'Signing in did not work. Try it once more.' : null,
  );

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (pending) return;
    const typed = new FormData(event.currentTarget);
    setPending(true);
    setFailure(null);
    const says = await enter(readText(typed, 'email'), readText(typed, 'password'));
    if (says === null) {
      // A whole new page: nothing that was shown to somebody else before stays in this tab's memory.
      window.location.assign(onward);
      return;
    }
    setFailure(says);
    setPending(false);
  };

  return (
    <>
      <form ref={form} method="post" onSubmit={(event) => void send(event)} className="grid gap-4">
        {failure !== null && (
          <Notice tone="stop" live="assertive">
            {failure}
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
        />
        <PasswordField label="Password" name="password" kind="current" />
        <SubmitButton pending={pending} wide>
          Sign in
        </SubmitButton>
        <p className="type-small">
          <TextLink href={resetPath}>Set a new password by e-mail</TextLink>
        </p>
      </form>
      {demo && (
        <>
          <Seam className="my-5" />
          <DemoSignIns
            onChoose={(account) => {
              fill(form.current, account);
              setFailure(null);
            }}
          />
        </>
      )}
    </>
  );
}

function fill(form: HTMLFormElement | null, texts: Record<string, string>): void {
  for (const [name, text] of Object.entries(texts)) {
    const input = form?.elements.namedItem(name);
    if (input instanceof HTMLInputElement) input.value = text;
  }
}
