import { FieldError } from "~/components/forms/field";
import type { OrderableKit } from "~/schemas/kit-orders/presented-kit-order";

interface KitOptionsProps {
  options: OrderableKit["options"];
  chosen: string[];
  error?: string;
}

/** The options of the chosen kit, to tick. */
export function KitOptions({ options, chosen, error }: KitOptionsProps) {
  return (
    <fieldset className="sm:col-span-2" aria-describedby={error ? "options-error" : undefined}>
      <legend className="font-bold">Options</legend>
      {options.length === 0 && <p className="text-soft">This kit has none.</p>}
      <div className="mt-1 grid gap-x-8 sm:grid-cols-2">
        {options.map((option) => (
          <label key={option.code} className="flex min-h-12 items-center gap-3">
            <input
              type="checkbox"
              name="options"
              value={option.code}
              defaultChecked={chosen.includes(option.code)}
              className="size-5 shrink-0"
            />
            <span>
              <span className="figure font-semibold">{option.code}</span> {option.description}
            </span>
          </label>
        ))}
      </div>
      {error && <FieldError id="options-error" error={error} />}
    </fieldset>
  );
}
