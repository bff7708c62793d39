import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { openPage, signInAs } from "../support/browser-session";

const RULES = ["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"];

const PAGES = [
  "/check?kit=S2&quantity=10",
  "/check?kit=S2&quantity=250&by=2027-06-01",
  "/check?kit=S2&quantity=3",
  "/check?kit=NO-SUCH-KIT",
  "/pack/kit-orders",
  "/pack/kit-orders/new",
  "/no-such-page",
];

async function violations(page: Page) {
  const { violations: found } = await new AxeBuilder({ page }).withTags(RULES).analyze();
  return found.map((one) => `${one.id}: ${one.nodes.map((node) => node.html).join(" | ")}`);
}

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(colorScheme, () => {
    // So tall that nothing lies half behind the ship line, from where one could scroll it.
    test.use({ colorScheme, viewport: { width: 1280, height: 4000 } });
    // Reading a whole page by the rules takes seconds, and these read many.
    test.slow();

    test("the sign-in page has nothing in the way", async ({ page }) => {
      await page.goto("/sign-in");
      await expect(page.getByRole("button", { name: "Sign in", exact: true })).toBeVisible();
      expect(await violations(page)).toEqual([]);
    });

    test("no page of the planner has anything in the way", async ({ page }) => {
      await signInAs(page, "idris");
      for (const path of PAGES) {
        await openPage(page, path);
        expect.soft(await violations(page), path).toEqual([]);
      }
    });

    test("nor what opens: rungs, ship line, options, name, errors, an order, its cancelling", async ({
      page,
    }) => {
      await signInAs(page, "idris");
      await openPage(page, "/check?kit=S2&quantity=10");
      const folded = page.getByRole("button", { name: /as below|more/ });
      while ((await folded.count()) > 0) await folded.first().click();
      await page.getByText("why").click();
      await page.getByRole("spinbutton", { name: "How many kits" }).fill("0");
      expect.soft(await violations(page), "opened").toEqual([]);
      await page.getByText("Idris Fenwick").first().click();
      expect.soft(await violations(page), "name").toEqual([]);

      await page.goto("/pack/kit-orders/new");
      await page.getByLabel("Priority").fill("soon");
      await page.getByRole("button", { name: "Enter the order" }).click();
      await expect(page.getByText("Give a whole number from 1")).toBeVisible();
      expect.soft(await violations(page), "errors").toEqual([]);

      await page.goto("/pack/kit-orders");
      await page.getByRole("row").nth(1).getByRole("link").click();
      await expect(page.getByRole("button", { name: "Save the changes" })).toBeVisible();
      expect.soft(await violations(page), "order").toEqual([]);
      await page.getByRole("link", { name: /Cancel this order/ }).click();
      await expect(page.getByRole("link", { name: "Keep it" })).toBeVisible();
      expect.soft(await violations(page), "cancel").toEqual([]);
    });

    test("on a phone", async ({ page }) => {
      await page.setViewportSize({ width: 360, height: 8000 });
      await signInAs(page, "idris");
      for (const path of ["/check?kit=S2&quantity=10", "/pack/kit-orders"]) {
        await openPage(page, path);
        expect.soft(await violations(page), path).toEqual([]);
      }
    });
  });
}
