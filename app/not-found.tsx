import { findEntryLink } from '@/app/_components/entry-link';
import { PublicShell } from '@/components/app-shell/public-shell';
import { ButtonLink } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { paths } from '@/lib/web/paths';

export const metadata = { title: 'No such page' };

export default async function NotFound() {
  return (
    <PublicShell home={paths.home()} links={[await findEntryLink()]}>
      <h1 className="sr-only">No such page</h1>
      <EmptyState
        title="There is no page at this address"
        action={
          <ButtonLink href={paths.home()} look="primary">
            Go to the start page
          </ButtonLink>
        }
      >
        It may have moved, or it belongs to a league you are not signed in to. Check the address, or start
        again from the first page.
      </EmptyState>
    </PublicShell>
  );
}
