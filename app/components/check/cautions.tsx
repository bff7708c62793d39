/** What no count of parts can say. Stands under every answer about kits that carry people. */
export function Cautions() {
  return (
    <p className="max-w-prose border-line border-t pt-4 text-[0.9375rem] text-soft">
      Held parts stay held and are not counted here. Use approved parts only. This page counts parts; whether
      a craft may be built, inspected, handed over or used is for local rules and licensed practice to decide.
    </p>
  );
}
