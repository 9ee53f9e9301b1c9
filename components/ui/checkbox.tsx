import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field';
import { joinClasses } from './join-classes';
import { tickBox } from './control-looks';

/** A yes or no with its words. Props: `label`, `hint`, `error`, those of <input type=checkbox>. */
export function Checkbox({
  label,
  hint,
  error,
  className,
  ...rest
}: {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
} & Omit<ComponentProps<'input'>, 'type'>) {
  const id = useId();
  const said = [hint !== undefined && `${id}-hint`, error !== undefined && `${id}-error`]
    .filter(Boolean)
    .join(' ');
  return (
    <div className={joinClasses('grid', className)}>
      <label className="touch relative flex items-center gap-2.5 py-1">
        <input
          {...rest}
          type="checkbox"
          aria-describedby={said || undefined}
          aria-invalid={error === undefined ? undefined : true}
          className={joinClasses(tickBox, 'mt-0! rounded-[4px]')}
        />
        <svg
          aria-hidden="true"
          viewBox="0 0 16 16"
          className="text-on-ink pointer-events-none absolute left-px hidden size-4 peer-checked:block"
        >
          <path fill="none" stroke="currentColor" strokeWidth="2.2" d="M3.5 8.3l3 3L12.5 5" />
        </svg>
        <span>{label}</span>
      </label>
      {hint !== undefined && (
        <p id={`${id}-hint`} className="type-small text-dusk -mt-1 pl-7">
          {hint}
        </p>
      )}
      {error !== undefined && (
        <div className="pl-7">
          <FieldError id={`${id}-error`}>{error}</FieldError>
        </div>
      )}
    </div>
  );
}
