/** A row's number from an address; null for anything else. */
export function rowNumber(text: string | null | undefined): number | null {
  return /^[1-9]\d{0,14}$/.test(text ?? "") ? Number(text) : null;
}
