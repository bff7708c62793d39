/** The path, if it is one of ours to go to after signing in; else the start. Other addresses are never followed. */
export function ownPath(wanted: string | null): string {
  if (wanted === null || !/^\/(?![/\\])[^\s\\]*$/.test(wanted)) return "/";
  const base = "http://own.invalid";
  try {
    const url = new URL(wanted, base);
    return url.origin === base ? url.pathname + url.search + url.hash : "/";
  } catch {
    return "/";
  }
}
