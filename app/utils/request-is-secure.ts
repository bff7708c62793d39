import { readEnv } from "./env";

/** Whether people reach this address over TLS, at our door or at the proxy that `PUBLIC_URL` names. */
export function isSecure(url: URL): boolean {
  return url.protocol === "https:" || readEnv().publicUrl?.startsWith("https:") === true;
}
