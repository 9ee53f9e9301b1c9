import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import { describeRoles } from '@/lib/domain/access/describe-roles';
import { listAbilities } from '@/lib/domain/access/permissions';
import { listSeasonLinks } from '@/lib/use-cases/seasons/list-season-links';
import { listAccountItems } from '@/lib/web/person-navigation';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { LeagueShell } from './_components/league-shell';

type Props = { params: Promise<{ league: string }>; children: ReactNode };

export default async function LeagueLayout({ params, children }: Props) {
  const { league: slug } = await params;
  const asked = (await headers()).get('x-raglan-path') ?? paths.league(slug);
  const { person, ctx } = await requireLeague(slug, asked);
  return (
    <LeagueShell
      league={{ slug, name: ctx.league.name }}
      currentSeason={ctx.league.currentSeason?.slug ?? null}
      seasons={await listSeasonLinks(ctx)}
      abilities={listAbilities(ctx.actor)}
      otherLeagues={person.leagues
        .filter(({ league }) => league.slug !== slug)
        .map(({ league }) => ({ slug: league.slug, name: league.name }))}
      user={{ name: person.name, roles: describeRoles(ctx.actor.roles), items: listAccountItems() }}
    >
      {children}
    </LeagueShell>
  );
}
