import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

const RULES = ["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"];

const box = (page: Page) => page.getByRole("combobox", { name: "Find by number or words" });

/** A scanner: the code and Enter, with nothing in between. Tried again where the machine stammers. */
async function scan(page: Page, code: string, address: string | RegExp) {
  await expect(async () => {
    await page.keyboard.type(code, { delay: 0 });
    await page.keyboard.press("Enter");
    await page.waitForURL(address, { timeout: 3000 });
  }).toPass({ timeout: 20_000 });
}

test("a part is found by typing words in any order, and read", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "wren");
  await openPage(page, "/find");
  await page.getByLabel("Number or words", { exact: true }).fill("sealed 2041");
  await page.getByRole("button", { name: "Find", exact: true }).click();
  await page
    .getByRole("region", { name: "Parts" })
    .getByRole("link", { name: /HB-2041/ })
    .click();
  await expect(page.getByRole("heading", { level: 1, name: "HB-2041" })).toBeVisible();
  const shelves = page.getByRole("region", { name: "On the shelves" });
  await expect(shelves.getByRole("row", { name: /held/ })).toBeVisible();
  await expect(shelves).toContainText("Held and expired stock stays where it is");
  await expect(page.getByText("Cost of one")).toHaveCount(0);
  await expect(page.getByRole("columnheader", { name: "Price" })).toHaveCount(0);
  await page.getByRole("region", { name: "What it stops now" }).getByRole("link", { name: "Why" }).click();
  await expect(page).toHaveURL(/check\/why\?.*part=HB-2041/);
  faults.expectNone();
});

test("what is not there says what to try", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/find?q=no-such-thing");
  await expect(page.getByRole("status").filter({ hasText: "Nothing in the book" })).toContainText(
    "shorter piece",
  );
});

test("the key / leads into the box; arrows and Enter open what is found", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/pack/kit-orders");
  await page.keyboard.press("/");
  await expect(box(page)).toBeFocused();
  await expect(box(page)).toHaveValue("");
  await page.keyboard.type("hb-2041");
  await expect(page.getByRole("option").first()).toContainText("HB-2041");
  await page.keyboard.press("ArrowDown");
  await expect(page.getByRole("option").first()).toHaveAttribute("aria-selected", "true");
  await page.keyboard.press("Enter");
  await page.waitForURL("**/find/parts/HB-2041");
  await page.keyboard.press("/");
  await expect(box(page)).toBeFocused();
  await page.keyboard.type("ko-015");
  await expect(page.getByRole("option").first()).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(page.getByRole("option")).toHaveCount(0);
  await page.keyboard.press("/");
  await expect(box(page)).toHaveValue("ko-015/");
});

test("a scanner opens what it reads, wherever the focus is", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/check?kit=S2&quantity=10");
  await scan(page, "HB-2041", "**/find/parts/HB-2041");
  await scan(page, "PHB-2041", "**/find/parts/HB-2041");
  await scan(page, "Q01-1", "**/find/bins/Q01-1");
  await expect(page.getByRole("heading", { level: 1, name: "Q01-1" })).toBeVisible();
  // In the box as well: Enter goes before the list is there.
  await box(page).focus();
  await scan(page, "KO-0154", "**/find/kit-orders/KO-0154");
});

test("slow typing outside a field opens nothing", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/find/parts/HB-2041");
  await page.keyboard.type("S2xx", { delay: 130 });
  await page.keyboard.press("Enter");
  await page.waitForTimeout(500);
  await expect(page).toHaveURL(/find\/parts\/HB-2041$/);
});

const PAGES = ["/find", "/find?q=bearing", "/find/parts/HB-2041", "/find/parts/S2", "/find/bins/Q01-1"];

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(colorScheme, () => {
    test.use({ colorScheme, viewport: { width: 1280, height: 4000 } });
    test.slow();

    test("no page of Find has anything in the way", async ({ page }) => {
      await signInAs(page, "maud");
      for (const path of PAGES) {
        await openPage(page, path);
        const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
        expect
          .soft(
            violations.map(({ id, nodes }) => `${id}: ${nodes[0].html}`),
            path,
          )
          .toEqual([]);
      }
      await box(page).fill("bearing");
      await expect(page.getByRole("option").first()).toBeVisible();
      const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0].html}`)).toEqual([]);
    });
  });
}

test.describe("on a telephone", () => {
  test.use({ viewport: { width: 360, height: 740 } });

  test("no page of Find scrolls sideways", async ({ page }) => {
    await signInAs(page, "maud");
    for (const path of [...PAGES, "/find/suppliers/THORNWICK", "/find/purchase-orders/PO-26-0901"]) {
      await openPage(page, path);
      const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect.soft(over, path).toBeLessThanOrEqual(0);
    }
    await page.getByRole("link", { name: "Find by number or words" }).click();
    await expect(page.getByRole("heading", { level: 1, name: "Find" })).toBeVisible();
  });
});
