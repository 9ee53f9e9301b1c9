import type { ReactNode } from 'react';
import type { Person } from '@/lib/domain/league/league';
import { describePerson, listAccountItems, listPersonNavigation } from '@/lib/web/person-navigation';
import { paths } from '@/lib/web/paths';
import { SignedInShell } from './signed-in-shell';

/** The frame of signed-in pages that belong to no one league: the person's leagues at the side. */
export function PersonShell({ person, children }: { person: Person; children: ReactNode }) {
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
