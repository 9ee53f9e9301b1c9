import type { ComponentProps } from 'react';
import { controlLook } from './control-looks';
import { joinClasses } from './join-classes';

/** A single-line input without its label; use TextField unless a table cell or a heading names it. `code` sets it in the code face. */
export function TextInput({
  className,
  code = false,
  ...rest
}: ComponentProps<'input'> & { code?: boolean | undefined }) {
  return <input {...rest} className={joinClasses(controlLook, code && 'font-mono', className)} />;
}
