"use client";
import { useId, type ComponentProps, type ReactNode } from "react";
import { joinClasses } from "./join-classes";

/** What a control needs to be tied to its label, hint and error. */
export interface FieldBinding {
  readonly id: string;
  readonly "aria-invalid": true | undefined;
  readonly "aria-describedby": string | undefined;
}

export interface FieldProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly className?: string;
  readonly children: (binding: FieldBinding) => ReactNode;
}

/** Label above, control, hint, and the error beside the field it belongs to. */
export function Field({ label, hint, error, className, children }: FieldProps) {
  const id = useId();
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(" ");
  return (
    <div className={joinClasses("grid gap-1", className)}>
      <label htmlFor={id} className="text-label font-semibold">
        {label}
      </label>
      {children({ id, "aria-invalid": error ? true : undefined, "aria-describedby": described || undefined })}
      {hint ? (
        <p id={`${id}-hint`} className="text-note text-soft">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} role="alert" className="text-note font-semibold text-fail">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      ) : null}
    </div>
  );
}

interface OwnFieldProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly fieldClassName?: string;
}

/** Label, one-line text input, hint and error. */
export function TextField({
  label,
  hint,
  error,
  fieldClassName,
  className,
  ...input
}: OwnFieldProps & ComponentProps<"input">) {
  return (
    <Field label={label} hint={hint} error={error} {...(fieldClassName ? { className: fieldClassName } : {})}>
      {(binding) => <input {...input} {...binding} className={joinClasses("control w-full", className)} />}
    </Field>
  );
}

/** Label and a native select. */
export function SelectField({
  label,
  hint,
  error,
  fieldClassName,
  className,
  children,
  ...select
}: OwnFieldProps & ComponentProps<"select">) {
  return (
    <Field label={label} hint={hint} error={error} {...(fieldClassName ? { className: fieldClassName } : {})}>
      {(binding) => (
        <select {...select} {...binding} className={joinClasses("control w-full", className)}>
          {children}
        </select>
      )}
    </Field>
  );
}

/** A checkbox with its words to the right. */
export function CheckField({
  label,
  className,
  ...input
}: { readonly label: ReactNode } & Omit<ComponentProps<"input">, "type">) {
  return (
    <label className={joinClasses("inline-flex min-h-6 items-center gap-2", className)}>
      <input {...input} type="checkbox" className="size-4 accent-petrol" />
      <span>{label}</span>
    </label>
  );
}
