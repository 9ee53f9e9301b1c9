'use client';

import { useRouter } from 'next/navigation';
import { useTransition } from 'react';
import { Button } from '@/components/ui/button';

/** Asks for the page's data once more. */
export function RefreshButton() {
  const router = useRouter();
  const [pending, startTransition] = useTransition();
  return (
    <Button pending={pending} onClick={() => startTransition(() => router.refresh())}>
      Look again
    </Button>
  );
}
