'use client';

import { signOut } from 'next-auth/react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import type { ActionResult } from '@/lib/web/action-result';

/** For somebody who is signed in: one button, or the way out when the invitation is for another address. */
export function AcceptWhenSignedIn({
  token,
  invited,
  signedInAs,
  accept,
  onward,
  here,
}: {
  token: string;
  invited: string;
  signedInAs: string;
  accept: (input: { token: string }) => Promise<ActionResult<void>>;
  onward: string;
  here: string;
}) {
  const { submit, pending, failure } = useSubmit(accept, () => {
    window.location.assign(onward);
    return 'leaving';
  });
  if (invited !== signedInAs) {
    return (
      <div className="grid gap-4">
        <p>
          The invitation was sent to <strong>{invited}</strong>, and you are signed in as{' '}
          <strong>{signedInAs}</strong>. Sign out here, and accept it with the address it was sent to.
        </p>
        <Button look="primary" wide onClick={() => void signOut({ callbackUrl: here })}>
          Sign out and go on
        </Button>
      </div>
    );
  }
  return (
    <div className="grid gap-4">
      <FormFailure failure={failure} />
      <p>
        You are signed in as <strong>{signedInAs}</strong>.
      </p>
      <Button look="primary" wide pending={pending} onClick={() => void submit({ token })}>
        Accept the invitation
      </Button>
    </div>
  );
}
