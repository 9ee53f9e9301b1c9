'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { Tabs as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';

const strip = 'border-hem flex gap-1 overflow-x-auto border-b print:hidden';
const tabLook =
  'touch -mb-px shrink-0 border-b-2 px-3 font-[560] whitespace-nowrap no-underline focus-visible:-outline-offset-2 inline-flex items-center';
const resting = 'text-dusk hover:text-ink border-transparent';
const chosen = 'border-damson text-ink';

/** Views of one thing, one at a time. Props: `label`, `tabs` { id, label, content }, `initial` id. Arrow keys move. */
export function Tabs({
  label,
  tabs,
  initial,
}: {
  label: string;
  tabs: readonly { id: string; label: ReactNode; content: ReactNode }[];
  initial?: string | undefined;
}) {
  return (
    <Radix.Root defaultValue={initial ?? tabs[0]?.id ?? ''}>
      <Radix.List aria-label={label} className={strip}>
        {tabs.map((tab) => (
          <Radix.Trigger
            key={tab.id}
            value={tab.id}
            className={joinClasses(
              tabLook,
              'text-dusk hover:text-ink data-[state=active]:border-damson data-[state=active]:text-ink border-transparent',
            )}
          >
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.id} value={tab.id} className="pt-4">
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}

/** The same look for views that have addresses of their own. Props: `label`, `tabs` { href, label }. */
export function LinkTabs({
  label,
  tabs,
}: {
  label: string;
  tabs: readonly { href: string; label: ReactNode }[];
}) {
  const pathname = usePathname();
  return (
    <nav aria-label={label} className={joinClasses(strip, 'mb-4')}>
      {tabs.map((tab) => (
        <Link
          key={tab.href}
          href={tab.href}
          aria-current={tab.href === pathname ? 'page' : undefined}
          className={joinClasses(tabLook, tab.href === pathname ? chosen : resting)}
        >
          {tab.label}
        </Link>
      ))}
    </nav>
  );
}
