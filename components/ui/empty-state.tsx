import type { ReactNode } from 'react';

/**
 * What a list says when there is nothing in it: a sentence with the first thing to do, and its button. Props: `title`,
 * `children` (the sentence), `action`, `picture`.
 */
export function EmptyState({
  title,
  children,
  action,
  picture,
}: {
  title: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
  picture?: ReactNode;
}) {
  return (
    <div className="grid justify-items-center gap-2 px-5 py-12 text-center">
      {picture}
      <p className="type-section">{title}</p>
      {children !== undefined && <div className="text-dusk max-w-[46ch]">{children}</div>}
      {action !== undefined && <div className="mt-3 flex flex-wrap justify-center gap-2">{action}</div>}
    </div>
  );
}
