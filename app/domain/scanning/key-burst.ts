/** Keys that came one after another, and when the first and the last of them did (milliseconds). */
export interface KeyBurst {
  text: string;
  first: number;
  last: number;
}

export const NO_BURST: KeyBurst = { text: "", first: 0, last: 0 };

/** A scanner leaves a few milliseconds between keys; a hiccup of the browser may make it more once. */
const LONGEST_GAP = 80;

/** Nobody types a code at this pace, key after key. */
const SLOWEST_PACE = 40;

const SHORTEST_CODE = 3;

/** Whether a key at this time still belongs to the burst. */
export function isWithin(burst: KeyBurst, at: number): boolean {
  return burst.text !== "" && at - burst.last <= LONGEST_GAP;
}

/** The burst with one more key, or a new one where it came too late. */
export function addKey(burst: KeyBurst, key: string, at: number): KeyBurst {
  if (!isWithin(burst, at)) return { text: key, first: at, last: at };
  return { text: burst.text + key, first: burst.first, last: at };
}

/** What a scanner typed before the Enter at this time; null where a person may have typed it. */
export function scannedText(burst: KeyBurst, enterAt: number): string | null {
  if (!isWithin(burst, enterAt) || burst.text.length < SHORTEST_CODE) return null;
  const pace = (enterAt - burst.first) / burst.text.length;
  return pace <= SLOWEST_PACE ? burst.text : null;
}
