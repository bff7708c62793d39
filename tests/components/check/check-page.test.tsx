import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { renderToString } from "react-dom/server";
import { createMemoryRouter, RouterProvider } from "react-router";
import { expect, test } from "vitest";
import { CheckPage } from "~/components/check/check-page";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { buildCheckAnswer } from "../../support/build-check-answer";

/** The page as the server sends it, before any script runs. */
function page(first: CheckPageAnswer): string {
  const router = createMemoryRouter([{ path: "/check", element: <CheckPage first={first} /> }], {
    initialEntries: ["/check"],
  });
  const html = renderToString(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return html.replace(/<!-- -->/g, "");
}

const text = (html: string) => html.replace(/<[^>]+>/g, " ").replace(/\s+/g, " ");

test("the first answer is there before any script", () => {
  const words = text(page(buildCheckAnswer()));
  expect(words).toContain("Seven can be made from what is here, today.");
  expect(words).toContain("1 of 1,812 parts");
  expect(words).toContain("Held parts stay held");
});

test("the ladder is a table with a row for each kit, from the top", () => {
  const html = page(buildCheckAnswer());
  const ladder = html.slice(
    html.indexOf('aria-labelledby="ladder-title"'),
    html.indexOf('id="stoppers-title"'),
  );
  const kits = [...ladder.matchAll(/<th[^>]*scope="row"[^>]*>(\d+)</g)].map((match) => Number(match[1]));
  expect(kits).toEqual([10, 9, 8, 7, 6, 5, 4, 3, 2, 1]);
  expect(ladder.match(/>ready<\/span>/g)).toHaveLength(7);
  expect(ladder.match(/>stopped<\/span>/g)).toHaveLength(3);
});

test("no style attribute stands in it, since the page's policy forbids them", () => {
  expect(page(buildCheckAnswer({ quantity: 300 }))).not.toMatch(/\sstyle=/);
});

test("costs are nowhere for those who may not see them", () => {
  const hidden = buildCheckAnswer({ seesCosts: false });
  hidden.parts = hidden.parts.map((part) => ({ ...part, cost: null, unitCost: null }));
  const words = text(page(hidden));
  expect(words).not.toContain("Cost");
  expect(words).not.toContain("in parts");
  expect(words).not.toContain("no price");
});

test("an empty book says what to bring in", () => {
  const words = text(page({ ...buildCheckAnswer(), kits: [], answer: null }));
  expect(words).toContain("There is no kit in the book yet.");
});

test("an unknown kit is said, and the question stays to be mended", () => {
  const problem = "There is no part NOPE.";
  const html = page({ ...buildCheckAnswer(), answer: null, problem });
  expect(text(html)).toContain(problem);
  expect(html).toContain('aria-label="Which kit"');
});

test("what should be known beside the answer is said in sentences", () => {
  const first = buildCheckAnswer();
  first.answer?.warnings.push(
    { code: "overdue-supply", partNumber: "A" },
    { code: "overdue-supply", partNumber: "B" },
    { code: "as-required-none-on-hand", partNumber: "GR-01" },
  );
  const words = text(page(first)).replaceAll(" ,", ",");
  expect(words).toContain("A and B are overdue on open orders.");
  expect(words).toContain("GR-01 is used as required and none is on hand.");
});
