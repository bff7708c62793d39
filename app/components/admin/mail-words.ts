import type { MailFacts } from "./mail-facts";

/** Where a mail stands, in a sentence's end. */
export function sayMailState({ state, tries }: Pick<MailFacts, "state" | "tries">): string {
  if (state === "sent") return "sent";
  if (state === "caught") return "kept in this mailbox";
  if (state === "dead") return `given up after ${tries} tries`;
  if (tries === 0) return "waiting to be sent";
  return tries === 1 ? "waiting, one try failed" : `waiting, ${tries} tries failed`;
}
