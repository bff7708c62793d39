/** What a spreadsheet would take for the start of a formula, after any apostrophes of ours. */
const START = /^'*[=+\-@\t\r\n＝＋－＠]/;

/**
 * A text cell that a spreadsheet shows and never runs: one apostrophe stands before what looks like a formula
 * (also before apostrophes and such a sign, so that `readTextCell` gives back exactly what was written).
 */
export function guardTextCell(text: string): string {
  return START.test(text) ? `'${text}` : text;
}

/** Takes off the apostrophe that `guardTextCell` puts before what looks like a formula. */
export function readTextCell(cell: string): string {
  return cell.startsWith("'") && START.test(cell) ? cell.slice(1) : cell;
}
