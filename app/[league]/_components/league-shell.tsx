'use client';

import { useParams, usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { SignedInShell } from '@/app/_components/signed-in-shell';
import type { ShellUser } from '@/components/app-shell/user-menu';
import type { MenuGroup } from '@/components/ui/menu';
import type { Permission } from '@/lib/domain/access/permissions';
import { paths } from '@/lib/web/paths';
import { findSameSubject, listLeagueNavigation, listPhoneTabs } from './league-navigation';

type SeasonLink = { slug: string; name: string };

/**
 * The frame of a league's pages. A layout is not told which season is open, so the panel is put together here, from the
 * address. Props: `league`, `currentSeason` slug, `seasons`, `abilities`, `otherLeagues`, `user`.
 */
export function LeagueShell({
  league,
  currentSeason,
  seasons,
  abilities,
  otherLeagues,
  user,
  children,
}: {
  league: { slug: string; name: string };
  currentSeason: string | null;
  seasons: readonly SeasonLink[];
  abilities: readonly Permission[];
  otherLeagues: readonly { slug: string; name: string }[];
  user: ShellUser;
  children: ReactNode;
}) {
  const pathname = usePathname();
  const asked = useParams<{ season?: string }>().season;
  const open =
    seasons.find((season) => season.slug === asked) ??
    seasons.find((season) => season.slug === currentSeason) ??
    seasons[0];
  const facts = { league: league.slug, season: open?.slug ?? null, abilities };
  const tabs = listPhoneTabs(facts);
  const mayOpen = abilities.includes('season.write');
  const switchGroups: MenuGroup[] = [
    {
      title: 'Seasons',
      items: [
        ...seasons.map((season) => ({
          label: season.name,
          current: season.slug === open?.slug,
          hint: season.slug === currentSeason && seasons.length > 1 ? 'current season' : undefined,
          href: findSameSubject(pathname, asked ?? null, { ...facts, season: season.slug }),
        })),
        ...(mayOpen
          ? [{ label: 'Open a season', icon: 'add' as const, href: paths.newSeason(league.slug) }]
          : []),
      ],
    },
    {
      title: 'Leagues',
      items: [
        ...otherLeagues.map((other) => ({ label: other.name, href: paths.league(other.slug) })),
        { label: 'All leagues', href: paths.leagues() },
      ],
    },
  ].filter((group) => group.items.length > 0);

  return (
    <SignedInShell
      home={paths.league(league.slug)}
      league={{ name: league.name, season: open?.name ?? null }}
      switchGroups={switchGroups}
      groups={listLeagueNavigation(facts)}
      user={user}
      tabs={tabs.length > 0 ? tabs : undefined}
    >
      {children}
    </SignedInShell>
  );
}
