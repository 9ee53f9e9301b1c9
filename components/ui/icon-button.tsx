import type { ComponentProps } from 'react';
import { Icon, type IconName } from './icon';
import { joinClasses } from './join-classes';

/** A button that is only a drawing. Props: `icon`, `label` (read aloud and shown on hover), those of <button>. */
export function IconButton({
  icon,
  label,
  className,
  type = 'button',
  ...rest
}: { icon: IconName; label: string } & Omit<ComponentProps<'button'>, 'children' | 'aria-label'>) {
  return (
    <button
      {...rest}
      type={type}
      aria-label={label}
      title={label}
      className={joinClasses(
        'touch-square rounded-control text-dusk hover:bg-linen hover:text-ink inline-flex items-center justify-center disabled:opacity-50 print:hidden',
        className,
      )}
    >
      <Icon name={icon} />
    </button>
  );
}
