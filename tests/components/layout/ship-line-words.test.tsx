import { renderToStaticMarkup } from "react-dom/server";
import { expect, test } from "vitest";
import { ShipLineWords } from "~/components/layout/ship-line-words";

const answer = {
  ready: 7,
  of: 10,
  next: { kitOrder: "KO-0008", partNumber: "S2", stoppers: [{ partNumber: "HB-2041", missing: "2" }] },
  allBy: "2999-03-14",
  revision: 1,
};

const words = (props: Parameters<typeof ShipLineWords>[0]) =>
  renderToStaticMarkup(<ShipLineWords {...props} />).replace(/<[^>]+>/g, "");

test("says how many are ready, what stops the next and when all can go", () => {
  const said = words({ answer, stale: false });
  expect(said).toContain("7 of 10 ready");
  expect(said).toContain("KO-0008 stops at HB-2041, 2 missing");
  expect(said).toContain("all ten by 14 March 2999");
});

test("says when nothing stops them, and when it has not heard", () => {
  expect(words({ answer: { ...answer, ready: 10, next: null }, stale: false })).toContain("Nothing stops");
  expect(words({ answer, stale: true })).toContain("as last heard");
});
