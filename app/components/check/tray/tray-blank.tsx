import { type ComponentProps, useId } from "react";

/** A labelled blank of the tray. */
export function TrayBlank({ label, ...input }: { label: string } & ComponentProps<"input">) {
  const id = useId();
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="block font-bold">
        {label}
      </label>
      <input id={id} required autoComplete="off" className="field figure mt-1 w-44 max-w-full" {...input} />
    </div>
  );
}
