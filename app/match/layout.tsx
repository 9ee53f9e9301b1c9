import type { ReactNode } from 'react';
import { PersonShell } from '@/app/_components/person-shell';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';

export default async function MatchLayout({ children }: { children: ReactNode }) {
  const { person } = await requirePerson(paths.match());
  return <PersonShell person={person}>{children}</PersonShell>;
}
