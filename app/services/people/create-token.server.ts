import type { Role } from "~/schemas/people/role";
import { insert } from "./run-sql.server";
import { hashSecret, newSecret } from "./secret.server";

/**
 * Makes a token that stands for a role.
 * @returns the token, which is shown once; only its hash is kept
 */
export async function createToken({ role, name }: { role: Role; name: string }): Promise<string> {
  const token = newSecret();
  await insert("INSERT INTO api_token (token_hash, role, name) VALUES (:hash, :role, :name)", {
    hash: hashSecret(token),
    role,
    name,
  });
  return token;
}
