import { runInPasswordThread } from "./password-worker.server";

const COST = 11;

/** Hashes a password that has passed `newPasswordSchema`. */
export async function hashPassword(password: string): Promise<string> {
  return String(await runInPasswordThread({ act: "hash", password, cost: COST }));
}
