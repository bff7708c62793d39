/** Signs in as the demo firm's manager and gives back the cookie. */
export async function signIn(url: string): Promise<string> {
  const answer = await fetch(`${url}/sign-in`, {
    method: "POST",
    redirect: "manual",
    headers: { Origin: url },
    body: new URLSearchParams({ email: "greta@saltmarsh.example", password: "saltmarsh-demo-2026" }),
  });
  const cookies = answer.headers.getSetCookie().map((cookie) => cookie.split(";")[0]);
  if (cookies.length === 0) throw new Error(`Nobody could sign in: ${answer.status}.`);
  return cookies.join("; ");
}
