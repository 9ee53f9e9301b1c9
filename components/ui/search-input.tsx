import type { ComponentProps } from 'react';
import { Icon } from './icon';
import { joinClasses } from './join-classes';

/** A search box. Props: `label` (read aloud and shown as the placeholder), those of <input type=search>. */
export function SearchInput({
  label,
  className,
  ...rest
}: { label: string } & Omit<ComponentProps<'input'>, 'type' | 'placeholder' | 'aria-label'>) {
  return (
    <span className={joinClasses('relative block w-full sm:w-56 print:hidden', className)}>
      <Icon
        name="search"
        className="text-dusk pointer-events-none absolute top-1/2 left-3 -translate-y-1/2"
      />
      <input
        {...rest}
        type="search"
        aria-label={label}
        placeholder={label}
        className="touch field-text border-thread bg-card hover:border-dusk w-full rounded-full border py-1 pr-3 pl-9"
      />
    </span>
  );
}
