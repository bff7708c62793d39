import { z } from "zod";
import { newPasswordSchema } from "./new-password";
import { roleSchema } from "./role";

/** The form by which somebody who is signed in changes their password. */
export const changePasswordSchema = z.object({
  present: z
    .string({ error: "Write your present password." })
    .min(1, "Write your present password.")
    .max(1000, "That is too long for a password."),
  password: newPasswordSchema,
});

/** The code that is typed after the password, or a recovery code. */
export const codeSchema = z.object({
  code: z
    .string({ error: "Type the code." })
    .trim()
    .min(1, "Type the code.")
    .max(40, "That is too long for a code."),
});

/** The form that makes a token of one's own. */
export const ownTokenSchema = z.object({
  name: z
    .string({ error: "Say what the token is for." })
    .trim()
    .min(1, "Say what the token is for.")
    .max(120, "A name has at most 120 characters."),
  role: roleSchema,
});
