import { type InputHTMLAttributes, useId } from "react";

interface DoorFieldProps extends InputHTMLAttributes<HTMLInputElement> {
  label: string;
  hint?: string;
  error?: string;
}

/** A labelled field with its hint and its fault beside it, both read out with it. */
export function DoorField({ label, hint, error, ...input }: DoorFieldProps) {
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(" ");
  return (
    <div className="mt-5">
      <label htmlFor={id} className="font-bold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-soft">
          {hint}
        </p>
      )}
      <input
        {...input}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        className="field mt-1"
      />
      {error && (
        <p id={`${id}-error`} className="mt-1">
          <span aria-hidden="true">✕ </span>
          {error}
        </p>
      )}
    </div>
  );
}
