'use client';

import { AlertDialog as Radix } from 'radix-ui';
import { useState, type ReactNode } from 'react';
import { Button } from './button';
import { DialogFooter, overlayLook, panelLook } from './dialog';
import { joinClasses } from './join-classes';
import { Notice } from './notice';

/**
 * Asks once before something is lost, and names it. Props: `title` (a question), `children` (what is lost, by name),
 * `confirm` (the verb: "Discard batch B-07"), `cancel`, `onConfirm` (may return a promise; the dialog waits, closes
 * when it is done, and shows the sentence when it answers with one), `trigger` or `open` with `onOpenChange`.
 */
export function ConfirmDialog({
  title,
  confirm,
  cancel = 'Keep it',
  onConfirm,
  trigger,
  open: givenOpen,
  onOpenChange,
  children,
}: {
  title: ReactNode;
  confirm: string;
  cancel?: string;
  onConfirm: () => void | string | Promise<void | string>;
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  children: ReactNode;
}) {
  const [ownOpen, setOwnOpen] = useState(false);
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<string>();
  const setOpen = (next: boolean) => {
    if (pending) return;
    setFailure(undefined);
    setOwnOpen(next);
    onOpenChange?.(next);
  };

  const run = async () => {
    setPending(true);
    setFailure(undefined);
    try {
      const answer = await onConfirm();
      if (typeof answer === 'string') {
        setFailure(answer);
        return;
      }
      setOwnOpen(false);
      onOpenChange?.(false);
    } catch {
      setFailure('That did not reach the server. Nothing was changed. Check the connection and try again.');
    } finally {
      setPending(false);
    }
  };

  return (
    <Radix.Root open={givenOpen ?? ownOpen} onOpenChange={setOpen}>
      {trigger !== undefined && <Radix.Trigger asChild>{trigger}</Radix.Trigger>}
      <Radix.Portal>
        <Radix.Overlay className={overlayLook} />
        <Radix.Content className={joinClasses(panelLook, 'sm:max-w-110')}>
          <Radix.Title className="type-section px-5 pt-5">{title}</Radix.Title>
          <Radix.Description asChild>
            <div className="px-5 pt-2">{children}</div>
          </Radix.Description>
          {failure !== undefined && (
            <div className="px-5 pt-3">
              <Notice tone="stop" live="assertive">
                {failure}
              </Notice>
            </div>
          )}
          <DialogFooter>
            <Radix.Cancel asChild>
              <Button>{cancel}</Button>
            </Radix.Cancel>
            <Button look="danger" pending={pending} onClick={() => void run()}>
              {confirm}
            </Button>
          </DialogFooter>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
