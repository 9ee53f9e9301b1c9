import { joinClasses } from '@/components/ui/join-classes';
import type { CellField } from '@/lib/domain/roster/edit';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';

export type Sort = { field: CellField; down: boolean };

/** Which columns the list can be looked at in the order of. */
const sortable = (field: CellField): boolean => field === 'name' || field === 'number';

/** The headings; those of the name and the number sort what is shown, and leave the order of the roster alone. */
export function GridHead({
  columns,
  sort,
  onSort,
  sticky,
}: {
  columns: readonly RosterColumn[];
  sort: Sort | null;
  onSort: (field: CellField) => void;
  sticky: boolean;
}) {
  const look = joinClasses(
    'type-fine text-dusk border-hem bg-card border-y px-3 py-1 font-[560] whitespace-nowrap',
    sticky && 'sticky top-14 z-20 lg:top-0 print:static',
  );
  return (
    <thead role="rowgroup" className="max-sm:sr-only">
      <tr role="row" aria-rowindex={1}>
        {columns.map(({ field, header }, at) => {
          const sorted = sort?.field === field ? (sort.down ? 'descending' : 'ascending') : undefined;
          return (
            <th
              key={field}
              role="columnheader"
              scope="col"
              aria-colindex={at + 1}
              aria-sort={sorted}
              className={joinClasses(look, field === 'number' && 'text-right')}
            >
              {sortable(field) ? (
                <button
                  type="button"
                  title={`Look at the list by ${field === 'number' ? 'number' : 'name'}`}
                  onClick={() => onSort(field)}
                  className={joinClasses(
                    'hover:text-ink inline-flex min-h-7 items-center gap-1',
                    // The arrow keeps its room, and figures stay under their heading.
                    field === 'number' && 'flex-row-reverse',
                    sorted !== undefined && 'text-ink',
                  )}
                >
                  {header}
                  <span aria-hidden="true" className={sorted === undefined ? 'invisible' : undefined}>
                    {sorted === 'descending' ? '↓' : '↑'}
                  </span>
                </button>
              ) : (
                header
              )}
            </th>
          );
        })}
        <th
          role="columnheader"
          scope="col"
          aria-colindex={columns.length + 1}
          className={joinClasses(look, 'print:hidden')}
        >
          What to do
        </th>
        <th
          role="columnheader"
          scope="col"
          aria-colindex={columns.length + 2}
          className={joinClasses(look, 'print:hidden')}
        >
          <span className="sr-only">More</span>
        </th>
      </tr>
    </thead>
  );
}
