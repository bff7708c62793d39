/** Where scripts, styles, pictures and fonts may come from: this application alone. */
function contentPolicy(nonce: string, development: boolean): string {
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}'`,
    // The development server injects style elements that cannot carry the nonce.
    development ? "style-src 'self' 'unsafe-inline'" : `style-src 'self' 'nonce-${nonce}'`,
    "img-src 'self' data: blob:",
    "font-src 'self'",
    development ? "connect-src 'self' ws:" : "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

interface Setting {
  nonce: string;
  requestId: string;
  /** Served over TLS, so browsers may be told to stay with it. */
  secure: boolean;
  development: boolean;
}

/** Sets the headers that every answer carries; what an answer says itself about caching stays. */
export function setSecurityHeaders(
  headers: Headers,
  { nonce, requestId, secure, development }: Setting,
): void {
  headers.set("Content-Security-Policy", contentPolicy(nonce, development));
  headers.set("X-Content-Type-Options", "nosniff");
  headers.set("X-Frame-Options", "DENY");
  headers.set("Referrer-Policy", "same-origin");
  headers.set("Cross-Origin-Opener-Policy", "same-origin");
  headers.set("Cross-Origin-Resource-Policy", "same-origin");
  headers.set("Permissions-Policy", "camera=(), geolocation=(), microphone=(), payment=()");
  headers.set("X-Request-Id", requestId);
  if (secure) headers.set("Strict-Transport-Security", "max-age=31536000");
  if (!headers.has("Cache-Control")) headers.set("Cache-Control", "private, no-store");
}
