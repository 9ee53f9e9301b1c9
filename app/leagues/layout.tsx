import type { ReactNode } from 'react';
import { SignedInShell } from '@/app/_components/signed-in-shell';
import { describePerson, listAccountItems, listPersonNavigation } from '@/lib/web/person-navigation';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';

export default async function LeaguesLayout({ children }: { children: ReactNode }) {
  const { person } = await requirePerson(paths.leagues());
  return (
    <SignedInShell
      home={paths.leagues()}
      groups={listPersonNavigation(person)}
      user={{ name: person.name, roles: describePerson(person), items: listAccountItems() }}
    >
      {children}
    </SignedInShell>
  );
}
