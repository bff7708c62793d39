const NAME = "cotterpin_session";

/** Names a browser that still owes the code of the second factor. */
const HALF = "cotterpin_half";

/** 256 bits in base64url; anything else is no session of ours. */
const ID = /^[\w-]{43}$/;

const SEVEN_DAYS = 7 * 24 * 60 * 60;
const FIVE_MINUTES = 5 * 60;

/** The session id that a browser sent, or null. */
export function readSessionId(headers: Headers): string | null {
  return readId(headers, NAME);
}

/** The id of a half sign-in that a browser sent, or null. */
export function readHalfId(headers: Headers): string | null {
  return readId(headers, HALF);
}

function readId(headers: Headers, wanted: string): string | null {
  for (const pair of (headers.get("Cookie") ?? "").split(";")) {
    const [name, value] = pair.trim().split("=", 2);
    if (name === wanted && value !== undefined && ID.test(value)) return value;
  }
  return null;
}

/** The `Set-Cookie` header that hands a session to the browser; scripts cannot read it. */
export function sessionCookie(id: string, { secure }: { secure: boolean }): string {
  return cookie(NAME, id, SEVEN_DAYS, secure);
}

/** The `Set-Cookie` header that takes the session away. */
export function clearedSessionCookie({ secure }: { secure: boolean }): string {
  return cookie(NAME, "", 0, secure);
}

/** The same for a half sign-in. */
export function halfCookie(id: string, { secure }: { secure: boolean }): string {
  return cookie(HALF, id, FIVE_MINUTES, secure);
}

export function clearedHalfCookie({ secure }: { secure: boolean }): string {
  return cookie(HALF, "", 0, secure);
}

function cookie(name: string, value: string, maxAge: number, secure: boolean): string {
  const end = secure ? "; Secure" : "";
  return `${name}=${value}; Path=/; Max-Age=${maxAge}; HttpOnly; SameSite=Lax${end}`;
}
