const NAME = "cotterpin_session";

/** 256 bits in base64url; anything else is no session of ours. */
const ID = /^[\w-]{43}$/;

const SEVEN_DAYS = 7 * 24 * 60 * 60;

/** The session id that a browser sent, or null. */
export function readSessionId(headers: Headers): string | null {
  for (const pair of (headers.get("Cookie") ?? "").split(";")) {
    const [name, value] = pair.trim().split("=", 2);
    if (name === NAME && value !== undefined && ID.test(value)) return value;
  }
  return null;
}

/** The `Set-Cookie` header that hands a session to the browser; scripts cannot read it. */
export function sessionCookie(id: string, { secure }: { secure: boolean }): string {
  return cookie(id, SEVEN_DAYS, secure);
}

/** The `Set-Cookie` header that takes the session away. */
export function clearedSessionCookie({ secure }: { secure: boolean }): string {
  return cookie("", 0, secure);
}

function cookie(value: string, maxAge: number, secure: boolean): string {
  const end = secure ? "; Secure" : "";
  return `${NAME}=${value}; Path=/; Max-Age=${maxAge}; HttpOnly; SameSite=Lax${end}`;
}
