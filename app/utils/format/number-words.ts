const CARDINALS = "none one two three four five six seven eight nine ten eleven twelve".split(" ");
const ORDINALS =
  "zeroth first second third fourth fifth sixth seventh eighth ninth tenth eleventh twelfth".split(" ");

/** `7` to `seven`, up to twelve; above that the figure. */
export function cardinal(count: number): string {
  return CARDINALS[count] ?? String(count).replace(/\B(?=(\d{3})+$)/g, ",");
}

/** `8` to `eighth`, up to twelfth; above that `13th`. */
export function ordinal(place: number): string {
  if (ORDINALS[place] !== undefined) return ORDINALS[place];
  const last = place % 100 > 10 && place % 100 < 14 ? 0 : place % 10;
  return `${String(place).replace(/\B(?=(\d{3})+$)/g, ",")}${["th", "st", "nd", "rd"][last] ?? "th"}`;
}

/** `seven` to `Seven`, for the start of a sentence. */
export function sentenceCase(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
