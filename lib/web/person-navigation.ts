import type { Person } from '@/lib/domain/league/league';
import { can, type Role } from '@/lib/domain/access/permissions';
import { countOf } from '@/lib/domain/text/count-of';
import { capitalise } from '@/lib/domain/text/sentence';
import { paths } from './paths';

type Group = { title: string; items: { href: string; label: string }[] };

/** The navigation of pages that belong to no one league: the shop's batches, match check, and the person's leagues. */
export function listPersonNavigation(person: Person): Group[] {
  const isDecorator = person.leagues.some(({ actor }) => actor.roles.includes('decorator'));
  const mayCheck = person.leagues.some(({ actor }) => can(actor, 'match.check'));
  const own = person.leagues.filter(({ actor }) =>
    actor.roles.some((role) => role === 'league admin' || role === 'team manager'),
  );
  const groups: Group[] = [
    { title: 'Make', items: isDecorator ? [{ href: paths.shop(), label: 'Batches' }] : [] },
    { title: 'Play', items: mayCheck ? [{ href: paths.match(), label: 'Match check' }] : [] },
    {
      title: 'Leagues',
      items: [
        ...own.map(({ league }) => ({ href: paths.league(league.slug), label: league.name })),
        { href: paths.leagues(), label: 'All leagues' },
      ],
    },
  ];
  return groups.filter((group) => group.items.length > 0);
}

/** What a person is, in one line: their roles over all leagues, then in how many leagues. */
export function describePerson(person: Person): string {
  const held = new Set<Role>(person.leagues.flatMap(({ actor }) => actor.roles));
  if (held.size === 0) return 'no league yet';
  const roles = [...held].join(', ');
  return `${capitalise(roles)} in ${countOf(person.leagues.length, 'league')}`;
}

/** The lines of the person's own menu. */
export const listAccountItems = () => [
  { label: 'Your account', href: paths.account() },
  { label: 'Your leagues', href: paths.leagues() },
];
