/** A DECIMAL as the database writes it without the zeros that say nothing: `"4.500000"` is `"4.5"`. */
export function trimDecimal(text: string): string {
  if (!text.includes(".")) return text;
  let end = text.length;
  while (text[end - 1] === "0") end--;
  return text.slice(0, text[end - 1] === "." ? end - 1 : end);
}
