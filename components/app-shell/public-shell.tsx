import Link from 'next/link';
import type { ReactNode } from 'react';
import { Wordmark } from '@/components/yoke-tile/raglan-mark';
import { SkipLink } from './skip-link';

type PublicLink = { href: string; label: string };

/** The frame of the pages anybody may open. Props: `home`, `links` in the head, `footLinks`, children. */
export function PublicShell({
  home,
  links,
  footLinks = [],
  children,
}: {
  home: string;
  links: readonly PublicLink[];
  footLinks?: readonly PublicLink[];
  children: ReactNode;
}) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className="border-hem border-b print:hidden">
        <div className="mx-auto flex min-h-15 max-w-300 flex-wrap items-center justify-between gap-x-4 px-4 sm:px-6">
          <Link
            href={home}
            aria-label="Raglan, start page"
            className="rounded-control flex min-h-11 items-center no-underline"
          >
            <Wordmark />
          </Link>
          <nav aria-label="Main" className="-mr-3 flex flex-wrap">
            {links.map((link) => (
              <Link
                key={link.href}
                href={link.href}
                className="rounded-control hover:bg-linen flex min-h-11 items-center px-3 font-[560] no-underline"
              >
                {link.label}
              </Link>
            ))}
          </nav>
        </div>
      </header>
      <main
        id="content"
        tabIndex={-1}
        className="mx-auto w-full max-w-300 min-w-0 grow px-4 py-6 outline-none sm:px-6 sm:py-6"
      >
        {children}
      </main>
      <footer className="border-hem border-t print:hidden">
        <div className="type-small text-dusk mx-auto flex max-w-300 flex-wrap items-center justify-between gap-x-6 gap-y-1 px-4 py-3 sm:px-6">
          <p>Raglan runs a league’s uniforms, from the first roster to hand-out day.</p>
          {footLinks.length > 0 && (
            <nav aria-label="More" className="-mx-2 flex flex-wrap">
              {footLinks.map((link) => (
                <Link
                  key={link.href}
                  href={link.href}
                  className="rounded-control hover:text-ink flex min-h-9 items-center px-2 underline underline-offset-3 max-sm:min-h-11"
                >
                  {link.label}
                </Link>
              ))}
            </nav>
          )}
        </div>
      </footer>
    </div>
  );
}
