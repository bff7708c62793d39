/** Stands wherever stock is shown that must not go into a kit. */
export function HeldCaution() {
  return (
    <p className="mt-3 max-w-prose border-line border-t pt-3 text-[0.9375rem] text-soft">
      Held and expired stock stays where it is and counts for no kit until somebody who may has released it.
      Use approved parts only; local rules and licensed practice decide.
    </p>
  );
}
