'use client';

import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Icon } from './icon';
import { joinClasses } from './join-classes';

export const overlayLook = 'animate-arrive fixed inset-0 z-40 bg-[#171512]/45 print:hidden';
export const panelLook =
  'animate-rise fixed z-40 grid max-h-[88dvh] overflow-y-auto border border-hem bg-card text-ink ' +
  'max-sm:inset-x-0 max-sm:bottom-0 max-sm:rounded-t-card ' +
  'sm:top-1/2 sm:left-1/2 sm:w-[calc(100vw-3rem)] sm:-translate-1/2 sm:rounded-card';

const widths = { md: 'sm:max-w-120', lg: 'sm:max-w-180' };

/**
 * A dialog: centred at a desk, a sheet from below on a phone. Escape and a press outside close it, the focus returns.
 * Props: `title`, `description`, `trigger` (the button that opens it) or `open` with `onOpenChange`, `footer` (its
 * buttons, the main one last), `size` md or lg, children.
 */
export function Dialog({
  title,
  description,
  trigger,
  open,
  onOpenChange,
  footer,
  size = 'md',
  children,
}: {
  title: ReactNode;
  description?: ReactNode;
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  footer?: ReactNode;
  size?: keyof typeof widths;
  children?: ReactNode;
}) {
  const control = {
    ...(open === undefined ? {} : { open }),
    ...(onOpenChange === undefined ? {} : { onOpenChange }),
  };
  return (
    <Radix.Root {...control}>
      {trigger !== undefined && <Radix.Trigger asChild>{trigger}</Radix.Trigger>}
      <Radix.Portal>
        <Radix.Overlay className={overlayLook} />
        <Radix.Content
          className={joinClasses(panelLook, widths[size])}
          {...(description === undefined ? { 'aria-describedby': undefined } : {})}
        >
          <div className="flex items-start justify-between gap-3 px-5 pt-4">
            <Radix.Title className="type-section pt-1.5">{title}</Radix.Title>
            <DialogClose>
              <button
                type="button"
                aria-label="Close"
                className="touch-square rounded-control text-dusk hover:bg-linen -mr-2 inline-flex items-center justify-center"
              >
                <Icon name="close" />
              </button>
            </DialogClose>
          </div>
          {description !== undefined && (
            <Radix.Description className="text-dusk px-5 pt-1">{description}</Radix.Description>
          )}
          {children !== undefined && <div className="px-5 pt-3">{children}</div>}
          <DialogFooter>{footer}</DialogFooter>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** Wraps a button that closes the dialog it stands in. */
export function DialogClose({ children }: { children: ReactNode }) {
  return <Radix.Close asChild>{children}</Radix.Close>;
}

/** The row of buttons at the end of a dialog. */
export function DialogFooter({ children }: { children?: ReactNode }) {
  return (
    <div className="flex flex-wrap justify-end gap-2 px-5 pt-5 pb-5 max-sm:flex-col-reverse max-sm:items-stretch">
      {children}
    </div>
  );
}
