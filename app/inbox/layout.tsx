import type { ReactNode } from 'react';
import { findEntryLink } from '@/app/_components/entry-link';
import { PublicShell } from '@/components/app-shell/public-shell';
import { paths } from '@/lib/web/paths';

export default async function InboxLayout({ children }: { children: ReactNode }) {
  return (
    <PublicShell home={paths.home()} links={[await findEntryLink()]}>
      {children}
    </PublicShell>
  );
}
