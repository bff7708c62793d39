import type { CheckQuestion } from "~/schemas/planning/check-answer";

/** A question as the address and the JSON route take it: `kit=S2&quantity=10&by=2027-03-14&options=A,B`. */
export function checkSearch(question: CheckQuestion): string {
  const search = new URLSearchParams();
  if (question.kit !== null) search.set("kit", question.kit);
  search.set("quantity", String(question.quantity));
  if (question.by !== null) search.set("by", question.by);
  if (question.options.length > 0) search.set("options", question.options.join(","));
  for (const one of question.ifs) search.append("if", one);
  return search.toString();
}
