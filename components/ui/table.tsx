import type { ComponentProps, ReactNode } from 'react';
import { joinClasses } from './join-classes';

/**
 * Pieces of a static table. `Table` props: `caption` (read aloud), `cards` turns rows into
 * cards on a phone and then every Td needs `label`. For lists that are sorted or searched use DataTable.
 */
export function Table({
  caption,
  cards = false,
  className,
  children,
  ...rest
}: { caption: ReactNode; cards?: boolean } & ComponentProps<'table'>) {
  return (
    <div className={joinClasses('min-w-0', cards ? 'sm:overflow-x-auto' : 'overflow-x-auto')}>
      <table
        {...rest}
        role="table"
        className={joinClasses('w-full border-collapse text-left', cards && 'rows-as-cards', className)}
      >
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  );
}

/** The head: `<Thead><Th>…</Th></Thead>`. */
export function Thead({ children }: { children: ReactNode }) {
  return (
    <thead role="rowgroup">
      <tr role="row" className="border-hem border-b">
        {children}
      </tr>
    </thead>
  );
}

/** The rows. */
export function Tbody({ children }: { children: ReactNode }) {
  return <tbody role="rowgroup">{children}</tbody>;
}

/** One row with a hem above it. */
export function Tr({ className, ...rest }: ComponentProps<'tr'>) {
  return (
    <tr role="row" {...rest} className={joinClasses('border-hem border-t first:border-t-0', className)} />
  );
}

/** A heading. Props: `end` aligns figures to the right, `hidden words` by `srOnly`. */
export function Th({
  end = false,
  srOnly = false,
  className,
  children,
  ...rest
}: { end?: boolean; srOnly?: boolean } & ComponentProps<'th'>) {
  return (
    <th
      role="columnheader"
      scope="col"
      {...rest}
      className={joinClasses(
        'type-fine text-dusk px-3 py-2 font-[560] whitespace-nowrap',
        end && 'text-right',
        className,
      )}
    >
      {srOnly ? <span className="sr-only">{children}</span> : children}
    </th>
  );
}

/** A cell. Props: `label` is its heading on a phone, `end` aligns figures to the right, `rowHead` names the row. */
export function Td({
  label,
  end = false,
  rowHead = false,
  className,
  ...rest
}: { label?: string; end?: boolean; rowHead?: boolean } & ComponentProps<'td'>) {
  const look = joinClasses('px-3 py-2.5 align-middle font-normal', end && 'sm:text-right', className);
  return rowHead ? (
    <th
      role="rowheader"
      scope="row"
      {...rest}
      data-label={label}
      className={joinClasses('text-left', look)}
    />
  ) : (
    <td role="cell" {...rest} data-label={label} className={look} />
  );
}
