import type { SortingState } from '@tanstack/react-table';
import type { DataColumn } from './data-column';
import { joinClasses } from './join-classes';

/**
 * The head of a data table: plain headings, and buttons for the columns that sort (up, down, as it came). Props:
 * `columns`, `sorting`, `onSort`, `hasActions`, `sticky`, `topless` when nothing stands above it in its card.
 */
export function DataTableHead<Row>({
  columns,
  sorting,
  onSort,
  hasActions,
  sticky,
  topless,
}: {
  columns: readonly DataColumn<Row>[];
  sorting: SortingState;
  onSort: (sorting: SortingState) => void;
  hasActions: boolean;
  sticky: boolean;
  topless: boolean;
}) {
  const look = joinClasses(
    'type-fine text-dusk border-hem bg-card border-b px-3 py-1.5 font-[560] sm:max-lg:px-2 sm:max-lg:first:pl-3 sm:max-lg:last:pr-3 whitespace-nowrap',
    sticky && 'sticky top-14 z-10 lg:top-0 print:static',
    topless && 'first:rounded-tl-card last:rounded-tr-card',
  );
  return (
    <thead role="rowgroup">
      <tr role="row">
        {columns.map((column) => {
          const sorted = sorting.find((sort) => sort.id === column.id);
          return (
            <th
              key={column.id}
              role="columnheader"
              scope="col"
              aria-sort={sorted === undefined ? undefined : sorted.desc ? 'descending' : 'ascending'}
              className={joinClasses(look, column.end === true && 'text-right', column.width)}
            >
              {column.sortValue === undefined ? (
                <span className={column.headerHidden === true ? 'sr-only' : undefined}>{column.header}</span>
              ) : (
                <button
                  type="button"
                  onClick={() => onSort(turnSort(sorting, column.id))}
                  className={joinClasses(
                    'hover:text-ink inline-flex min-h-7 items-center gap-1',
                    sorted !== undefined && 'text-ink',
                  )}
                >
                  {column.header}
                  <SortSign direction={sorted === undefined ? null : sorted.desc ? 'desc' : 'asc'} />
                </button>
              )}
            </th>
          );
        })}
        {hasActions && (
          <th role="columnheader" scope="col" className={joinClasses(look, 'print:hidden')}>
            <span className="sr-only">Actions</span>
          </th>
        )}
      </tr>
    </thead>
  );
}

/** The next sorting when a heading is pressed: rising, falling, then as the rows came. */
function turnSort(sorting: SortingState, id: string): SortingState {
  const present = sorting.find((sort) => sort.id === id);
  if (present === undefined) return [{ id, desc: false }];
  return present.desc ? [] : [{ id, desc: true }];
}

function SortSign({ direction }: { direction: 'asc' | 'desc' | null }) {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 8 10"
      // A tablet has no room for signs that say only what could be done.
      className={joinClasses('h-2.5 w-2 shrink-0 fill-current', direction === null && 'sm:max-lg:hidden')}
    >
      <path d="M.5 4L4 .5 7.5 4z" opacity={direction === 'asc' ? 1 : 0.3} />
      <path d="M.5 6L4 9.5 7.5 6z" opacity={direction === 'desc' ? 1 : 0.3} />
    </svg>
  );
}
