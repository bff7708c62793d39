import { z } from "zod";
import { hasHiddenCharacter } from "./hidden-character";

const longestPartNumber = 64;

/** A part number is text, whatever it looks like: trimmed, NFC, 1 to 64 characters, none of them hidden. */
export const partNumber = z.string().transform((text, ctx) => {
  const trimmed = text.trim().normalize("NFC");
  const refuse = (message: string) => {
    ctx.addIssue({ code: "custom", message, input: text });
    return z.NEVER;
  };
  if (trimmed === "") return refuse("a part number");
  if ([...trimmed].length > longestPartNumber)
    return refuse(`a part number of at most ${longestPartNumber} characters`);
  if (hasHiddenCharacter(trimmed)) return refuse("a part number without control or invisible characters");
  return trimmed;
});
