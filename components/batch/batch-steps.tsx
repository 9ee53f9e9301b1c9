'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useToast } from '@/components/ui/toast';
import {
  batchStateOwner,
  nextBatchState,
  previousBatchState,
  type BatchState,
} from '@/lib/domain/batch/batch-state';

type Answer = { ok: true } | { ok: false; error: { message: string } };
type Marked = Exclude<BatchState, 'held'>;

const verb: Record<Marked, string> = {
  released: 'Mark released',
  'on press': 'Mark on press',
  packed: 'Mark packed',
  shipped: 'Mark shipped',
  received: 'Mark received',
};

/**
 * The button that moves a batch one state on, for whoever may, with a way to take the last step back. Props: `state`,
 * `may` says who is looking, `onMark` does it.
 */
export function BatchSteps({
  batchId,
  state,
  may,
  onMark,
}: {
  batchId: string;
  state: BatchState;
  may: { mark: boolean; receive: boolean };
  onMark: (input: { batchId: string; from: Marked; to: Marked; note: string }) => Promise<Answer>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [pending, setPending] = useState(false);
  if (state === 'held') return null;
  const mayStep = (to: BatchState): boolean => (batchStateOwner[to] === 'shop' ? may.mark : may.receive);
  const next = nextBatchState(state) as Marked | null;
  const back = previousBatchState(state) as Marked | null;

  const move = async (from: Marked, to: Marked, undoable: boolean) => {
    setPending(true);
    try {
      const answer = await onMark({ batchId, from, to, note: '' });
      if (!answer.ok) {
        showToast({ tone: 'stop', title: answer.error.message });
        return;
      }
      showToast({
        tone: 'set',
        title: `The batch is ${to}`,
        action: undoable ? { label: 'Undo', onSelect: () => void move(to, from, false) } : undefined,
      });
      router.refresh();
    } catch {
      showToast({ tone: 'stop', title: 'That did not reach the server. Nothing was changed; try again.' });
    } finally {
      setPending(false);
    }
  };

  return (
    <>
      {back !== null && mayStep(state) && (
        <Button look="quiet" pending={pending} onClick={() => void move(state, back, false)}>
          Back to {back}
        </Button>
      )}
      {next !== null && mayStep(next) && (
        <Button pending={pending} onClick={() => void move(state, next, true)}>
          {verb[next]}
        </Button>
      )}
    </>
  );
}
