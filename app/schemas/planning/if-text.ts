/** One change to try, as the address holds it: `stock:HB-2041:+2`. */
export type If =
  | { kind: "stock"; partNumber: string; change: string }
  /** An empty lot holds all of the part. */
  | { kind: "hold"; partNumber: string; lot: string }
  | { kind: "order"; reference: string; due: string }
  | { kind: "arrival"; partNumber: string; quantity: string; due: string }
  | { kind: "lead"; partNumber: string; days: string }
  | { kind: "cost"; partNumber: string; cost: string };

export type IfKind = If["kind"];

/** What stands in each kind, in the order in which the address holds it. */
const FIELDS: Readonly<Record<IfKind, readonly string[]>> = {
  stock: ["partNumber", "change"],
  hold: ["partNumber", "lot"],
  order: ["reference", "due"],
  arrival: ["partNumber", "quantity", "due"],
  lead: ["partNumber", "days"],
  cost: ["partNumber", "cost"],
};

const guard = (text: string) => text.replaceAll("%", "%25").replaceAll(":", "%3A");
const unguard = (text: string) => text.replaceAll(/%(25|3A)/gi, (_, code) => (code === "25" ? "%" : ":"));

/** A change as text for the address. */
export function formatIf(change: If): string {
  const values: Record<string, string> = { ...change };
  return [change.kind, ...FIELDS[change.kind].map((field) => guard(values[field]))].join(":");
}

/** Reads a change from the address; null where it is none. What stands in it is checked when it is tried. */
export function parseIf(text: string): If | null {
  const [kind, ...values] = text.split(":");
  const fields = Object.hasOwn(FIELDS, kind) ? FIELDS[kind as IfKind] : null;
  if (fields === null || values.length !== fields.length) return null;
  return { kind, ...Object.fromEntries(fields.map((field, at) => [field, unguard(values[at])])) } as If;
}
