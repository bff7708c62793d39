import { z } from "zod";

/** One of a few fixed words. */
export function word<const Words extends readonly [string, ...string[]]>(...words: Words) {
  return z.string().transform((text, ctx): Words[number] => {
    const found = words.find((each) => each === text.trim());
    if (found !== undefined) return found;
    ctx.addIssue({ code: "custom", message: words.length === 1 ? words[0] : sayWords(words), input: text });
    return z.NEVER;
  });
}

function sayWords(words: readonly string[]): string {
  return `${words.slice(0, -1).join(", ")} or ${words[words.length - 1]}`;
}

/** `1` for yes, `0` for no. */
export const yesNo = word("0", "1").transform((text) => text === "1");
