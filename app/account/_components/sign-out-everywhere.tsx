'use client';

import { signOut } from 'next-auth/react';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import type { ActionResult } from '@/lib/web/action-result';

/** Ends the sessions of every device. */
export function SignOutEverywhere({
  end,
  onward,
}: {
  end: (input: Record<string, never>) => Promise<ActionResult<void>>;
  onward: string;
}) {
  const run = async () => {
    const result = await end({});
    if (!result.ok) return result.error.message;
    await signOut({ callbackUrl: onward });
  };
  return (
    <div className="grid gap-3">
      <p>
        Lost a phone, or left a computer signed in? Sign out on every device at once. A session also ends by
        itself after eight hours.
      </p>
      <div>
        <ConfirmDialog
          title="Sign out on every device?"
          confirm="Sign out everywhere"
          cancel="Stay signed in"
          onConfirm={run}
          trigger={<Button look="danger">Sign out everywhere</Button>}
        >
          You are signed out here too. What is typed and not saved, on any device, is lost.
        </ConfirmDialog>
      </div>
    </div>
  );
}
