import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

test("a what-if is tried, sent as a link, and read the same by a colleague", async ({ page, browser }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=8");
  await page.getByRole("button", { name: "What if …" }).click();
  const tray = page.getByRole("form", { name: "A change to try" });
  await tray.getByLabel("By how many").fill("2");
  await tray.getByLabel("Part number").fill("HB-2041");
  await tray.getByRole("button", { name: "Try it" }).click();

  const tried = page.getByRole("region", { name: "What if" });
  await expect(tried).toContainText("2 more of HB-2041 in stock");
  await expect(tried).toContainText("With these changes");
  for (const part of ["CL-1114", "RU-2210R"]) {
    await page.getByRole("link", { name: `What if all ${part} were here` }).click();
    await expect(tried).toContainText(`more of ${part} in stock`);
  }
  await expect(tried).toContainText("With these changes: 8 from what is here instead of 7");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
  faults.expectNone();

  const other = await browser.newPage();
  await signInAs(other, "greta");
  await openPage(other, page.url());
  await expect(other.getByRole("region", { name: "What if" })).toContainText(
    "8 from what is here instead of 7",
  );
  await other.close();

  await page.getByRole("button", { name: /Take away: 2 more of HB-2041/ }).click();
  await expect(tried).not.toContainText("HB-2041");
  await page.getByRole("button", { name: "Without them" }).click();
  await expect(page).toHaveURL(/\/check\?kit=S2&quantity=8$/);
});

test("one that cannot be tried says why", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/check?kit=S2&quantity=8&if=stock:NO-SUCH:%2B2");
  await expect(page.getByRole("alert")).toContainText("Not tried: There is no part NO-SUCH in the book.");
});
