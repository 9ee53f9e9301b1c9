'use client';

import { Menu, type MenuGroup } from '@/components/ui/menu';

/** The league and season the reader is in, and the menu to the others. Props: `league`, `season`, `groups` of the menu. */
export function LeagueSwitcher({
  league,
  season,
  groups,
}: {
  league: string;
  season: string | null;
  groups: readonly MenuGroup[];
}) {
  return (
    <Menu
      align="start"
      groups={groups}
      trigger={
        <button
          type="button"
          className="border-hem bg-card hover:border-thread rounded-control w-full border px-3 py-2 text-left"
        >
          <span className="sr-only">League and season: </span>
          <span className="block truncate font-[620]">{league}</span>
          <span className="text-dusk flex items-center gap-1">
            <span className="truncate">{season ?? 'No season yet'}</span>
            <svg aria-hidden="true" viewBox="0 0 8 8" className="size-2 shrink-0 fill-current">
              <path d="M.5 1.5h7L4 7z" />
            </svg>
          </span>
        </button>
      }
    />
  );
}
