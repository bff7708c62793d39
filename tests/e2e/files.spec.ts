import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

test("the planner brings in a file with errors, mends it, and takes the parts out", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/find/files");
  const part = `T-${Date.now().toString(36).toUpperCase()}`;
  await page.getByLabel("What is in it").selectOption("parts");
  const rows = page.getByLabel(/paste rows/);
  await rows.fill(`Part Number,sourcing,Shelf\n${part},bought,9\n`);
  await page.getByRole("button", { name: "See what it would do" }).click();

  await expect(page.getByRole("heading", { name: "Match the headers by hand" })).toBeVisible();
  await expect(page.getByLabel("Part Number")).toHaveValue("part_number");
  await page.getByRole("button", { name: "See what it would do" }).last().click();
  await expect(page.getByText('found "bought"; expected buy, make or phantom')).toBeVisible();
  await expect(page.getByRole("button", { name: /Bring in/ })).toHaveCount(0);
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);

  await rows.fill(`part_number,sourcing\n${part},buy\n`);
  await page.getByRole("button", { name: "See what it would do" }).click();
  await expect(page.getByRole("heading", { name: "1 new." })).toBeVisible();
  await page.getByRole("button", { name: "Bring in 1 row" }).click();
  await expect(page.getByText("is in. 1 new.")).toBeVisible();

  const parts = await page.request.get("/api/exports/parts");
  expect(await parts.text()).toContain(`\r\n${part},buy,`);
  faults.expectNone();
});
