import type { ComponentProps, ReactNode } from 'react';
import { joinClasses } from './join-classes';

/**
 * A white card with a hem. Props: `title` (a section title), `aside` at the right of it, `flush`
 * when the content reaches the edges (tables, lists), `id`.
 */
export function Card({
  title,
  aside,
  flush = false,
  className,
  children,
  ...rest
}: {
  title?: ReactNode;
  aside?: ReactNode;
  flush?: boolean | undefined;
} & Omit<ComponentProps<'section'>, 'title'>) {
  const headed = title !== undefined || aside !== undefined;
  return (
    <section
      {...rest}
      className={joinClasses(
        'border-hem bg-card rounded-card min-w-0 border',
        !flush && 'p-4 sm:p-5',
        className,
      )}
    >
      {headed && (
        <div
          className={joinClasses(
            'flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1',
            flush ? 'px-4 pt-4 pb-3' : 'mb-3',
          )}
        >
          {title !== undefined && <h2 className="type-section">{title}</h2>}
          {aside !== undefined && <div className="type-small text-dusk">{aside}</div>}
        </div>
      )}
      {children}
    </section>
  );
}
