import { joinClasses } from '@/components/ui/join-classes';
import type { RailState } from '@/lib/domain/numbers/number-rail';

const railStates: readonly RailState[] = ['free', 'taken', 'kept back', 'twice', 'refused'];

/** How each state looks: paper, ink, a dashed seam, a stop, and woven over. */
export const railLook: Record<RailState, string> = {
  free: 'border-thread bg-card text-ink hover:border-ink',
  taken: 'border-ink bg-ink text-on-ink',
  'kept back': 'border-damson bg-card text-damson border-dashed hover:bg-damson-wash',
  twice: 'border-stop bg-stop text-on-ink',
  refused: 'hatched border-hem bg-card text-dusk',
};

/** What the looks mean, under the rail. */
export function RailLegend() {
  return (
    <ul className="type-fine text-dusk mt-3 flex flex-wrap gap-x-4 gap-y-1">
      {railStates.map((state) => (
        <li key={state} className="flex items-center gap-1.5">
          <span
            aria-hidden="true"
            className={joinClasses('true-colour size-3 rounded-[3px] border', railLook[state])}
          />
          {state === 'refused' ? 'not allowed' : state}
        </li>
      ))}
    </ul>
  );
}
