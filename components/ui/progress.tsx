import { useId, type ReactNode } from 'react';
import { joinClasses } from './join-classes';

/**
 * How far a long piece of work is, with a count. Props: `label` ("Making bag labels"), `done`, `total`, `unit`
 * ("labels": "132 of 192 labels"), `hint` ("You can leave this page"). Without a total it only says that it runs.
 */
export function Progress({
  label,
  done,
  total,
  unit,
  hint,
}: {
  label: ReactNode;
  done: number;
  total: number | null;
  unit: string;
  hint?: ReactNode;
}) {
  const id = useId();
  const known = total !== null && total > 0;
  const words = known ? `${done} of ${total} ${unit}` : `${done} ${unit}`;
  return (
    <div>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span id={id} className="font-[560]">
          {label}
        </span>
        <span className="type-small text-dusk">{words}</span>
      </div>
      <progress
        aria-labelledby={id}
        aria-valuetext={words}
        {...(known ? { value: done, max: total } : {})}
        className={joinClasses('meter mt-1.5 block h-2 w-full', !known && 'animate-breathe')}
      />
      {hint !== undefined && <p className="type-small text-dusk mt-1.5">{hint}</p>}
    </div>
  );
}
