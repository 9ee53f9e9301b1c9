'use client';

import { useEffect, useId, useRef, useState, type KeyboardEvent, type SyntheticEvent } from 'react';
import { joinClasses } from '@/components/ui/join-classes';
import { readCell } from '@/lib/domain/roster/cells';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import { isBlock } from '@/lib/domain/roster/paste-block';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';
import type { Direction } from './grid-place';

/** How an edit began: a key typed over the cell, Enter or F2 or a second click, or a press on a list of sizes. */
export type EditStart = 'typed' | 'opened' | 'pressed';

export type CellInputProps = {
  column: RosterColumn;
  player: RosterEntry;
  start: EditStart;
  label: string;
  /** What is wrong with the draft, after it was handed in. */
  problem: string | null;
  onDraft: (draft: string) => void;
  /** Hands the draft in; `move` says where to go on, null stays. */
  onCommit: (draft: string, move: Direction | null) => void;
  onCancel: () => void;
  /** A block was pasted into the input. */
  onBlock: (text: string) => void;
};

const look =
  'field-text scroll-my-20 absolute inset-0 z-10 h-full w-full min-w-0 rounded-none border-0 bg-card outline-2 -outline-offset-2 outline-damson';

/** The input of the cell being edited. Enter and Tab hand it in and go on, Escape leaves the cell as it was. */
export function CellInput(props: CellInputProps) {
  return props.column.garment ? <SizeInput {...props} /> : <TextCellInput {...props} />;
}

function TextCellInput({
  column,
  player,
  start,
  label,
  problem,
  onDraft,
  onCommit,
  onCancel,
  onBlock,
}: CellInputProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const value = readCell(player, column.field);
  const [draft, setDraft] = useState(start === 'typed' ? '' : value);
  const settled = useRef(false);

  useEffect(() => {
    const element = input.current;
    element?.focus();
    if (start !== 'typed') element?.select();
    element?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  }, [start]);

  const commit = (move: Direction | null) => {
    settled.current = true;
    onCommit(draft, move);
    // A draft that is refused stays open, and may be handed in again.
    settled.current = false;
  };
  const press = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.nativeEvent.isComposing) return;
    const move = readCommit(event, start === 'typed');
    if (move !== undefined) {
      event.preventDefault();
      commit(move);
    } else if (event.key === 'Escape') {
      event.preventDefault();
      settled.current = true;
      onCancel();
    }
    event.stopPropagation();
  };

  return (
    <>
      <input
        ref={input}
        value={draft}
        aria-label={label}
        aria-invalid={problem === null ? undefined : true}
        aria-describedby={problem === null ? undefined : `${id}-problem`}
        inputMode={column.field === 'number' ? 'numeric' : 'text'}
        autoComplete="off"
        autoCapitalize={
          column.field === 'nameOnBack' ? 'characters' : column.field === 'name' ? 'words' : 'off'
        }
        spellCheck={false}
        list={column.roles === undefined ? undefined : `${id}-roles`}
        enterKeyHint="next"
        onChange={(event) => {
          setDraft(event.target.value);
          onDraft(event.target.value);
        }}
        onPaste={(event) => {
          const text = event.clipboardData.getData('text/plain');
          if (!isBlock(text)) return;
          event.preventDefault();
          settled.current = true;
          onBlock(text);
        }}
        onBlur={() => {
          if (!settled.current) commit(null);
        }}
        onKeyDown={press}
        className={joinClasses(
          look,
          'px-3',
          column.field === 'nameOnBack' && 'font-mono',
          column.field === 'number' && 'type-jersey text-2xl! sm:text-right max-sm:px-1 max-sm:text-center',
        )}
      />
      {column.roles !== undefined && (
        <datalist id={`${id}-roles`}>
          {column.roles.map((role) => (
            <option key={role} value={role} />
          ))}
        </datalist>
      )}
      {problem !== null && (
        <span
          id={`${id}-problem`}
          role="alert"
          className="type-small border-stop bg-stop-wash text-stop absolute top-full left-0 z-20 w-max max-w-64 border px-2 py-1 font-[560]"
        >
          {problem}
        </span>
      )}
    </>
  );
}

function SizeInput({ column, player, start, label, onDraft, onCommit, onCancel }: CellInputProps) {
  const list = useRef<HTMLSelectElement>(null);
  const value = readCell(player, column.field);
  const [draft, setDraft] = useState(value);
  const settled = useRef(false);
  const sizes = column.garment?.sizes ?? [];
  const offered = sizes.some(({ code }) => code === value);

  useEffect(() => {
    const element = list.current;
    element?.focus();
    if (start !== 'pressed') return;
    try {
      element?.showPicker();
    } catch {
      // Not every browser can open the list for us; it is focused, and a key opens it.
    }
  }, [start]);

  const commit = (next: string, move: Direction | null) => {
    settled.current = true;
    onCommit(next, move);
  };
  const press = (event: KeyboardEvent<HTMLSelectElement>) => {
    const move = event.key.startsWith('Arrow') ? undefined : readCommit(event, false);
    if (move !== undefined) {
      event.preventDefault();
      commit(draft, move);
    } else if (event.key === 'Escape') {
      event.preventDefault();
      settled.current = true;
      onCancel();
    } else if (event.key === 'Delete' || event.key === 'Backspace') {
      setDraft('');
      onDraft('');
    }
    event.stopPropagation();
  };

  return (
    <select
      ref={list}
      value={draft}
      aria-label={label}
      onChange={(event) => {
        setDraft(event.target.value);
        // A press chooses at once; arrow keys go through the list before Enter takes one.
        if (start === 'pressed') commit(event.target.value, null);
        else onDraft(event.target.value);
      }}
      onBlur={() => {
        if (!settled.current) commit(draft, null);
      }}
      onKeyDown={press}
      className={joinClasses(look, 'px-2')}
    >
      <option value="">none</option>
      {!offered && value !== '' && <option value={value}>{value}, not offered</option>}
      {sizes.map((size) => (
        <option key={size.code} value={size.code}>
          {size.label === size.code ? size.code : `${size.code}, ${size.label}`}
        </option>
      ))}
    </select>
  );
}

/** Where a key that hands a draft in leads; undefined for keys that don't. */
function readCommit(
  event: Pick<KeyboardEvent, 'key' | 'shiftKey'> & SyntheticEvent,
  arrows: boolean,
): Direction | undefined {
  switch (event.key) {
    case 'Enter':
      return event.shiftKey ? 'up' : 'down';
    case 'Tab':
      return event.shiftKey ? 'previous' : 'next';
    case 'ArrowUp':
      return 'up';
    case 'ArrowDown':
      return 'down';
    case 'ArrowLeft':
      return arrows ? 'left' : undefined;
    case 'ArrowRight':
      return arrows ? 'right' : undefined;
    default:
      return undefined;
  }
}
