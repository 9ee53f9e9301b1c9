import { useId, type ComponentProps, type ReactNode } from 'react';
import { joinClasses } from './join-classes';
import { Select, type Option } from './select';
import { StatusMark } from './status-mark';
import { Textarea } from './textarea';
import { TextInput } from './text-input';

/** What a control needs so that its label, hint and error are read with it. Spread it on the control. */
export type FieldWiring = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
  required: boolean | undefined;
};

export type FieldProps = {
  label: ReactNode;
  /** What to write, before anything went wrong. */
  hint?: ReactNode;
  /** What is wrong and what to do about it. */
  error?: string | undefined;
  required?: boolean | undefined;
  id?: string | undefined;
  className?: string | undefined;
};

/**
 * Label, control, hint and error as one. Props: `label`, `hint`, `error`, `required`, and as children
 * a function that gets the wiring: `<Field label="Name">{(wiring) => <TextInput {...wiring} name="name" />}</Field>`.
 */
export function Field({
  label,
  hint,
  error,
  required,
  id: givenId,
  className,
  children,
}: FieldProps & { children: (wiring: FieldWiring) => ReactNode }) {
  const ownId = useId();
  const id = givenId ?? ownId;
  const said = [hint !== undefined && `${id}-hint`, error !== undefined && `${id}-error`].filter(Boolean);
  return (
    <div className={joinClasses('grid content-start gap-1.5', className)}>
      <label htmlFor={id} className="type-label">
        {label}
        {required === false && <span className="text-dusk font-[400]"> (if you like)</span>}
      </label>
      {children({
        id,
        'aria-describedby': said.length > 0 ? said.join(' ') : undefined,
        'aria-invalid': error === undefined ? undefined : true,
        required: required === true ? true : undefined,
      })}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="type-small text-dusk">
          {hint}
        </p>
      )}
      {error !== undefined && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}

/** The line under a control that says what is wrong. Props: `id`, the sentence. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="type-small text-stop flex gap-1.5 font-[560]">
      <StatusMark tone="stop" className="mt-0.5" />
      <span>{children}</span>
    </p>
  );
}

type Wired<Control> = FieldProps & Omit<Control, 'id' | 'className' | 'required' | 'children'>;

/** A labelled single-line input. Props: those of Field and of <input>. */
export function TextField({
  label,
  hint,
  error,
  required,
  id,
  className,
  ...input
}: Wired<ComponentProps<typeof TextInput>>) {
  const field = { label, hint, error, required, id, className };
  return <Field {...field}>{(wiring) => <TextInput {...input} {...wiring} />}</Field>;
}

/** A labelled multi-line input. Props: those of Field and of <textarea>. */
export function TextareaField({
  label,
  hint,
  error,
  required,
  id,
  className,
  ...input
}: Wired<ComponentProps<typeof Textarea>>) {
  const field = { label, hint, error, required, id, className };
  return <Field {...field}>{(wiring) => <Textarea {...input} {...wiring} />}</Field>;
}

/** A labelled choice of one from a list. Props: those of Field, `options`, `placeholder`, and of <select>. */
export function SelectField({
  label,
  hint,
  error,
  required,
  id,
  className,
  options,
  ...input
}: Wired<ComponentProps<typeof Select>> & { options: readonly Option[] }) {
  const field = { label, hint, error, required, id, className };
  return <Field {...field}>{(wiring) => <Select {...input} options={options} {...wiring} />}</Field>;
}
