import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { TextLink } from '@/components/ui/text-link';
import { can } from '@/lib/domain/access/permissions';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';

export const metadata: Metadata = { title: 'Match check' };

export default async function MatchPage() {
  const { person } = await requirePerson(paths.match());
  const open = person.leagues.flatMap(({ league, actor }) =>
    league.currentSeason !== null && can(actor, 'match.check')
      ? [{ ...league, season: league.currentSeason }]
      : [],
  );
  const [only] = open;
  if (only && open.length === 1) redirect(paths.matchCheck(only.slug, only.season.slug));
  return (
    <>
      <PageHeader
        title="Match check"
        subtitle="Two teams, their numbers and their kits, before the first whistle."
      />
      <Card flush>
        {open.length === 0 ? (
          <EmptyState title="No league to check matches for">
            Ask a league admin to invite you as a referee.
          </EmptyState>
        ) : (
          <ul>
            {open.map((league) => (
              <li key={league.id} className="border-hem border-t px-4 py-3 first:border-t-0">
                <TextLink href={paths.matchCheck(league.slug, league.season.slug)}>{league.name}</TextLink>
                <span className="text-dusk block">{league.season.name}</span>
              </li>
            ))}
          </ul>
        )}
      </Card>
    </>
  );
}
