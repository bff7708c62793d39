/** One thing that changed: its name, and its value before and after where there was one. */
export interface ChangeLine {
  name: string;
  before: string | null;
  after: string | null;
}

/** What changed, out of the two JSON texts of an event; what stayed the same is left out. */
export function changeLines(before: string | null, after: string | null): ChangeLine[] {
  const [old, now] = [fields(before), fields(after)];
  const names = [...new Set([...old.keys(), ...now.keys()])];
  return names
    .map((name) => ({ name: sayName(name), before: old.get(name) ?? null, after: now.get(name) ?? null }))
    .filter((line) => line.before !== line.after);
}

function fields(text: string | null): Map<string, string> {
  if (text === null) return new Map();
  const value = parse(text);
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return new Map([["value", say(value)]]);
  return new Map(Object.entries(value).map(([name, each]) => [name, say(each)]));
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return text;
  }
}

/** `lotMinimum` and `lot_minimum` as `lot minimum`. */
function sayName(name: string): string {
  return name
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replaceAll("_", " ")
    .toLowerCase();
}

function say(value: unknown): string {
  if (value === null || value === "") return "nothing";
  if (value === true) return "yes";
  if (value === false) return "no";
  if (Array.isArray(value) && value.every((each) => typeof each !== "object"))
    return value.length === 0 ? "nothing" : value.join(", ");
  return typeof value === "object" ? JSON.stringify(value) : String(value);
}
