import type { ReactNode } from 'react';
import { PublicShell } from '@/components/app-shell/public-shell';
import { paths } from '@/lib/web/paths';

export default function InboxLayout({ children }: { children: ReactNode }) {
  return (
    <PublicShell
      home={paths.home()}
      links={[
        { href: paths.leagues(), label: 'Your leagues' },
        { href: paths.signIn(), label: 'Sign in' },
      ]}
    >
      {children}
    </PublicShell>
  );
}
