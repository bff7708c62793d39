import type { ReactNode } from "react";

interface FieldProps {
  label: string;
  /** Name of the field; also its id. */
  name: string;
  hint?: string;
  error?: string;
  /** Gets the attributes that tie the control to its label, hint and error. */
  children: (attributes: {
    id: string;
    name: string;
    "aria-invalid"?: true;
    "aria-describedby"?: string;
  }) => ReactNode;
}

/** A labelled control with its hint above it and its error beside it. */
export function Field({ label, name, hint, error, children }: FieldProps) {
  const described = [hint && `${name}-hint`, error && `${name}-error`].filter(Boolean).join(" ");
  return (
    <div>
      <label htmlFor={name} className="font-bold">
        {label}
      </label>
      {hint && (
        <p id={`${name}-hint`} className="text-[0.9375rem] text-soft">
          {hint}
        </p>
      )}
      <div className="mt-1">
        {children({
          id: name,
          name,
          "aria-invalid": error ? true : undefined,
          "aria-describedby": described || undefined,
        })}
      </div>
      {error && <FieldError id={`${name}-error`} error={error} />}
    </div>
  );
}

/** What is wrong with a field: a mark, so that it does not hang on colour, and a sentence. */
export function FieldError({ id, error }: { id: string; error: string }) {
  return (
    <p id={id} className="mt-1 flex gap-2 text-stop">
      <svg
        viewBox="0 0 16 16"
        aria-hidden="true"
        className="mt-1 size-4 shrink-0"
        fill="none"
        stroke="currentColor"
      >
        <path d="M8 1.5l7 13H1z M8 6v4 M8 11.5v1.2" strokeWidth="1.6" />
      </svg>
      {error}
    </p>
  );
}
