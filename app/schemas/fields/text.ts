import { z } from "zod";
import { hasControlCharacter, hasHiddenCharacter } from "./hidden-character";

/** Free text, trimmed, at most `longest` characters; may be empty. */
export function text(longest: number) {
  return z
    .string()
    .transform((value) => value.trim().normalize("NFC"))
    .refine((value) => [...value].length <= longest, `at most ${longest} characters`)
    .refine((value) => !hasControlCharacter(value), "text without control characters");
}

/** A code that people type and scan (bin, lot, order number): one line, 1 to `longest` characters. */
export function code(what: string, longest = 64) {
  return z
    .string()
    .transform((value) => value.trim().normalize("NFC"))
    .refine((value) => value !== "", what)
    .refine((value) => [...value].length <= longest, `${what} of at most ${longest} characters`)
    .refine((value) => !hasHiddenCharacter(value), `${what} without control or invisible characters`);
}
