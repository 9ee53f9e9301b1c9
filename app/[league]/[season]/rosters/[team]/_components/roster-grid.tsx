'use client';

import {
  useEffect,
  useId,
  useLayoutEffect,
  useRef,
  useState,
  type KeyboardEvent,
  type MouseEvent,
  type ReactNode,
} from 'react';
import { flushSync } from 'react-dom';
import { Icon } from '@/components/ui/icon';
import { joinClasses } from '@/components/ui/join-classes';
import { useOverflow } from '@/components/ui/use-overflow';
import { makeEmptyEntry, readCell } from '@/lib/domain/roster/cells';
import type { ChangeMark } from '@/lib/domain/roster/document';
import { refuseCell, type CellField, type RosterEntry } from '@/lib/domain/roster/edit';
import { isBlock, readBlock, readValue } from '@/lib/domain/roster/paste-block';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';
import type { Finding } from '@/lib/domain/rules/finding';
import { fieldOfFinding, findColumn } from './cell-findings';
import { CellInput, type EditStart } from './cell-input';
import { GridRow } from './grid-row';
import { newRow, readMove, step, type Direction, type Place } from './grid-place';
import { GridHead, type Sort } from './grid-head';
import { TodoCell } from './todo-cell';

export type GridRowFacts = {
  player: RosterEntry;
  findings: readonly Finding[];
  marks: readonly ChangeMark[];
};

/** A draft in a cell, so that the page can check it while it is typed. */
export type Draft = { row: string; field: CellField; text: string };

type Editing = { place: Place; start: EditStart; problem: string | null };

/**
 * A roster as a grid: arrow keys move, typing or Enter edits, Tab goes on, Escape leaves a cell as it was and, outside
 * a cell, lets Tab leave the grid. Blocks are copied and pasted as in a spreadsheet. It holds no roster: every change
 * goes out through `onSet`, `onAdd` (answers the new player's id) and `onPaste`.
 */
export function RosterGrid({
  label,
  rows,
  columns,
  editable,
  sort,
  onSort,
  place,
  onPlace,
  onDraft,
  onSet,
  onAdd,
  onPaste,
  onMoveRow,
  onTurn,
  renderMenu,
  empty,
}: {
  label: string;
  rows: readonly GridRowFacts[];
  columns: readonly RosterColumn[];
  editable: boolean;
  sort: Sort | null;
  onSort: (field: CellField) => void;
  place: Place | null;
  onPlace: (place: Place) => void;
  onDraft: (draft: Draft | null) => void;
  onSet: (player: RosterEntry, field: CellField, value: string) => void;
  onAdd: (field: CellField, value: string) => string | null;
  onPaste: (anchor: { row: number; column: number }, block: string[][]) => void;
  onMoveRow: (player: RosterEntry, by: -1 | 1) => void;
  onTurn: (back: boolean) => void;
  renderMenu: (player: RosterEntry, row: number) => ReactNode;
  empty: ReactNode;
}) {
  const id = useId();
  const table = useRef<HTMLTableElement>(null);
  const { ref: frame, overflows } = useOverflow();
  const [editing, setEditing] = useState<Editing | null>(null);
  const [leaving, setLeaving] = useState(false);
  const wanted = useRef(false);

  const rowIds = rows.map(({ player }) => player.id);
  // Who is in the middle of adding a player when the roster is closed keeps the input, and what is in it.
  const addable = editable || editing?.place.row === newRow;
  const extent = { rows: addable ? [...rowIds, newRow] : rowIds, columns: columns.length + 2 };
  // A row may be gone, or filtered out of sight, while one of its cells is open.
  const opened = editing !== null && extent.rows.includes(editing.place.row) ? editing : null;
  // A player may be gone, and a column too, since the reader was there.
  const current: Place =
    place !== null && extent.rows.includes(place.row)
      ? { row: place.row, column: Math.min(place.column, extent.columns - 1) }
      : { row: extent.rows[0] ?? newRow, column: 0 };
  const blank = makeEmptyEntry(newRow);
  const playerAt = (row: string): RosterEntry | undefined =>
    row === newRow ? blank : rows.find(({ player }) => player.id === row)?.player;

  const findCell = (at: Place) =>
    table.current?.querySelector<HTMLElement>(`[data-row="${at.row}"][data-column="${at.column}"]`);
  // The cell to go to may be drawn only after this change, so the focus follows the drawing.
  useLayoutEffect(() => {
    if (!wanted.current || opened !== null) return;
    wanted.current = false;
    const cell = findCell(current);
    cell?.focus();
    cell?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  });

  const goTo = (to: Place) => {
    wanted.current = true;
    // The blank row has nothing behind its cells.
    onPlace(to.row === newRow ? { ...to, column: Math.min(to.column, columns.length - 1) } : to);
  };
  const begin = (at: Place, start: EditStart) => {
    if (!editable || at.column >= columns.length || (opened !== null && opened.problem !== null)) return;
    onPlace(at);
    setEditing({ place: at, start, problem: null });
  };
  const end = () => {
    setEditing(null);
    onDraft(null);
  };

  const commit = (at: Place, text: string, move: Direction | null) => {
    const column = columns[at.column];
    const player = playerAt(at.row);
    if (column === undefined || player === undefined) return end();
    const value = readValue(column, text);
    const problem = refuseCell(column.field, value);
    if (problem !== null) {
      setEditing((open) => open && { ...open, problem });
      return;
    }
    let from = at;
    let seen = extent;
    if (at.row === newRow) {
      const added = value === '' ? null : onAdd(column.field, value);
      if (added !== null) {
        seen = { ...extent, rows: [...rowIds, added, newRow] };
        from = { row: added, column: at.column };
      }
    } else if (value !== readCell(player, column.field)) onSet(player, column.field, value);
    end();
    // A press elsewhere has moved the focus already.
    if (move === null) {
      if (from.row !== at.row) onPlace(from);
    } else goTo(step(from, move, { ...seen, columns: columns.length }) ?? from);
  };

  const paste = (at: Place, text: string) => {
    const row = at.row === newRow ? rows.length : rowIds.indexOf(at.row);
    if (!editable || at.column >= columns.length || row < 0) return;
    end();
    onPaste({ row, column: at.column }, readBlock(text));
    wanted.current = true;
  };

  // The browser sends these to the page, not to a cell that only has the focus.
  useEffect(() => {
    const placeOfFocus = (): Place | null => {
      const cell = document.activeElement;
      if (!(cell instanceof HTMLElement) || cell.dataset['row'] === undefined) return null;
      if (!table.current?.contains(cell)) return null;
      return { row: cell.dataset['row'], column: Number(cell.dataset['column']) };
    };
    const handle = (event: ClipboardEvent) => {
      const at = placeOfFocus();
      const column = at && columns[at.column];
      const player = at && playerAt(at.row);
      if (!at || !column || !player) return;
      if (event.type === 'paste') {
        const text = event.clipboardData?.getData('text/plain') ?? '';
        event.preventDefault();
        if (isBlock(text) || at.row === newRow) paste(at, text);
        else if (editable) commit(at, text, null);
        return;
      }
      if (!document.getSelection()?.isCollapsed) return;
      event.clipboardData?.setData('text/plain', readCell(player, column.field));
      event.preventDefault();
      if (event.type === 'cut' && editable && at.row !== newRow) commit(at, '', null);
    };
    const kinds = ['paste', 'copy', 'cut'] as const;
    for (const kind of kinds) document.addEventListener(kind, handle);
    return () => {
      for (const kind of kinds) document.removeEventListener(kind, handle);
    };
  });

  const press = (event: KeyboardEvent<HTMLTableElement>) => {
    const target = event.target as HTMLElement;
    const cell = target.closest<HTMLElement>('[data-row]');
    if (cell?.dataset['row'] === undefined || event.defaultPrevented) return;
    if (target !== cell) {
      // Inside a cell stands a button: its own keys are its own, and those that move lead on from the cell.
      if (!target.matches('button') || !/^(Arrow|Tab$|Escape$|Home$|End$)/.test(event.key)) return;
      if (event.key === 'Escape') {
        event.preventDefault();
        cell.focus();
        return;
      }
    }
    const at: Place = { row: cell.dataset['row'], column: Number(cell.dataset['column']) };
    const control = event.ctrlKey || event.metaKey;
    const take = () => {
      event.preventDefault();
      event.stopPropagation();
    };
    const player = playerAt(at.row);
    if (event.altKey && (event.key === 'ArrowUp' || event.key === 'ArrowDown')) {
      take();
      if (player && at.row !== newRow) {
        wanted.current = true;
        onMoveRow(player, event.key === 'ArrowUp' ? -1 : 1);
      }
      return;
    }
    if (control && !event.altKey && ['z', 'y'].includes(event.key.toLowerCase())) {
      take();
      wanted.current = true;
      onTurn(event.key.toLowerCase() === 'z' && !event.shiftKey);
      return;
    }
    const move = event.altKey ? null : readMove(at, event.key, { control }, extent);
    if (move !== null) {
      take();
      goTo(move);
      return;
    }
    if (control || event.altKey) return;
    if (event.key === 'Tab') {
      // Tab goes through what is typed; the arrow keys also reach what is to do.
      const cells = { ...extent, columns: columns.length };
      const to = leaving ? null : step(at, event.shiftKey ? 'previous' : 'next', cells);
      if (to === null) return;
      take();
      goTo(to);
    } else if (event.key === 'Escape') setLeaving(true);
    else if (event.key === 'Enter' || event.key === 'F2') {
      if (at.column < columns.length) {
        take();
        if (editable) flushSync(() => begin(at, 'opened'));
        else if (event.key === 'Enter') goTo(step(at, event.shiftKey ? 'up' : 'down', extent) ?? at);
      } else {
        const inside = cell.querySelector<HTMLElement>('button');
        if (inside) take();
        inside?.focus();
        // A menu opens on the key, not on a click.
        if (at.column === columns.length + 1)
          inside?.dispatchEvent(
            new KeyboardEvent('keydown', { key: 'Enter', bubbles: true, cancelable: true }),
          );
      }
    } else if (event.key === 'Delete' || event.key === 'Backspace') {
      take();
      if (editable && at.row !== newRow && at.column < columns.length) commit(at, '', null);
    } else if (event.key.length === 1 && event.key !== ' ' && at.column < columns.length) {
      // The key itself is left to the browser: it goes into the input that takes the focus now, so accents and input
      // methods work as anywhere else.
      flushSync(() => begin(at, 'typed'));
    }
  };

  const pressCell = (at: Place, event: MouseEvent) => {
    if ((event.target as HTMLElement).closest('button, input, select') !== null) return;
    const kind = 'pointerType' in event.nativeEvent ? String(event.nativeEvent.pointerType) : '';
    const again = opened === null && place?.row === at.row && place.column === at.column;
    if (columns[at.column]?.garment) begin(at, 'pressed');
    else if (kind !== 'mouse' || (again && pressedTwice.current)) begin(at, 'opened');
    pressedTwice.current = again || kind !== 'mouse';
  };
  /** The first press goes to a cell, the next one opens it. */
  const pressedTwice = useRef(false);

  const use = (player: RosterEntry, finding: Finding, value: string) => {
    const field = fieldOfFinding(finding);
    if (field === null) return;
    onSet(player, field, value);
    const column = findColumn(columns, finding);
    if (column >= 0) goTo({ row: player.id, column });
  };

  const inputFor = (at: Place, player: RosterEntry) => {
    const column = columns[at.column];
    if (column === undefined || opened === null) return null;
    return (
      <CellInput
        column={column}
        player={player}
        start={opened.start}
        problem={opened.problem}
        label={`${column.header}${player.name === '' ? '' : `, ${player.name}`}`}
        onDraft={(text) => {
          if (opened.problem !== null) setEditing({ ...opened, problem: null });
          if (at.row !== newRow) onDraft({ row: at.row, field: column.field, text: readValue(column, text) });
        }}
        onCommit={(text, move) => commit(at, text, move)}
        onCancel={() => {
          end();
          goTo(at);
        }}
        onBlock={(text) => paste(at, text)}
      />
    );
  };
  const editorIn = (row: string, player: RosterEntry) =>
    opened?.place.row === row ? { column: opened.place.column, input: inputFor(opened.place, player) } : null;

  return (
    <div ref={frame} className={overflows ? 'relative sm:overflow-x-auto' : 'sm:overflow-x-clip'}>
      <table
        ref={table}
        role="grid"
        aria-label={label}
        aria-describedby={`${id}-help`}
        aria-readonly={!editable}
        aria-rowcount={rows.length + 1 + (addable ? 1 : 0)}
        aria-colcount={extent.columns}
        onKeyDown={press}
        onFocus={() => setLeaving(false)}
        className="w-full border-separate border-spacing-0 text-left max-sm:block"
      >
        <GridHead columns={columns} sort={sort} onSort={onSort} sticky={!overflows} />
        <tbody role="rowgroup" className="max-sm:block">
          {rows.map(({ player, findings, marks }, at) => (
            <GridRow
              key={player.id}
              player={player}
              rowId={player.id}
              rowIndex={at + 2}
              columns={columns}
              findings={findings}
              marks={marks}
              activeColumn={place?.row === player.id ? place.column : null}
              tabColumn={current.row === player.id ? current.column : null}
              editor={editorIn(player.id, player)}
              editable={editable}
              todoId={`${id}-todo-${player.id}`}
              todo={
                <TodoCell
                  id={`${id}-todo-${player.id}`}
                  findings={findings}
                  marks={marks}
                  onUse={editable ? (finding, value) => use(player, finding, value) : null}
                />
              }
              menu={renderMenu(player, at)}
              onFocusCell={(column) => {
                if (place?.row !== player.id || place.column !== column) onPlace({ row: player.id, column });
              }}
              onPressCell={(column, event) => pressCell({ row: player.id, column }, event)}
            />
          ))}
          {rows.length === 0 && empty !== null && (
            <tr role="row" className="max-sm:block">
              <td role="gridcell" colSpan={extent.columns} className="border-hem border-t max-sm:block">
                {empty}
              </td>
            </tr>
          )}
          {addable && (
            <tr
              role="row"
              aria-rowindex={rows.length + 2}
              className="max-sm:border-hem max-sm:block max-sm:border-t max-sm:p-3 print:hidden"
            >
              {columns.map((column, at) => {
                const here = { row: newRow, column: at };
                const open = opened?.place.row === newRow && opened.place.column === at;
                return (
                  <td
                    key={column.field}
                    role="gridcell"
                    data-row={newRow}
                    data-column={at}
                    aria-label={`${column.header} of a new player`}
                    tabIndex={current.row === newRow && current.column === at ? 0 : -1}
                    onFocus={() => {
                      if (place?.row !== newRow || place.column !== at) onPlace(here);
                    }}
                    onClick={(event) => pressCell(here, event)}
                    className={joinClasses(
                      'border-hem relative h-[2.625rem] scroll-my-20 cursor-cell border-t p-0 align-middle focus-visible:-outline-offset-2',
                      'max-sm:rounded-control max-sm:border-thread max-sm:block max-sm:border max-sm:border-dashed',
                      at > 0 && 'max-sm:hidden',
                    )}
                  >
                    <span className="relative flex min-h-[2.5rem] items-center px-3 max-sm:min-h-11">
                      {at === 0 && (
                        <span
                          className={joinClasses(
                            'text-dusk inline-flex items-center gap-2 whitespace-nowrap',
                            open && 'invisible',
                          )}
                        >
                          <Icon name="add" size={14} />
                          Add a player
                        </span>
                      )}
                      {open && inputFor(here, blank)}
                    </span>
                  </td>
                );
              })}
              <td role="gridcell" colSpan={2} className="border-hem border-t max-sm:hidden" />
            </tr>
          )}
        </tbody>
      </table>
      <p id={`${id}-help`} className="sr-only">
        {editable
          ? 'Arrow keys move. Type or press Enter to edit a cell, Escape to leave it as it was. Tab goes to the next cell; Escape, then Tab leaves the table.'
          : 'Arrow keys move between cells. This roster cannot be edited now.'}
      </p>
    </div>
  );
}
