'use client';

import { Dialog } from 'radix-ui';
import { usePathname } from 'next/navigation';
import { useState, type ReactNode } from 'react';
import { Icon } from '@/components/ui/icon';
import { overlayLook } from '@/components/ui/dialog';
import { Wordmark } from '@/components/yoke-tile/raglan-mark';

/** The side panel as a drawer, where there is no room for it. Children is a function that gets how to close it. */
export function MenuDrawer({ children }: { children: (close: () => void) => ReactNode }) {
  // Open over the page it was opened on: whatever leads to another page closes it.
  const here = usePathname();
  const [openAt, setOpenAt] = useState<string>();
  return (
    <Dialog.Root open={openAt === here} onOpenChange={(open) => setOpenAt(open ? here : undefined)}>
      <Dialog.Trigger
        aria-label="Menu"
        className="touch-square rounded-control hover:bg-hem/60 -ml-2 inline-flex items-center justify-center"
      >
        <Icon name="menu" size={20} />
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className={overlayLook} />
        <Dialog.Content
          aria-describedby={undefined}
          className="animate-arrive border-hem bg-linen fixed inset-y-0 left-0 z-40 flex w-72 max-w-[86vw] flex-col gap-3 overflow-y-auto border-r p-3.5"
        >
          <div className="flex items-center justify-between">
            <Dialog.Title className="px-1">
              <Wordmark />
            </Dialog.Title>
            <Dialog.Close
              aria-label="Close the menu"
              className="touch-square rounded-control hover:bg-hem/60 inline-flex items-center justify-center"
            >
              <Icon name="close" size={18} />
            </Dialog.Close>
          </div>
          {children(() => setOpenAt(undefined))}
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
