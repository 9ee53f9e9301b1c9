import type { ReactNode } from 'react';
import { PublicShell } from '@/components/app-shell/public-shell';
import { paths } from '@/lib/web/paths';
import { findPersonOfRequest } from '@/lib/web/session';

export default async function InboxLayout({ children }: { children: ReactNode }) {
  const person = await findPersonOfRequest();
  return (
    <PublicShell
      home={paths.home()}
      links={[
        person === undefined
          ? { href: paths.signIn(), label: 'Sign in' }
          : { href: paths.leagues(), label: 'Your leagues' },
      ]}
    >
      {children}
    </PublicShell>
  );
}
