import type { ComponentProps } from 'react';
import { controlLook } from './control-looks';
import { Icon } from './icon';
import { joinClasses } from './join-classes';

/** A choice; `group` puts choices with the same group under one heading. */
export type Option = {
  value: string;
  label: string;
  disabled?: boolean | undefined;
  group?: string | undefined;
};

/**
 * The system's own list in our dress; use SelectField for the label. Props: `options`, `placeholder` (an empty first
 * choice), those of <select>.
 */
export function Select({
  options,
  placeholder,
  className,
  ...rest
}: { options: readonly Option[]; placeholder?: string | undefined } & Omit<
  ComponentProps<'select'>,
  'children'
>) {
  const groups = [...new Set(options.map((option) => option.group))];
  return (
    <span className={joinClasses('relative block', className)}>
      <select {...rest} className={joinClasses(controlLook, 'appearance-none pr-9')}>
        {placeholder !== undefined && <option value="">{placeholder}</option>}
        {groups.map((group) => {
          const choices = options.filter((option) => option.group === group).map(renderOption);
          return group === undefined ? (
            choices
          ) : (
            <optgroup key={group} label={group}>
              {choices}
            </optgroup>
          );
        })}
      </select>
      <Icon name="down" className="text-dusk pointer-events-none absolute top-1/2 right-3 -translate-y-1/2" />
    </span>
  );
}

const renderOption = ({ value, label, disabled }: Option) => (
  <option key={value} value={value} disabled={disabled}>
    {label}
  </option>
);
