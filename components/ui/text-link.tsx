import Link from 'next/link';
import type { ComponentProps, ReactNode } from 'react';
import { Icon } from './icon';
import { joinClasses } from './join-classes';

/** A link in running text or a cell. Props: those of next/link. */
export function TextLink({ className, ...rest }: ComponentProps<typeof Link>) {
  return (
    <Link
      {...rest}
      className={joinClasses(
        'text-damson hover:text-damson-deep font-[560] underline decoration-1 underline-offset-3 hover:decoration-2',
        className,
      )}
    />
  );
}

/** The way up, above a page's title. Props: `href`, the name of where it leads. */
export function BackLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link
      href={href}
      className="type-small text-dusk hover:text-ink inline-flex min-h-8 items-center gap-1.5 no-underline max-sm:min-h-11"
    >
      <Icon name="back" size={14} />
      {children}
    </Link>
  );
}
