import { runInPasswordThread } from "./password-worker.server";

/** A hash of the usual cost that fits nobody's password: people we do not know take as long as others. */
const NOBODYS = "$2b$11$gxYVDN8Jiu.F9ksiPe67FuG49CcMTeSaKHIVYopsDEgf2KZ5dH0OK";

/** Whether the password fits the hash; without a hash it takes the same time and says no. */
export async function verifyPassword(password: string, hash: string | undefined): Promise<boolean> {
  const fits = await runInPasswordThread({ act: "compare", password, hash: hash ?? NOBODYS });
  return fits === true && hash !== undefined && Buffer.byteLength(password) <= 72;
}
