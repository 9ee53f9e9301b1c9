'use client';

import { signOut } from 'next-auth/react';
import type { ComponentProps } from 'react';
import { AppShell } from '@/components/app-shell/app-shell';

/** The frame of signed-in pages with the way out: signing out ends at the start page. Props: those of AppShell. */
export function SignedInShell(props: Omit<ComponentProps<typeof AppShell>, 'signOut'>) {
  return <AppShell {...props} signOut={() => void signOut({ callbackUrl: '/' })} />;
}
