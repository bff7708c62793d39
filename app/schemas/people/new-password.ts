import { z } from "zod";
import { COMMON_PASSWORDS } from "./common-passwords";

const encoder = new TextEncoder();

const bytesOf = (text: string) => encoder.encode(text).length;

const plain = (text: string) => text.toLowerCase().replace(/[\s._!@#$*-]/g, "");

/** A password somebody chooses: 12 to 72 bytes, since the hash reads no more, and not one that everybody tries. */
export const newPasswordSchema = z
  .string({ error: "Choose a password." })
  .refine(
    (text) => bytesOf(text) >= 12,
    "Use at least 12 characters; a short sentence is easy to keep in mind.",
  )
  .refine(
    (text) => bytesOf(text) <= 72,
    "Use at most 72 characters (letters with accents count double); what comes after would not be read.",
  )
  .refine(
    (text) => !COMMON_PASSWORDS.has(plain(text)) && new Set(plain(text)).size > 3,
    "This password is among the first that are tried. Choose another.",
  );
