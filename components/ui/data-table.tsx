'use client';

import {
  columnFilteringFeature,
  createFilteredRowModel,
  createSortedRowModel,
  globalFilteringFeature,
  rowSortingFeature,
  tableFeatures,
  useTable,
  type ColumnDef,
  type SortingState,
} from '@tanstack/react-table';
import { useMemo, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { Button } from './button';
import type { DataColumn } from './data-column';
import { DataTableHead } from './data-table-head';
import { foldForSearch, holdsEveryWord } from './fold-for-search';
import { EmptyState } from './empty-state';
import { joinClasses } from './join-classes';
import { SearchInput } from './search-input';
import { Select } from './select';
import { useOverflow } from './use-overflow';
import { useWindowRows } from './use-window-rows';

export type { DataColumn };

export type DataTableProps<Row> = {
  /** What the table lists; read aloud. */
  caption: string;
  rows: readonly Row[];
  /** Keep the array outside the component or in useMemo. */
  columns: readonly DataColumn<Row>[];
  getRowId: (row: Row) => string;
  /** What stands here when there are no rows at all: an EmptyState with the first thing to do. */
  empty: ReactNode;
  /** Words of the search box ("Find a team or player"); no box without it. */
  searchLabel?: string;
  /** Filter chips or the like, left of the search box. */
  toolbar?: ReactNode;
  /** Takes the filters of the toolbar off again, when they leave nothing. */
  onClearFilters?: () => void;
  initialSort?: { id: string; desc?: boolean };
  /** Buttons or a Menu of a row, in a column at the right. */
  rowActions?: (row: Row) => ReactNode;
  /** Enter on a row. Offer the same as a link in its first cell. */
  onOpenRow?: (row: Row) => void;
};

const features = tableFeatures({
  columnFilteringFeature,
  globalFilteringFeature,
  rowSortingFeature,
  filteredRowModel: createFilteredRowModel(),
  sortedRowModel: createSortedRowModel(),
});
const collator = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/**
 * A list that can be sorted, searched and walked through: sticky head, arrow keys between rows, actions at the right,
 * cards on a phone, only the rows in sight drawn when there are more than 100. Put it in a flush Card. Client only:
 * columns hold functions. Props: see DataTableProps.
 */
export function DataTable<Row extends object>(props: DataTableProps<Row>) {
  const { caption, rows, columns, getRowId } = props;
  const [search, setSearch] = useState('');
  const [sorting, setSorting] = useState<SortingState>(
    props.initialSort === undefined
      ? []
      : [{ id: props.initialSort.id, desc: props.initialSort.desc ?? false }],
  );

  const searching = search.trim() !== '';
  const texts = useMemo(
    () => new Map(searching ? rows.map((row) => [row, readSearchText(columns, row)]) : []),
    [searching, rows, columns],
  );

  const definitions = useMemo(
    () =>
      columns.map((column, at): ColumnDef<typeof features, Row> => ({
        id: column.id,
        accessorFn: (row) => column.sortValue?.(row) ?? undefined,
        enableSorting: column.sortValue !== undefined,
        sortUndefined: 'last',
        sortFn: (a, b, id) => compare(a.getValue(id), b.getValue(id)),
        // The filter below looks at the whole row, so one column asks for all.
        enableGlobalFilter: at === 0,
      })),
    [columns],
  );

  const table = useTable({
    features,
    columns: definitions,
    data: rows,
    getRowId,
    state: { sorting, globalFilter: searching ? search : '' },
    onSortingChange: setSorting,
    onGlobalFilterChange: setSearch,
    globalFilterFn: (row, _id, words: string) => holdsEveryWord(texts.get(row.original) ?? '', words),
  });
  const shown = table.getRowModel().rows;

  const body = useRef<HTMLTableSectionElement>(null);
  const { ref: frame, overflows } = useOverflow();
  const windowed = useWindowRows(shown.length, body);
  const [active, setActive] = useState(0);
  const reachable = Math.min(active, Math.max(0, shown.length - 1));

  const walk = (event: KeyboardEvent) => {
    const target = event.target as HTMLElement;
    const row = target.closest<HTMLElement>('tr[data-index]');
    // A field or an open menu in a row keeps its own arrow keys.
    if (row === null || (target !== row && !target.matches('a'))) return;
    const at = Number(row.dataset.index);
    const last = shown.length - 1;
    const next = { ArrowDown: at + 1, ArrowUp: at - 1, Home: 0, End: last }[event.key];
    if (next !== undefined) {
      event.preventDefault();
      const to = Math.max(0, Math.min(last, next));
      setActive(to);
      windowed.focusRow(to);
    } else if (event.key === 'Enter' && target === row) {
      const original = shown[at]?.original;
      if (original !== undefined && props.onOpenRow !== undefined) props.onOpenRow(original);
      else row.querySelector<HTMLElement>('a[href]')?.click();
    }
  };

  const sortable = columns.filter((column) => column.sortValue !== undefined);
  const sorted = sorting[0];
  const bare = props.toolbar === undefined && props.searchLabel === undefined;
  const toolbar = (!bare || sortable.length > 0) && (
    <div
      className={joinClasses(
        'flex flex-wrap items-center justify-between gap-3 px-4 py-3 print:hidden',
        bare && 'sm:hidden',
      )}
    >
      {props.toolbar !== undefined && <div className="min-w-0">{props.toolbar}</div>}
      {props.searchLabel !== undefined && (
        <SearchInput
          label={props.searchLabel}
          value={search}
          onChange={(event) => setSearch(event.target.value)}
          className="sm:ml-auto"
        />
      )}
      {sortable.length > 0 && (
        // The headings that sort are out of sight where rows are cards.
        <Select
          aria-label="Sort by"
          className="w-full sm:hidden"
          placeholder="In the usual order"
          value={sorted === undefined ? '' : `${sorted.id} ${sorted.desc ? 'down' : 'up'}`}
          onChange={(event) => setSorting(readSortChoice(event.target.value))}
          options={sortable.flatMap((column) => [
            { value: `${column.id} up`, label: `${column.header}, rising` },
            { value: `${column.id} down`, label: `${column.header}, falling` },
          ])}
        />
      )}
    </div>
  );

  if (rows.length === 0 && props.onClearFilters === undefined) return props.empty;

  const span = columns.length + (props.rowActions === undefined ? 0 : 1);
  return (
    <div>
      {toolbar}
      <p role="status" className="sr-only">
        {search !== '' && `${shown.length} of ${rows.length} found`}
      </p>
      <div ref={frame} className={overflows ? 'relative sm:overflow-x-auto' : 'sm:overflow-x-clip'}>
        <table
          role="table"
          aria-rowcount={windowed.on ? shown.length + 1 : undefined}
          className={joinClasses(
            'rows-as-cards w-full border-separate border-spacing-0 text-left',
            windowed.on && 'table-fixed',
          )}
        >
          <caption className="sr-only">{caption}</caption>
          <DataTableHead
            columns={columns}
            sorting={sorting}
            onSort={setSorting}
            hasActions={props.rowActions !== undefined}
            sticky={!overflows}
            topless={bare}
          />
          <tbody ref={body} role="rowgroup" onKeyDown={walk}>
            {shown.length === 0 && (
              <tr role="row">
                <td role="cell" colSpan={span} className="border-hem border-t">
                  <NoMatch
                    search={search}
                    onClear={search === '' ? props.onClearFilters : () => setSearch('')}
                  />
                </td>
              </tr>
            )}
            {windowed.before > 0 && <Spacer height={windowed.before} span={span} />}
            {windowed.indexes.map((at) => {
              const row = shown[at];
              if (row === undefined) return null;
              return (
                <tr
                  key={row.id}
                  ref={windowed.measure}
                  role="row"
                  data-index={at}
                  aria-rowindex={windowed.on ? at + 2 : undefined}
                  tabIndex={at === reachable ? 0 : -1}
                  onFocus={() => setActive(at)}
                  className="hover:bg-cotton focus-visible:-outline-offset-2"
                >
                  {columns.map((column) => (
                    <DataCell key={column.id} column={column} row={row.original} />
                  ))}
                  {props.rowActions !== undefined && (
                    <td
                      role="cell"
                      data-row-actions=""
                      className={joinClasses(cellLook, 'text-right whitespace-nowrap print:hidden')}
                    >
                      {props.rowActions(row.original)}
                    </td>
                  )}
                </tr>
              );
            })}
            {windowed.after > 0 && <Spacer height={windowed.after} span={span} />}
          </tbody>
        </table>
      </div>
    </div>
  );
}

const cellLook =
  'border-hem h-12 border-t [tr:first-child>&]:border-t-0 px-3 sm:max-lg:px-2 sm:max-lg:first:pl-3 sm:max-lg:last:pr-3 py-2 align-middle font-normal';

function DataCell<Row>({ column, row }: { column: DataColumn<Row>; row: Row }) {
  const look = joinClasses(cellLook, column.end === true && 'sm:text-right');
  return column.rowHead === true ? (
    <th role="rowheader" scope="row" className={joinClasses(look, 'text-left')}>
      {column.cell(row)}
    </th>
  ) : (
    <td role="cell" data-label={column.header} className={look}>
      {column.cell(row)}
    </td>
  );
}

function NoMatch({ search, onClear }: { search: string; onClear: (() => void) | undefined }) {
  return (
    <EmptyState
      title={search === '' ? 'Nothing here fits these filters' : `Nothing fits “${search}”`}
      action={
        onClear !== undefined && (
          <Button onClick={onClear}>{search === '' ? 'Show all' : 'Clear the search'}</Button>
        )
      }
    >
      {search !== '' && 'Try fewer letters. The search looks at what the rows say, accents aside.'}
    </EmptyState>
  );
}

/** Holds the place of the rows that are out of sight. */
function Spacer({ height, span }: { height: number; span: number }) {
  return (
    <tr aria-hidden="true" data-spacer="" style={{ height }}>
      <td colSpan={span} style={{ height, padding: 0 }} />
    </tr>
  );
}

/** The sorting that a value of the phone's sort list stands for: the column's id, then up or down. */
function readSortChoice(value: string): SortingState {
  const at = value.lastIndexOf(' ');
  return at === -1 ? [] : [{ id: value.slice(0, at), desc: value.endsWith(' down') }];
}

function readSearchText<Row>(columns: readonly DataColumn<Row>[], row: Row): string {
  return foldForSearch(columns.map((column) => column.searchText?.(row) ?? '').join(' '));
}

function compare(a: unknown, b: unknown): number {
  return typeof a === 'number' && typeof b === 'number' ? a - b : collator.compare(String(a), String(b));
}
