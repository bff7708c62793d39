import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { Secret, TOTP } from "otpauth";
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

test("the second factor is set up, asked for at the next sign-in and switched off", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "maud");
  await openPage(page, "/account");
  await page.getByRole("button", { name: "Set it up" }).click();
  const factor = page.getByRole("region", { name: "Second factor" });
  await expect(factor.getByRole("img")).toBeVisible();
  const letters = (await factor.getByText(/^([A-Z2-7]{4} ){7}/).textContent()) ?? "";
  const totp = new TOTP({ secret: Secret.fromBase32(letters.replaceAll(" ", "")) });
  await factor.getByLabel("The code it shows now").fill(totp.generate({ timestamp: Date.now() - 30_000 }));
  await factor.getByRole("button", { name: "Switch it on" }).click();
  const codes = (await factor.getByLabel(/Ten recovery codes/).inputValue()).split("\n");
  expect(codes).toHaveLength(10);

  // Away from the page first, or it would go on asking without its cookie.
  await page.goto("about:blank");
  await page.context().clearCookies();
  await page.goto("/sign-in?to=%2Faccount");
  await page.getByLabel("E-mail address").fill("maud@saltmarsh.example");
  await page.getByLabel("Password").fill("saltmarsh-demo-2026");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).toHaveURL(/\/sign-in\/code/);
  await page.getByRole("textbox", { name: "Code" }).fill("nothing");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByText("This is not the code")).toBeVisible();
  await page.getByRole("textbox", { name: "Code" }).fill(totp.generate({ timestamp: Date.now() + 5_000 }));
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page).toHaveURL(/\/account$/);

  await factor.getByLabel("Password").fill("saltmarsh-demo-2026");
  await factor.getByLabel("Code, or a recovery code").fill(codes[0]);
  await factor.getByRole("button", { name: "Switch it off" }).click();
  await expect(page.getByText("The second factor is off.")).toBeVisible();
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
