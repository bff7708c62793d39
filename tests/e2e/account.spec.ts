import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

test("a token made at one's account answers for its role until it is withdrawn", async ({
  page,
  baseURL,
}) => {
  const faults = watchForFaults(page);
  await signInAs(page, "wren");
  await openPage(page, "/account");
  await expect(page.getByText("This one")).toBeVisible();
  await page.getByLabel("What it is for").fill("scales at the bench");
  await page.getByRole("button", { name: "Make the token" }).click();
  const box = page.getByLabel(/The new token/);
  await expect(box).toBeFocused();
  const token = await box.inputValue();
  const ask = () =>
    fetch(`${baseURL}/api/parts?q=HB-2041`, { headers: { Authorization: `Bearer ${token}` } });
  const answer = await ask();
  expect(answer.status).toBe(200);
  expect((await answer.json()).parts[0]).toMatchObject({ partNumber: "HB-2041", unitCost: null });
  await page.getByRole("button", { name: "End the token scales at the bench" }).click();
  await expect(page.getByRole("status").filter({ hasText: "withdrawn" })).toBeVisible();
  await expect(box).toHaveCount(0);
  expect((await ask()).status).toBe(401);
  faults.expectNone();
});

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(colorScheme, () => {
    test.use({ colorScheme, viewport: { width: 360, height: 5000 } });

    test("the account has nothing in the way, and no page scrolls sideways", async ({ page }) => {
      await signInAs(page, "tam");
      await openPage(page, "/account");
      const { violations } = await new AxeBuilder({ page })
        .withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"])
        .analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0].html}`)).toEqual([]);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
    });
  });
}
