/**
 * The network address that a request came from. The server in front writes it into this header and drops
 * what a client may have put there.
 */
export const ADDRESS_HEADER = "X-Cotterpin-Address";

export function requestAddress(headers: Headers): string {
  return (headers.get(ADDRESS_HEADER) ?? "here").replace(/[^\w.:-]/g, "").slice(0, 64);
}
