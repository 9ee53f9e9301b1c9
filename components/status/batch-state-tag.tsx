import { StatusTag } from '@/components/ui/tag';
import type { Tone } from '@/components/ui/status-mark';
import type { BatchState } from '@/lib/domain/batch/batch-state';

const tones: Record<BatchState, Tone> = {
  held: 'wait',
  released: 'note',
  'on press': 'wait',
  packed: 'note',
  shipped: 'note',
  received: 'set',
};

/** The state of a batch. Props: `state`, `detail` after it such as "64 of 192". */
export function BatchStateTag({ state, detail }: { state: BatchState; detail?: string | undefined }) {
  return (
    <StatusTag tone={tones[state]}>
      {state}
      {detail !== undefined && `, ${detail}`}
    </StatusTag>
  );
}
