import type { ReactNode } from 'react';
import { findEntryLink } from '@/app/_components/entry-link';
import { PublicShell } from '@/components/app-shell/public-shell';
import { paths } from '@/lib/web/paths';

export default async function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <PublicShell
      home={paths.home()}
      links={[{ href: paths.check(), label: 'Check a roster' }, await findEntryLink()]}
      footLinks={[{ href: paths.api.openapi(), label: 'API description' }]}
    >
      {children}
    </PublicShell>
  );
}
