'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog, DialogClose } from '@/components/ui/dialog';
import { IconButton } from '@/components/ui/icon-button';
import { Menu, type MenuItem } from '@/components/ui/menu';
import type { RosterEntry } from '@/lib/domain/roster/edit';

/** What can be done with a whole player. `canMove` is false while the list is sorted or narrowed. */
export function RowMenu({
  player,
  name,
  editable,
  canMove,
  onPickNumber,
  onMove,
  onRemove,
}: {
  player: RosterEntry;
  name: string;
  editable: boolean;
  canMove: { up: boolean; down: boolean };
  /** Leads to the number rail; null where there is none. */
  onPickNumber: (() => void) | null;
  onMove: (by: -1 | 1) => void;
  onRemove: () => void;
}) {
  const [open, setOpen] = useState(false);
  const extra = Object.entries(player.extra);
  const items: MenuItem[] = [
    ...(extra.length > 0
      ? [{ label: 'Also in the file', icon: 'file' as const, onSelect: () => setOpen(true) }]
      : []),
    ...(editable && onPickNumber !== null
      ? [{ label: 'Pick a number', icon: 'edit' as const, onSelect: onPickNumber }]
      : []),
    ...(editable
      ? [
          { label: 'Move up', icon: 'up' as const, disabled: !canMove.up, onSelect: () => onMove(-1) },
          { label: 'Move down', icon: 'down' as const, disabled: !canMove.down, onSelect: () => onMove(1) },
          { label: 'Remove from the roster', icon: 'bin' as const, danger: true, onSelect: onRemove },
        ]
      : []),
  ];
  if (items.length === 0) return null;
  return (
    <>
      <Menu
        trigger={
          <IconButton icon={extra.length > 0 ? 'file' : 'more'} label={`More for ${name}`} tabIndex={-1} />
        }
        groups={[{ items }]}
      />
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title={`Also in the file about ${name}`}
        description="These columns were matched with nothing. They are kept with the player and go nowhere else."
        footer={
          <DialogClose>
            <Button>Close</Button>
          </DialogClose>
        }
      >
        <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-5 gap-y-2">
          {extra.map(([heading, text]) => (
            <div key={heading} className="contents">
              <dt className="text-dusk">{heading}</dt>
              <dd className="break-words whitespace-pre-wrap">{text}</dd>
            </div>
          ))}
        </dl>
      </Dialog>
    </>
  );
}
