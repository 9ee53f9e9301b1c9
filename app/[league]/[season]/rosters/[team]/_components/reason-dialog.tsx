'use client';

import { useState, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextareaField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { playerLimits } from '@/lib/domain/roster/player';

/** Asks for the reason of a step; what was written stays when the step fails. `onConfirm` answers a sentence on failure. */
export function ReasonDialog({
  open,
  onOpenChange,
  title,
  children,
  label,
  hint,
  confirm,
  onConfirm,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  children: ReactNode;
  label: string;
  hint: string;
  confirm: string;
  onConfirm: (reason: string) => Promise<string | undefined>;
}) {
  const [reason, setReason] = useState('');
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<string>();
  const [missing, setMissing] = useState(false);

  const run = async () => {
    setMissing(reason.trim() === '');
    if (reason.trim() === '' || pending) return;
    setPending(true);
    setFailure(undefined);
    const problem = await onConfirm(reason.trim());
    setPending(false);
    if (problem === undefined) {
      setReason('');
      onOpenChange(false);
    } else setFailure(problem);
  };

  const close = () => {
    if (pending) return;
    setFailure(undefined);
    onOpenChange(false);
  };

  return (
    <Dialog
      open={open}
      onOpenChange={(next) => {
        if (next) onOpenChange(true);
        else close();
      }}
      title={title}
      description={children}
      footer={
        <>
          <Button onClick={close}>Not now</Button>
          <Button look="primary" pending={pending} onClick={() => void run()}>
            {confirm}
          </Button>
        </>
      }
    >
      <TextareaField
        label={label}
        hint={hint}
        rows={4}
        maxLength={playerLimits.note}
        value={reason}
        error={missing ? 'Say why, in a sentence the manager can act on.' : undefined}
        onChange={(event) => {
          setReason(event.target.value);
          setMissing(false);
        }}
      />
      {failure !== undefined && (
        <div className="mt-3">
          <Notice tone="stop" live="assertive">
            {failure}
          </Notice>
        </div>
      )}
    </Dialog>
  );
}
