'use client';

import { startTransition } from 'react';
import { Icon } from '@/components/ui/icon';
import { Menu, type MenuItem } from '@/components/ui/menu';

/** Who is signed in. `roles` is one line: "League admin, referee". `items` come before Sign out. */
export type ShellUser = { name: string; roles: string; items?: readonly MenuItem[] | undefined };

/** The signed-in person's menu. Props: `user`, `signOut`, `compact` shows only the drawing (phone). */
export function UserMenu({
  user,
  signOut,
  compact = false,
}: {
  user: ShellUser;
  signOut: () => void | Promise<void>;
  compact?: boolean;
}) {
  const leave: MenuItem = {
    label: 'Sign out',
    icon: 'leave',
    onSelect: () => startTransition(async () => signOut()),
  };
  const groups = [{ items: user.items ?? [] }, { items: [leave] }].filter((group) => group.items.length > 0);
  return (
    <Menu
      align={compact ? 'end' : 'start'}
      groups={groups}
      heading={
        compact ? (
          <>
            <span className="block font-[620]">{user.name}</span>
            <span className="type-fine text-dusk block">{user.roles}</span>
          </>
        ) : undefined
      }
      trigger={
        compact ? (
          <button
            type="button"
            aria-label={`Your account, ${user.name}`}
            className="touch-square rounded-control hover:bg-hem/60 inline-flex items-center justify-center"
          >
            <Icon name="person" size={18} />
          </button>
        ) : (
          <button
            type="button"
            className="touch rounded-control hover:bg-hem/60 flex w-full items-center gap-2.5 px-2.5 py-1.5 text-left"
          >
            <span className="min-w-0 grow">
              <span className="block truncate font-[560]">{user.name}</span>
              <span className="type-fine text-dusk block truncate">{user.roles}</span>
            </span>
            <Icon name="up" className="text-dusk" />
          </button>
        )
      }
    />
  );
}
