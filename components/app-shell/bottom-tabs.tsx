'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { joinClasses } from '@/components/ui/join-classes';
import { findCurrent } from './navigation';

/** The tabs at the foot of a phone, three or four of them, with an ink bar over the present one. Props: `tabs`. */
export function BottomTabs({ tabs }: { tabs: readonly { href: string; label: string }[] }) {
  const current = findCurrent(
    usePathname(),
    tabs.map((tab) => tab.href),
  );
  return (
    <nav
      aria-label="Main"
      className="border-hem bg-linen sticky bottom-0 z-30 flex border-t pb-[env(safe-area-inset-bottom)] lg:hidden print:hidden"
    >
      {tabs.map((tab) => (
        <Link
          key={tab.href}
          href={tab.href}
          aria-current={tab.href === current ? 'page' : undefined}
          className={joinClasses(
            '-mt-px flex min-h-12 flex-1 items-center justify-center border-t-3 px-1 text-center no-underline focus-visible:-outline-offset-2',
            tab.href === current ? 'border-ink font-[620]' : 'text-dusk border-transparent',
          )}
        >
          {tab.label}
        </Link>
      ))}
    </nav>
  );
}
