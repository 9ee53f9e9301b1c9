import { EmptyState } from '@/components/ui/empty-state';

export default function NothingInThisLeague() {
  return (
    <>
      <h1 className="sr-only">No such page</h1>
      <EmptyState title="There is no such page in this league">
        It may have been renamed or removed, or your role does not include it. Choose a page from the menu, or
        ask a league admin.
      </EmptyState>
    </>
  );
}
