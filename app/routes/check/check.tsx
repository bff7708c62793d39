import type { ShouldRevalidateFunctionArgs } from "react-router";
import { CheckPage } from "~/components/check/check-page";
import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { guardedLoader } from "~/services/people/guard.server";
import { getCheckAnswer } from "~/services/planning/get-check-answer.server";
import type { Route } from "./+types/check";

export const meta: Route.MetaFunction = () => [{ title: "Check · Cotterpin" }];

/** What the address asks wrongly is left out, and the page shows what it asked instead. */
export const loader = guardedLoader("look", ({ url }: Route.LoaderArgs, person) => {
  const search = Object.fromEntries(url.searchParams);
  const options = url.searchParams.getAll("options").join(",");
  const asked = checkQuestionSchema.safeParse({ ...search, options });
  return getCheckAnswer(asked.success ? asked.data : { quantity: 10, options: [] }, person);
});

/** While somebody fills in the question, the answers come through the JSON route. */
export function shouldRevalidate({
  currentUrl,
  nextUrl,
  formMethod,
  defaultShouldRevalidate,
}: ShouldRevalidateFunctionArgs): boolean {
  const isSamePage = currentUrl.pathname === nextUrl.pathname && formMethod === undefined;
  return isSamePage ? false : defaultShouldRevalidate;
}

export default function Check({ loaderData }: Route.ComponentProps) {
  return <CheckPage first={loaderData} />;
}
