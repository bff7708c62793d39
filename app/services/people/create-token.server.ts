import { ApiToken } from "~/db/models/people/api-token";
import type { Role } from "~/schemas/people/role";
import { hashSecret, newSecret } from "./secret.server";

/**
 * Makes a token that stands for a role.
 * @returns the token, which is shown once; only its hash is kept
 */
export async function createToken({ role, name }: { role: Role; name: string }): Promise<string> {
  const token = newSecret();
  await ApiToken.create({ tokenHash: hashSecret(token), role, name });
  return token;
}
