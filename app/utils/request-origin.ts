/**
 * Whether a request that changes something comes from our own pages. The `Origin` must be the address people use
 * (or the one asked); a browser that sends none must say `same-origin`. A missing sign of origin is refused.
 */
export function isFromOurPages(headers: Headers, url: URL, publicUrl: string | undefined): boolean {
  const origin = headers.get("Origin");
  const site = headers.get("Sec-Fetch-Site");
  if (site !== null && site !== "same-origin") return false;
  if (origin === null) return site === "same-origin";
  if (origin === url.origin) return true;
  return publicUrl !== undefined && origin === new URL(publicUrl).origin;
}
