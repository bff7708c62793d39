import { z } from "zod";
import { newPasswordSchema } from "./new-password";
import { roleSchema } from "./role";
import { emailSchema } from "./sign-in";

const nameSchema = z
  .string({ error: "Write a name." })
  .trim()
  .min(1, "Write a name.")
  .max(120, "A name has at most 120 characters.");

export const newPersonSchema = z.object({
  name: nameSchema,
  email: emailSchema,
  password: newPasswordSchema,
  roles: z.array(roleSchema).min(1, "Give at least one role."),
});

/** The form that the first visitor of an empty shop fills in. */
export const setUpSchema = z.object({
  code: z
    .string({ error: "Write the code that the start command printed." })
    .trim()
    .min(1, "Write the code that the start command printed.")
    .max(100, "That is not the code that the start command printed."),
  name: nameSchema,
  email: emailSchema,
  password: newPasswordSchema,
});

const rolesSchema = z
  .array(roleSchema, { error: "Give at least one role." })
  .min(1, "Give at least one role.")
  .transform((roles) => [...new Set(roles)]);

/** A person to be invited: the password is theirs to choose. */
export const invitePersonSchema = z.object({ name: nameSchema, email: emailSchema, roles: rolesSchema });

export const changeRolesSchema = z.object({ roles: rolesSchema });

export const choosePasswordSchema = z.object({ password: newPasswordSchema });

export const acceptInvitationSchema = z.object({ name: nameSchema, password: newPasswordSchema });

export const forgottenSchema = z.object({ email: emailSchema });
