'use client';

import { useFormStatus } from 'react-dom';
import { Button, type ButtonProps } from './button';

/** The button that sends its form; busy by itself while the form's action runs. Props: those of Button. */
export function SubmitButton({ pending, look = 'primary', ...rest }: Omit<ButtonProps, 'type'>) {
  const status = useFormStatus();
  return <Button {...rest} look={look} type="submit" pending={pending ?? status.pending} />;
}
