/** `1731.8` to `1,731.8`: a decimal string with its thousands set apart. Digits are never changed. */
export function formatNumber(decimal: string | number): string {
  const [, sign, whole, rest] = /^([-+]?)(\d+)(.*)$/.exec(String(decimal)) ?? [];
  if (whole === undefined) return String(decimal);
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ",");
  return `${sign === "-" ? "−" : ""}${grouped}${rest}`;
}
