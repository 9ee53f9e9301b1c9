import type { ReactNode } from 'react';
import { PublicShell } from '@/components/app-shell/public-shell';
import { paths } from '@/lib/web/paths';

export default function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <PublicShell
      home={paths.home()}
      links={[
        { href: paths.check(), label: 'Check a roster' },
        { href: paths.signIn(), label: 'Sign in' },
      ]}
      footLinks={[{ href: paths.api.openapi(), label: 'API description' }]}
    >
      {children}
    </PublicShell>
  );
}
