'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import type { MenuGroup } from '@/components/ui/menu';
import { RaglanMark, Wordmark } from '@/components/yoke-tile/raglan-mark';
import { BottomTabs } from './bottom-tabs';
import { LeagueSwitcher } from './league-switcher';
import { MenuDrawer } from './menu-drawer';
import type { NavigationGroup } from './navigation';
import { NavigationList } from './navigation-list';
import { SkipLink } from './skip-link';
import { UserMenu, type ShellUser } from './user-menu';

/**
 * The frame of the signed-in product: a linen side panel at a desk, a top bar with a drawer below 1024 px, tabs at the
 * foot of a phone if given. Printing leaves only the page. Props: `home` (where the wordmark leads), `league`
 * { name, season }, `switchGroups` (menu of other leagues and seasons), `groups` (navigation), `user`, `signOut` (an
 * action), `tabs`, `children` (the page).
 */
export function AppShell({
  home,
  league,
  switchGroups,
  groups,
  user,
  signOut,
  tabs,
  children,
}: {
  home: string;
  league?: { name: string; season: string | null } | undefined;
  switchGroups?: readonly MenuGroup[] | undefined;
  groups: readonly NavigationGroup[];
  user: ShellUser;
  signOut: () => void | Promise<void>;
  tabs?: readonly { href: string; label: string }[] | undefined;
  children: ReactNode;
}) {
  const switcher = league !== undefined && (
    <LeagueSwitcher league={league.name} season={league.season} groups={switchGroups ?? []} />
  );
  return (
    <div className="flex min-h-dvh flex-col lg:grid lg:grid-cols-[13.25rem_minmax(0,1fr)] print:block">
      <SkipLink />

      <aside className="border-hem bg-linen sticky top-0 hidden h-dvh flex-col border-r lg:flex print:hidden">
        <div className="flex grow flex-col gap-4 overflow-y-auto px-3.5 pt-4.5 pb-3">
          <Link href={home} className="rounded-control self-start no-underline">
            <Wordmark />
          </Link>
          {switcher}
          <NavigationList groups={groups} />
        </div>
        <div className="border-hem border-t p-2">
          <UserMenu user={user} signOut={signOut} />
        </div>
      </aside>

      <header className="border-hem bg-linen sticky top-0 z-30 flex min-h-14 items-center gap-2 border-b px-4 pt-[env(safe-area-inset-top)] lg:hidden print:hidden">
        <MenuDrawer>
          {(close) => (
            <>
              {switcher}
              <NavigationList groups={groups} onFollow={close} />
            </>
          )}
        </MenuDrawer>
        <Link
          href={home}
          aria-label="Raglan"
          className="rounded-control flex min-h-11 items-center no-underline"
        >
          <RaglanMark className="w-7" />
        </Link>
        <p className="min-w-0 grow leading-tight">
          <span className="block truncate font-[620]">{league?.name ?? 'Raglan'}</span>
          {league?.season != null && (
            <span className="type-fine text-dusk block truncate">{league.season}</span>
          )}
        </p>
        <UserMenu user={user} signOut={signOut} compact />
      </header>

      <main
        id="content"
        tabIndex={-1}
        className="min-w-0 grow px-4 py-5 outline-none sm:px-6 lg:px-8 lg:py-6 print:p-0"
      >
        <div className="mx-auto max-w-350">{children}</div>
      </main>

      {tabs !== undefined && <BottomTabs tabs={tabs} />}
    </div>
  );
}
