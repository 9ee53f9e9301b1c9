import type { ComponentProps } from 'react';
import { controlLook } from './control-looks';
import { joinClasses } from './join-classes';

/** A multi-line input without its label; use TextareaField for both. `code` sets it in the code face. */
export function Textarea({
  className,
  code = false,
  rows = 4,
  ...rest
}: ComponentProps<'textarea'> & { code?: boolean | undefined }) {
  return (
    <textarea
      {...rest}
      rows={rows}
      className={joinClasses(controlLook, 'resize-y', code && 'font-mono', className)}
    />
  );
}
