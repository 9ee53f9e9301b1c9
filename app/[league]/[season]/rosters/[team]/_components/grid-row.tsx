import type { MouseEvent, ReactNode } from 'react';
import { joinClasses } from '@/components/ui/join-classes';
import { severityTone } from '@/components/status/finding-mark';
import { readCell } from '@/lib/domain/roster/cells';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import type { ChangeMark } from '@/lib/domain/roster/document';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';
import type { Finding } from '@/lib/domain/rules/finding';
import { gravestOf } from './cell-findings';
import { cardCell, cardPlace, cardRow, severityLook } from './cell-looks';

const cellLook =
  'border-hem relative h-[2.625rem] scroll-my-20 p-0 align-middle font-normal focus-visible:z-10 focus-visible:-outline-offset-2 sm:border-t ' +
  cardCell;

type Handlers = {
  onFocusCell: (column: number) => void;
  onPressCell: (column: number, event: MouseEvent) => void;
};

/** One player in the grid. Props: its cells' state, and the two last cells (`todo`, `menu`) ready-made. */
export function GridRow({
  player,
  rowId,
  rowIndex,
  columns,
  findings,
  marks,
  activeColumn,
  tabColumn,
  editor,
  editable,
  todoId,
  todo,
  menu,
  onFocusCell,
  onPressCell,
}: {
  player: RosterEntry;
  rowId: string;
  rowIndex: number;
  columns: readonly RosterColumn[];
  findings: readonly Finding[];
  marks: readonly ChangeMark[];
  /** The column the reader is in, when it is in this row. */
  activeColumn: number | null;
  /** The column that Tab reaches from outside the grid, when it is in this row. */
  tabColumn: number | null;
  /** The input of the cell being edited. */
  editor: { column: number; input: ReactNode } | null;
  editable: boolean;
  todoId: string;
  todo: ReactNode;
  menu: ReactNode;
} & Handlers) {
  const focusable = (column: number) => ({
    'data-row': rowId,
    'data-column': column,
    tabIndex: tabColumn === column ? 0 : -1,
    'aria-colindex': column + 1,
    onFocus: () => onFocusCell(column),
  });
  return (
    <tr
      role="row"
      aria-rowindex={rowIndex}
      className={joinClasses('group/row', cardRow, activeColumn !== null && 'sm:bg-cotton')}
    >
      {columns.map((column, at) => {
        const severity = gravestOf(findings, column.field);
        const marked = marks.some(({ field }) => field === column.field);
        return (
          <td
            key={column.field}
            {...focusable(at)}
            role={at === 0 ? 'rowheader' : 'gridcell'}
            data-label={column.header}
            aria-readonly={!editable}
            aria-invalid={severity === 'blocker' || undefined}
            aria-describedby={severity !== null || marked ? todoId : undefined}
            onClick={(event) => onPressCell(at, event)}
            className={joinClasses(
              cellLook,
              editable && 'cursor-cell',
              cardPlace(column.field),
              column.field === 'number' && 'sm:text-right',
              severity !== null && severityLook[severityTone[severity]],
              severity === null && marked && 'bg-damson-wash',
            )}
          >
            <CellText
              column={column}
              player={player}
              flagged={severity !== null}
              hidden={editor?.column === at}
            >
              {editor?.column === at && editor.input}
            </CellText>
          </td>
        );
      })}
      <td
        {...focusable(columns.length)}
        role="gridcell"
        className={joinClasses(
          cellLook,
          'w-full px-3 py-1.5 print:hidden max-sm:order-9 max-sm:basis-full max-sm:px-0 max-sm:py-0',
          findings.length + marks.length === 0 && 'max-sm:hidden!',
        )}
      >
        {todo}
      </td>
      <td
        {...focusable(columns.length + 1)}
        role="gridcell"
        className={joinClasses(cellLook, 'w-11 text-right print:hidden max-sm:order-3 max-sm:w-11')}
      >
        <span className="sm:pointer-fine:opacity-0 sm:pointer-fine:group-hover/row:opacity-100 sm:pointer-fine:group-focus-within/row:opacity-100 sm:pointer-fine:has-[[data-state=open]]:opacity-100">
          {menu}
        </span>
      </td>
    </tr>
  );
}

/** So that no column jumps when a value is typed, and a long name wraps before the others are pressed together. */
const widths: Partial<Record<string, string>> = {
  name: 'sm:min-w-36 sm:max-w-64',
  nameOnBack: 'sm:min-w-28 sm:max-w-48',
  number: 'sm:min-w-14',
  role: 'sm:min-w-24',
};

/** What a cell shows while nobody edits it; it keeps its room under the input. */
function CellText({
  column,
  player,
  flagged,
  hidden,
  children,
}: {
  column: RosterColumn;
  player: RosterEntry;
  flagged: boolean;
  hidden: boolean;
  children: ReactNode;
}) {
  const value = readCell(player, column.field);
  return (
    <span
      className={joinClasses(
        'relative flex min-h-[2.5rem] items-center px-3 max-sm:min-h-9 max-sm:px-2',
        widths[column.field] ?? 'sm:min-w-16',
        column.field === 'number' && 'justify-end max-sm:min-h-11 max-sm:justify-center',
        column.field === 'name' && 'max-sm:min-h-11 max-sm:text-base max-sm:font-[620]',
      )}
    >
      <span
        className={joinClasses(
          'min-w-0 break-words',
          hidden && 'invisible',
          column.field === 'nameOnBack' && 'font-mono text-[0.8125rem]',
          column.field === 'number' && /^[0-9]+$/.test(value) && 'type-jersey text-2xl max-sm:text-3xl',
        )}
      >
        {value === '' ? <Blank column={column} flagged={flagged} /> : value}
      </span>
      {children}
    </span>
  );
}

function Blank({ column, flagged }: { column: RosterColumn; flagged: boolean }) {
  if (column.field === 'name') return <span className="text-dusk">no name yet</span>;
  return <span className="text-dusk">{flagged ? 'none' : <span className="sm:sr-only">none</span>}</span>;
}
