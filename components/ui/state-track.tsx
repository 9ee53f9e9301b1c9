import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';

/** One state on the way. `note` stands under it: when it was passed, or how far it is. */
export type TrackStep = { id: string; label: string; note?: ReactNode };

/** States passed one after the other, with the present one in damson. Props: `label`, `steps`, `current` id. */
export function StateTrack({
  label,
  steps,
  current,
}: {
  label: string;
  steps: readonly TrackStep[];
  current: string;
}) {
  const at = steps.findIndex((step) => step.id === current);
  return (
    <ol aria-label={label} className="grid auto-cols-fr gap-1 sm:grid-flow-col">
      {steps.map((step, place) => (
        <li
          key={step.id}
          aria-current={place === at ? 'step' : undefined}
          className={joinClasses(
            'true-colour max-sm:border-l-4 max-sm:py-0.5 max-sm:pl-3 sm:border-t-4 sm:pt-2 sm:pr-2',
            place < at ? 'border-ink' : place === at ? 'border-damson' : 'border-hem',
          )}
        >
          <span
            className={joinClasses(
              'block',
              place === at && 'text-damson font-[620]',
              place > at && 'text-dusk',
            )}
          >
            {step.label}
            <span className="sr-only">
              {place < at ? ', passed' : place > at ? ', still to come' : ', now'}
            </span>
          </span>
          {step.note !== undefined && <span className="type-small text-dusk block">{step.note}</span>}
        </li>
      ))}
    </ol>
  );
}
