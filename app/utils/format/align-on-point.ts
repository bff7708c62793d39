/** Pads written numbers on the right, so that in a monospaced column, set right, their points stand in line. */
export function alignOnPoint(texts: string[]): string[] {
  const tail = (text: string) => {
    const point = text.indexOf(".");
    return point < 0 ? 0 : text.length - point;
  };
  const longest = Math.max(0, ...texts.map(tail));
  return texts.map((text) => text + "\u00a0".repeat(longest - tail(text)));
}
