import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

const focused = (page: Page) => page.evaluate(() => document.activeElement?.textContent ?? "");

test("a structure of eighteen hundred parts opens at once and is walked by keyboard", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "tam");
  await openPage(page, "/find/parts/S2/structure?kits=10");
  const tree = page.getByRole("treegrid", { name: "Structure of S2" });
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);

  await page.getByRole("button", { name: "Open all" }).click();
  await expect.poll(async () => Number(await tree.getAttribute("aria-rowcount"))).toBeGreaterThan(1_700);
  await page.getByRole("button", { name: "Close all" }).click();

  await tree.getByRole("row", { name: /S2/ }).first().focus();
  await page.keyboard.press("ArrowDown");
  const first = await focused(page);
  await page.keyboard.press("ArrowRight");
  await page.keyboard.press("ArrowDown");
  await expect.poll(() => focused(page)).not.toBe(first);
  await page.keyboard.press("ArrowLeft");
  await expect.poll(() => focused(page)).toBe(first);

  await page.getByLabel(/Only what leads to the 15 parts missing/).check();
  await page.getByLabel("Find in it").fill("HB-2041");
  await expect(tree.getByRole("row", { name: /HB-2041/ }).first()).toBeVisible();
  await tree
    .getByRole("row", { name: /HB-2041/ })
    .first()
    .getByRole("link", { name: /missing/ })
    .click();
  await expect(page.getByRole("dialog", { name: "Why HB-2041" })).toContainText("For 10 of S2");
  faults.expectNone();
});

test("a phone has no sideways scroll, and a count that is none is said", async ({ page }) => {
  await page.setViewportSize({ width: 360, height: 740 });
  await signInAs(page, "tam");
  await openPage(page, "/find/parts/S2/structure?kits=none");
  await expect(page.getByRole("alert")).toContainText("whole number from 1 to 1,000");
  const sideways = () => document.documentElement.scrollWidth - document.documentElement.clientWidth;
  expect(await page.evaluate(sideways)).toBe(0);
});
