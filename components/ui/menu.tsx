'use client';

import Link from 'next/link';
import { DropdownMenu as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Icon, type IconName } from './icon';
import { joinClasses } from './join-classes';

/** One line of a menu: it opens `href`, or calls `onSelect`. `current` marks where the reader is. */
export type MenuItem = {
  label: ReactNode;
  hint?: ReactNode;
  icon?: IconName | undefined;
  href?: string | undefined;
  onSelect?: (() => void) | undefined;
  danger?: boolean | undefined;
  disabled?: boolean | undefined;
  current?: boolean | undefined;
};

/** Lines that belong together, under a heading if they need one. */
export type MenuGroup = { title?: string | undefined; items: readonly MenuItem[] };

/**
 * A menu under its button. Props: `trigger` (a button), `groups`, `align` start or end, `heading` (read and shown above
 * the first group). Arrow keys, typing a first letter, Escape.
 */
export function Menu({
  trigger,
  groups,
  align = 'end',
  heading,
}: {
  trigger: ReactNode;
  groups: readonly MenuGroup[];
  align?: 'start' | 'end';
  heading?: ReactNode;
}) {
  return (
    <Radix.Root modal={false}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          align={align}
          sideOffset={6}
          collisionPadding={8}
          className="animate-rise rounded-card border-thread bg-card text-ink z-50 max-h-[min(28rem,var(--radix-dropdown-menu-content-available-height))] min-w-52 overflow-y-auto border p-1.5 print:hidden"
        >
          {heading !== undefined && <div className="px-2.5 pt-1.5 pb-2">{heading}</div>}
          {groups.map((group, at) => (
            <Radix.Group
              key={group.title ?? at}
              className={joinClasses((at > 0 || heading !== undefined) && 'border-hem mt-1 border-t pt-1')}
            >
              {group.title !== undefined && (
                <Radix.Label className="type-fine text-dusk px-2.5 pt-1.5 pb-1 font-[560]">
                  {group.title}
                </Radix.Label>
              )}
              {group.items.map((item, place) => (
                <Line key={place} item={item} />
              ))}
            </Radix.Group>
          ))}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

function Line({ item }: { item: MenuItem }) {
  const body = (
    <>
      {item.icon !== undefined && <Icon name={item.icon} />}
      <span className="min-w-0 grow">
        <span className="block">{item.label}</span>
        {item.hint !== undefined && <span className="type-fine text-dusk block">{item.hint}</span>}
      </span>
      {item.current === true && <Icon name="tick" className="text-damson" />}
    </>
  );
  return (
    <Radix.Item
      asChild={item.href !== undefined}
      disabled={item.disabled ?? false}
      {...(item.onSelect === undefined ? {} : { onSelect: item.onSelect })}
      className={joinClasses(
        'touch data-highlighted:bg-linen flex cursor-pointer items-center gap-2.5 rounded-control px-2.5 py-1.5 no-underline outline-none data-disabled:cursor-not-allowed data-disabled:text-dusk',
        item.danger === true && 'text-stop',
      )}
    >
      {item.href === undefined ? (
        body
      ) : (
        <Link href={item.href} aria-current={item.current === true ? 'page' : undefined}>
          {body}
        </Link>
      )}
    </Radix.Item>
  );
}
