import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

const focused = (page: Page) => page.evaluate(() => document.activeElement?.textContent ?? "");

/** Goes down from link to link until the one with the words has the focus. */
async function walkTo(page: Page, words: string): Promise<void> {
  for (let step = 0; step < 40 && !(await focused(page)).startsWith(words); step++) {
    await page.keyboard.press("ArrowDown");
  }
  expect(await focused(page)).toContain(words);
}

test("a tag of the ladder opens to its causes, down to a bolt and back, by keyboard", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  const tag = page.getByRole("table", { name: "The ladder" }).getByRole("link", { name: /^HB-2041/ });
  await tag.focus();
  await page.keyboard.press("Enter");

  const panel = page.getByRole("dialog", { name: "Why HB-2041" });
  await expect(panel).toContainText("For 8 of S2: 10 needed, 8 from stock, 2 missing here.");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
  await walkTo(page, "LD-220");
  await page.keyboard.press("Enter");
  await expect(page.getByRole("dialog", { name: "Why LD-220" })).toBeVisible();
  await walkTo(page, "LD-200");
  await page.keyboard.press("Enter");
  const drive = page.getByRole("dialog", { name: "Why LD-200" });
  await expect(drive.getByRole("navigation", { name: "Walked from" })).toContainText("HB-2041");

  const bolt = drive
    .getByRole("region", { name: /What that takes/ })
    .getByRole("link")
    .last();
  const boltNumber = (await bolt.textContent()) ?? "";
  await walkTo(page, boltNumber);
  await page.keyboard.press("Enter");
  await expect(page.getByRole("dialog", { name: `Why ${boltNumber}` })).toContainText("LD-200");

  const address = page.url();
  await page.keyboard.press("Escape");
  await expect(page.getByRole("dialog")).toHaveCount(0);
  await expect(page).toHaveURL(/\/check\?kit=S2&quantity=10$/);
  await expect(tag).toBeFocused();

  await page.goto(address);
  await expect(page.getByRole("dialog", { name: `Why ${boltNumber}` })).toBeVisible();
  faults.expectNone();
});

test("the ship line opens to the order that waits, and a why is printed alone", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/check");
  await page.getByRole("region", { name: "Ship line" }).locator("summary").click();
  await page
    .getByRole("region", { name: "Ship line" })
    .getByRole("link", { name: /^HB-2041/ })
    .click();
  const panel = page.getByRole("dialog", { name: "Why HB-2041" });
  await expect(panel).toContainText(/open kit orders up to KO-\d+/);
  await page.emulateMedia({ media: "print" });
  await expect(panel).toBeVisible();
  await expect(page.getByRole("heading", { name: "The ladder" })).toBeHidden();
});

test("a number that is not there is said, and Check stays", async ({ page }) => {
  await signInAs(page, "idris");
  await page.goto("/check/why?kit=S2&quantity=10&part=NO-SUCH");
  await expect(page.getByRole("dialog")).toContainText("There is no part NO-SUCH in the book.");
  await page.keyboard.press("Escape");
  await expect(page.getByRole("heading", { name: "The ladder" })).toBeVisible();
});
