import type { ReactNode } from 'react';

/**
 * The head of a page. Props: `title`, `subtitle` with the figures, `picture` before it (a yoke tile), `actions` at the
 * right, `back` (a BackLink) above.
 */
export function PageHeader({
  title,
  subtitle,
  picture,
  actions,
  back,
}: {
  title: ReactNode;
  subtitle?: ReactNode;
  picture?: ReactNode;
  actions?: ReactNode;
  back?: ReactNode;
}) {
  return (
    <header className="mb-5">
      {back !== undefined && <div className="mb-1 print:hidden">{back}</div>}
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div className="flex min-w-0 items-center gap-4">
          {picture}
          <div className="min-w-0">
            <h1 className="type-page break-words">{title}</h1>
            {subtitle !== undefined && <p className="text-dusk mt-1">{subtitle}</p>}
          </div>
        </div>
        {actions !== undefined && (
          <div className="flex flex-wrap gap-2 max-sm:w-full max-sm:*:grow print:hidden">{actions}</div>
        )}
      </div>
    </header>
  );
}
