'use client';

import { useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { joinClasses } from '@/components/ui/join-classes';
import type { RailEntry } from '@/lib/domain/numbers/number-rail';
import { layOutRail, stepOnRail } from './rail-layout';
import { RailLegend, railLook } from './rail-legend';

/**
 * Every permitted label at a glance, ten to a line (five on a phone). Arrow keys move, Enter picks. Props: `labels` from
 * buildNumberRail, `onPick(label)` for free and kept-back ones, `onVisit(rows, label)` for those that are worn (shows who
 * wears it), `chosen` is the number of the player being edited, `label` names the group, `hint` stands under it until a number is looked at.
 */
export function NumberRail({
  labels,
  onPick,
  onVisit,
  chosen,
  label: groupLabel = 'Numbers',
  hint = 'Point at a number to read who wears it or why not.',
}: {
  labels: readonly RailEntry[];
  onPick?: ((label: string) => void) | undefined;
  onVisit?: ((rows: readonly number[], label: string) => void) | undefined;
  chosen?: string | undefined;
  label?: string | undefined;
  hint?: string | undefined;
}) {
  const names = useMemo(() => labels.map((one) => one.label), [labels]);
  const places = useMemo(() => layOutRail(names), [names]);
  const buttons = useRef(new Map<string, HTMLButtonElement>());
  const [looked, setLooked] = useState<string | null>(null);
  const entry = looked !== null && places.has(looked) ? looked : (chosen ?? names[0]);
  const told = labels.find((one) => one.label === looked);
  const wide = names.includes('00');

  const move = (event: KeyboardEvent, from: string) => {
    const to = stepOnRail(names, places, from, event.key);
    if (to === from) return;
    event.preventDefault();
    buttons.current.get(to)?.focus();
  };
  const press = (one: RailEntry) => {
    if (one.state === 'free' || one.state === 'kept back') onPick?.(one.label);
    else if (one.rows.length > 0) onVisit?.(one.rows, one.label);
  };

  return (
    <div>
      <div
        role="group"
        aria-label={groupLabel}
        className={joinClasses('grid grid-cols-5 gap-1', wide ? 'sm:grid-cols-11' : 'sm:grid-cols-10')}
      >
        {labels.map((one) => {
          const column = places.get(one.label)?.column ?? 0;
          return (
            <button
              key={one.label}
              ref={(element) => {
                if (element === null) buttons.current.delete(one.label);
                else buttons.current.set(one.label, element);
              }}
              type="button"
              tabIndex={one.label === entry ? 0 : -1}
              aria-label={`${one.label}, ${one.state === 'refused' ? 'not allowed' : one.state}`}
              aria-current={one.label === chosen ? 'true' : undefined}
              aria-disabled={one.state === 'refused' || undefined}
              title={one.reason}
              onKeyDown={(event) => move(event, one.label)}
              onFocus={() => setLooked(one.label)}
              onMouseEnter={() => setLooked(one.label)}
              onClick={() => press(one)}
              className={joinClasses(
                'type-jersey true-colour h-7.5 rounded-[4px] border text-[1.0625rem] max-sm:h-11 max-sm:text-[1.375rem] pointer-coarse:h-11',
                railLook[one.state],
                one.label === chosen && 'ring-damson ring-offset-card ring-2 ring-offset-1',
                startsNarrow[one.label === '00' ? 0 : (column - (wide ? 1 : 0)) % 5],
                startsWide[column],
              )}
            >
              {one.label}
            </button>
          );
        })}
      </div>
      <RailLegend />
      <p aria-live="polite" className="type-small mt-2 min-h-10">
        {told?.reason ?? <span className="text-dusk">{hint}</span>}
      </p>
    </div>
  );
}

// Written out, because the style sheet holds only class names that stand in the source.
const startsNarrow = ['col-start-1', 'col-start-2', 'col-start-3', 'col-start-4', 'col-start-5'];
const startsWide = [
  'sm:col-start-1',
  'sm:col-start-2',
  'sm:col-start-3',
  'sm:col-start-4',
  'sm:col-start-5',
  'sm:col-start-6',
  'sm:col-start-7',
  'sm:col-start-8',
  'sm:col-start-9',
  'sm:col-start-10',
  'sm:col-start-11',
];
