import {
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
  useId,
} from "react";

/** What every field says about itself besides its value. */
export interface FieldProps {
  label: string;
  /** what may help, or the value before: `was 50.0` */
  hint?: ReactNode;
  /** what is the matter and what to do, from the answer to the form */
  error?: string | undefined;
  className?: string;
}

/** What ties a control to its label, hint and error. */
interface Wires {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
}

/** The frame of a field: label above, hint and error beneath. It needs no script to work. */
function Field({
  label,
  hint,
  error,
  className = "",
  children,
}: FieldProps & { children: (wires: Wires) => ReactNode }) {
  const id = useId();
  const says = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(" ");
  return (
    <div className={`field ${className}`}>
      <label htmlFor={id}>{label}</label>
      {children({
        id,
        "aria-describedby": says || undefined,
        "aria-invalid": error ? true : undefined,
      })}
      {hint && (
        <span id={`${id}-hint`} className="field-hint">
          {hint}
        </span>
      )}
      {error && (
        <span id={`${id}-error`} className="field-error" role="alert">
          {error}
        </span>
      )}
    </div>
  );
}

type Own<T> = FieldProps & Omit<T, keyof FieldProps | keyof Wires>;

/** One line to write in. */
export function InputField({
  label,
  hint,
  error,
  className,
  ...input
}: Own<InputHTMLAttributes<HTMLInputElement>>) {
  return (
    <Field {...frame({ label, hint, error, className })}>
      {(wires) => <input {...input} {...wires} />}
    </Field>
  );
}

/** One of several choices; its children are `option`s. */
export function SelectField({
  label,
  hint,
  error,
  className,
  ...select
}: Own<SelectHTMLAttributes<HTMLSelectElement>>) {
  return (
    <Field {...frame({ label, hint, error, className })}>
      {(wires) => <select {...select} {...wires} />}
    </Field>
  );
}

/** Several lines to write in, such as a reason. */
export function TextField({
  label,
  hint,
  error,
  className,
  ...area
}: Own<TextareaHTMLAttributes<HTMLTextAreaElement>>) {
  return (
    <Field {...frame({ label, hint, error, className })}>
      {(wires) => <textarea {...area} {...wires} />}
    </Field>
  );
}

/** A box to tick, its words beside it. */
export function TickField({
  label,
  className = "",
  ...input
}: { label: ReactNode } & Omit<InputHTMLAttributes<HTMLInputElement>, "type">) {
  return (
    <label className={`tick-field ${className}`}>
      <input {...input} type="checkbox" />
      <span>{label}</span>
    </label>
  );
}

/** Leaves out what is not given, as exact optional properties ask. */
function frame({
  label,
  hint,
  error,
  className,
}: {
  label: string;
  hint: ReactNode;
  error: string | undefined;
  className: string | undefined;
}): FieldProps {
  return { label, hint, error, ...(className === undefined ? {} : { className }) };
}
