import { z } from "zod";
import { hasHiddenCharacter } from "./hidden-character";

/** Option codes joined by `+`; none for an empty text. Each code once. */
export const optionCodes = z.string().transform((text, ctx) => {
  const codes = text.trim() === "" ? [] : text.split("+").map((each) => each.trim().normalize("NFC"));
  const fits = codes.every((each) => each !== "" && each.length <= 64 && !hasHiddenCharacter(each));
  if (fits) return [...new Set(codes)];
  ctx.addIssue({ code: "custom", message: "option codes joined by +, such as RADIO+COVER", input: text });
  return z.NEVER;
});
