import type { ReactNode } from 'react';

/** One large figure of a page. `value` is set like a jersey number; `note` stands small under it. */
export type KeyFigure = { label: string; value: ReactNode; note?: ReactNode };

/** The few figures a page is about, side by side; place it in a flush card. Props: `figures` (two to five). */
export function KeyFigures({ figures }: { figures: readonly KeyFigure[] }) {
  return (
    <dl className="grid auto-cols-fr grid-cols-2 sm:grid-flow-col sm:grid-cols-none">
      {figures.map((figure) => (
        <div
          key={figure.label}
          className="border-hem px-4 py-3.5 max-sm:border-t max-sm:even:border-l max-sm:[&:nth-child(-n+2)]:border-t-0 sm:border-l sm:first:border-l-0"
        >
          <dt className="text-dusk">{figure.label}</dt>
          <dd className="type-jersey mt-1 text-[2.25rem]">{figure.value}</dd>
          {figure.note !== undefined && <dd className="type-small text-dusk mt-1">{figure.note}</dd>}
        </div>
      ))}
    </dl>
  );
}
