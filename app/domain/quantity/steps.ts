/** A whole number of a part's steps: `number` while it is exact, `bigint` past 2^53. */
export type Steps = number | bigint;

/** The narrowest exact form of a whole number. */
export function narrowSteps(value: bigint): Steps {
  return value <= BigInt(Number.MAX_SAFE_INTEGER) && value >= -BigInt(Number.MAX_SAFE_INTEGER)
    ? Number(value)
    : value;
}

/** `a - b`, exact whatever their forms. */
export function subtractSteps(a: Steps, b: Steps): Steps {
  if (typeof a === "number" && typeof b === "number") return a - b;
  return narrowSteps(BigInt(a) - BigInt(b));
}

/** `a + b`, exact whatever their forms. */
export function addSteps(a: Steps, b: Steps): Steps {
  if (typeof a === "number" && typeof b === "number" && Number.isSafeInteger(a + b)) return a + b;
  return narrowSteps(BigInt(a) + BigInt(b));
}

/** The smaller of two. */
export function leastSteps(a: Steps, b: Steps): Steps {
  return b < a ? b : a;
}
