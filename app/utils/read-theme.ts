/** The person's choice of light or dark from the `Cookie` header; undefined follows the device. */
export function readTheme(cookieHeader: string | null): "light" | "dark" | undefined {
  const found = /(?:^|;\s*)theme=(light|dark)(?:;|$)/.exec(cookieHeader ?? "");
  return found ? (found[1] as "light" | "dark") : undefined;
}
