import type { ReactNode } from 'react';
import { StatusMark } from './status-mark';

/**
 * What a page or a card says when it failed. Props: `title` (what failed), `children` (what to do), `action` (the retry
 * button), `reference` (the id to quote to whoever runs the server).
 */
export function ErrorState({
  title,
  children,
  action,
  reference,
}: {
  title: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
  reference?: string | undefined;
}) {
  return (
    <div role="alert" className="grid justify-items-center gap-2 px-5 py-12 text-center">
      <StatusMark tone="stop" size={22} />
      <p className="type-section">{title}</p>
      {children !== undefined && <div className="text-dusk max-w-[52ch]">{children}</div>}
      {action !== undefined && <div className="mt-3 flex flex-wrap justify-center gap-2">{action}</div>}
      {reference !== undefined && (
        <p className="type-small text-dusk mt-2">
          Reference <span className="type-code text-ink break-all">{reference}</span>
        </p>
      )}
    </div>
  );
}
