import { Outlet, type ShouldRevalidateFunctionArgs } from "react-router";
import { CheckPage } from "~/components/check/check-page";
import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { readCheckQuery } from "~/schemas/planning/read-check-query";
import { guardedLoader } from "~/services/people/guard.server";
import { getCheckAnswer } from "~/services/planning/get-check-answer.server";
import type { Route } from "./+types/check";

export const meta: Route.MetaFunction = () => [{ title: "Check · Cotterpin" }];

/** Where the address asks what cannot be, the page says so and keeps the rest of the question. */
export const loader = guardedLoader("look", ({ url }: Route.LoaderArgs, person) => {
  const search = readCheckQuery(url.searchParams);
  const asked = checkQuestionSchema.safeParse(search);
  if (asked.success) return getCheckAnswer(asked.data, person);
  const wrong = new Set(asked.error.issues.map((issue) => issue.path[0]));
  const rest = Object.fromEntries(Object.entries(search).filter(([name]) => !wrong.has(name)));
  const kept = checkQuestionSchema.parse(rest);
  return getCheckAnswer({ ...kept, problem: asked.error.issues[0].message }, person);
});

const isHere = (pathname: string) => /^\/check(\/|$)/.test(pathname);

/** While somebody fills in the question, or opens a why beside it, the answers come through the JSON route. */
export function shouldRevalidate({
  currentUrl,
  nextUrl,
  formMethod,
  defaultShouldRevalidate,
}: ShouldRevalidateFunctionArgs): boolean {
  const isSamePage = isHere(currentUrl.pathname) && isHere(nextUrl.pathname) && formMethod === undefined;
  return isSamePage ? false : defaultShouldRevalidate;
}

export default function Check({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <CheckPage first={loaderData} />
      <Outlet />
    </>
  );
}
