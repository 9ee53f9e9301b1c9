import Link from 'next/link';
import type { ComponentProps, ReactNode } from 'react';
import { Icon, type IconName } from './icon';
import { joinClasses } from './join-classes';
import { StatusMark } from './status-mark';

/** primary: the one thing to do here. secondary: the others. danger: takes something away. quiet: text only. */
export type ButtonLook = 'primary' | 'secondary' | 'danger' | 'quiet';
/** md fits a page head, sm a table row, lg the bench and the phone. */
export type ButtonSize = 'sm' | 'md' | 'lg';

type Shared = {
  look?: ButtonLook | undefined;
  size?: ButtonSize | undefined;
  icon?: IconName | undefined;
  /** Fills the width it is given. */
  wide?: boolean | undefined;
  children: ReactNode;
};

export type ButtonProps = Shared & {
  /** Work is under way: the button stays in place, says it is busy and cannot be pressed twice. */
  pending?: boolean | undefined;
  /** Why the button cannot be used now. It stays reachable by keyboard, so that the reason can be read. */
  unavailable?: string | undefined;
} & Omit<ComponentProps<'button'>, 'children' | 'disabled'>;

/**
 * A button. Says what happens, with the number: "Remind 7 managers". Props: `look`, `size`, `icon`, `wide`,
 * `pending`, `unavailable`, and those of <button> (`type` is "button" unless given).
 */
export function Button({
  look = 'secondary',
  size = 'md',
  icon,
  wide,
  pending = false,
  unavailable,
  children,
  type = 'button',
  onClick,
  className,
  ...rest
}: ButtonProps) {
  const still = pending || unavailable !== undefined;
  return (
    <button
      {...rest}
      // A button that is not type=submit sends no form, so nothing happens twice while it is busy.
      type={still ? 'button' : type}
      onClick={still ? undefined : onClick}
      aria-busy={pending || undefined}
      aria-disabled={still || undefined}
      title={unavailable ?? rest.title}
      className={joinClasses(
        shape(size, wide),
        unavailable === undefined ? looks[look] : spent[look],
        pending && 'cursor-progress',
        unavailable !== undefined && 'cursor-not-allowed',
        className,
      )}
    >
      {pending ? (
        <StatusMark tone="wait" className="animate-turn text-current!" />
      ) : (
        icon !== undefined && <Icon name={icon} />
      )}
      {children}
      {unavailable !== undefined && <span className="sr-only">. {unavailable}</span>}
    </button>
  );
}

/** A link that looks like a button, for what opens a page or a file. Props: `href`, `look`, `size`, `icon`, `wide`. */
export function ButtonLink({
  look = 'secondary',
  size = 'md',
  icon,
  wide,
  children,
  className,
  ...rest
}: Shared & Omit<ComponentProps<typeof Link>, 'children'>) {
  return (
    <Link {...rest} className={joinClasses(shape(size, wide), looks[look], className)}>
      {icon !== undefined && <Icon name={icon} />}
      {children}
    </Link>
  );
}

/** The same for a file to keep: a plain link, since a router must neither prefetch nor render it. Props: as ButtonLink. */
export function DownloadLink({
  look = 'secondary',
  size = 'md',
  icon,
  wide,
  children,
  className,
  ...rest
}: Shared & Omit<ComponentProps<'a'>, 'children'>) {
  return (
    <a download {...rest} className={joinClasses(shape(size, wide), looks[look], className)}>
      {icon !== undefined && <Icon name={icon} />}
      {children}
    </a>
  );
}

const shape = (size: ButtonSize, wide: boolean | undefined) =>
  joinClasses(
    'inline-flex items-center justify-center gap-2 rounded-control border text-center font-[600] no-underline transition-colors select-none print:hidden',
    sizes[size],
    wide && 'w-full',
  );

const sizes: Record<ButtonSize, string> = {
  sm: 'touch type-small sm:pointer-fine:min-h-7.5 px-2.5 py-0.5',
  md: 'touch px-3.5 py-1',
  lg: 'min-h-13 px-5 py-2 text-base',
};

const looks: Record<ButtonLook, string> = {
  primary:
    'border-ink bg-ink text-on-ink hover:border-damson-deep hover:bg-damson-deep active:border-damson active:bg-damson',
  secondary: 'border-thread bg-card text-ink hover:border-ink active:bg-linen',
  danger: 'border-stop bg-card text-stop hover:bg-stop-wash active:bg-stop-wash',
  quiet: 'border-transparent bg-transparent text-damson hover:bg-linen active:bg-linen',
};

const spent: Record<ButtonLook, string> = {
  primary: 'border-transparent bg-dusk/65 text-on-ink',
  secondary: 'border-hem bg-transparent text-dusk',
  danger: 'border-hem bg-transparent text-dusk',
  quiet: 'border-transparent bg-transparent text-dusk',
};
