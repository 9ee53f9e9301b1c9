import { batchStates, type BatchState } from '@/lib/domain/batch/batch-state';

/**
 * Where a batch stands among its six states, each passed one with when. Props: `state`, `said` gives the words under a
 * state that was reached.
 */
export function StateTrack({
  state,
  said,
}: {
  state: BatchState;
  said: Partial<Record<BatchState, string>>;
}) {
  const at = batchStates.indexOf(state);
  return (
    <ol
      className="grid grid-cols-2 gap-x-1 gap-y-3 px-4 py-4 sm:grid-cols-3 lg:grid-cols-6"
      aria-label="State of the batch"
    >
      {batchStates.map((step, index) => (
        <li key={step} aria-current={index === at ? 'step' : undefined} className="min-w-0">
          <span
            aria-hidden
            className={`mb-2 block h-1 rounded-xs ${index === at ? 'bg-damson' : index < at ? 'bg-ink' : 'bg-hem'}`}
          />
          <span className={index === at ? 'text-damson font-[600]' : index < at ? 'font-[560]' : 'text-dusk'}>
            {step}
            {index < at && <span className="sr-only">, passed</span>}
          </span>
          {said[step] !== undefined && <span className="type-fine text-dusk block">{said[step]}</span>}
        </li>
      ))}
    </ol>
  );
}
