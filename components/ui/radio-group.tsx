import { useId, type ReactNode } from 'react';
import { tickBox } from './control-looks';
import { FieldError } from './field';
import { joinClasses } from './join-classes';

/** One choice of several, all in sight. Props: `legend`, `name`, `options` with hints, `value` and `onChange(value)`, `hint`, `error`. */
export function RadioGroup({
  legend,
  name,
  options,
  value,
  onChange,
  hint,
  error,
  legendHidden = false,
}: {
  legend: ReactNode;
  name: string;
  options: readonly { value: string; label: ReactNode; hint?: ReactNode; disabled?: boolean | undefined }[];
  value: string;
  onChange: (value: string) => void;
  hint?: ReactNode;
  error?: string | undefined;
  legendHidden?: boolean | undefined;
}) {
  const id = useId();
  return (
    <fieldset aria-describedby={error === undefined ? undefined : `${id}-error`}>
      <legend className={legendHidden ? 'sr-only' : 'type-label'}>{legend}</legend>
      {hint !== undefined && <p className="type-small text-dusk mt-0.5">{hint}</p>}
      <div className="mt-1 grid">
        {options.map((option) => (
          <label key={option.value} className="touch relative flex items-start gap-2.5 py-1.5">
            <input
              type="radio"
              name={name}
              value={option.value}
              disabled={option.disabled}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
              className={joinClasses(tickBox, 'rounded-full')}
            />
            <span
              aria-hidden="true"
              className="bg-on-ink pointer-events-none absolute top-2 left-0 mt-[0.3125rem] ml-[0.3125rem] hidden size-2 rounded-full peer-checked:block"
            />
            <span>
              {option.label}
              {option.hint !== undefined && <span className="type-small text-dusk block">{option.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      {error !== undefined && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}
