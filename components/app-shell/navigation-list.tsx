'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { joinClasses } from '@/components/ui/join-classes';
import { findCurrent, type NavigationGroup, type NavigationItem } from './navigation';

/** The grouped navigation; the line of the present page is inked. Props: `groups`, `onFollow` when a line is chosen. */
export function NavigationList({
  groups,
  onFollow,
}: {
  groups: readonly NavigationGroup[];
  onFollow?: () => void;
}) {
  const current = findCurrent(
    usePathname(),
    groups.flatMap((group) => group.items.map((item) => item.href)),
  );
  return (
    <nav aria-label="League" className="grid gap-3">
      {groups.map((group) => (
        <div key={group.title}>
          <h2 className="type-fine text-dusk px-2.5 pt-1 pb-1.5 font-[560]">{group.title}</h2>
          <ul className="grid gap-0.5">
            {group.items.map((item) => (
              <li key={item.href}>
                <Line item={item} current={item.href === current} onFollow={onFollow} />
              </li>
            ))}
          </ul>
        </div>
      ))}
    </nav>
  );
}

function Line({
  item,
  current,
  onFollow,
}: {
  item: NavigationItem;
  current: boolean;
  onFollow: (() => void) | undefined;
}) {
  const counted = item.count !== undefined && item.count > 0;
  return (
    <Link
      href={item.href}
      aria-current={current ? 'page' : undefined}
      onClick={() => onFollow?.()}
      className={joinClasses(
        'touch rounded-control flex items-center justify-between gap-3 px-2.5 py-1 no-underline sm:pointer-fine:min-h-8.5',
        current ? 'bg-ink text-on-ink font-[600]' : 'hover:bg-hem/60 font-[450]',
      )}
    >
      {item.label}
      {counted && (
        <span className={joinClasses('font-[640]', current ? 'text-stop-wash' : 'text-stop')}>
          {item.count}
          {item.countLabel !== undefined && <span className="sr-only"> {item.countLabel}</span>}
        </span>
      )}
    </Link>
  );
}
