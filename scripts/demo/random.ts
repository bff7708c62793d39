/** A small seeded generator (xorshift over a hash of the name), so that adding a part never reshuffles the others. */
export interface Random {
  /** From 0 up to, not including, 1. */
  next: () => number;
  /** A whole number from `low` to `high`, both included. */
  whole: (low: number, high: number) => number;
  pick: <T>(from: readonly T[]) => T;
  chance: (share: number) => boolean;
}

export function seededRandom(name: string): Random {
  let state = hash(`saltmarsh/${name}`);
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const whole = (low: number, high: number) => low + Math.floor(next() * (high - low + 1));
  return {
    next,
    whole,
    pick: (from) => from[whole(0, from.length - 1)],
    chance: (share) => next() < share,
  };
}

function hash(text: string): number {
  let value = 0x811c9dc5;
  for (const character of text) value = Math.imul(value ^ (character.codePointAt(0) ?? 0), 0x01000193) >>> 0;
  return value;
}
