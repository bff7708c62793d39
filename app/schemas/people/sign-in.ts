import { z } from "zod";

/** Trimmed and in small letters: the form in which an address is kept and looked up. */
export const emailSchema = z
  .string({ error: "Write an e-mail address." })
  .trim()
  .toLowerCase()
  .max(190, "An e-mail address has at most 190 characters.")
  .pipe(z.email("Write an e-mail address, such as wren@saltmarsh.example."));

export const signInSchema = z.object({
  email: z
    .string({ error: "Write your e-mail address." })
    .trim()
    .toLowerCase()
    .min(1, "Write your e-mail address.")
    .max(320, "That is too long for an e-mail address."),
  password: z
    .string({ error: "Write your password." })
    .min(1, "Write your password.")
    .max(1000, "That is too long for a password."),
});
