import { readEnv } from "./env";

const ANY_ADDRESS = new Set(["0.0.0.0", "::", "[::]"]);

/**
 * The address that links in mails begin with, without a slash at its end. From the settings alone: what a request says
 * of its host could lead people elsewhere.
 */
export function ownAddress(): string {
  const { publicUrl, host, port } = readEnv();
  if (publicUrl) return new URL(publicUrl).origin;
  const name = ANY_ADDRESS.has(host) ? "127.0.0.1" : host;
  return `http://${name.includes(":") && !name.startsWith("[") ? `[${name}]` : name}:${port}`;
}
