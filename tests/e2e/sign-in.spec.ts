import { expect, type Locator, type Page, test } from "@playwright/test";
import { watchForFaults } from "../support/browser-session";

const PEOPLE = [
  { name: "Idris Fenwick", role: "planner" },
  { name: "Wren Adlington", role: "clerk" },
  { name: "Maud Okonjo", role: "purchaser" },
  { name: "Tam Sorley", role: "builder" },
  { name: "Greta Lindqvist", role: "manager" },
];

/** Presses Tab until the wanted part of the page has the focus. */
async function tabTo(page: Page, wanted: Locator): Promise<void> {
  for (let presses = 0; presses < 30; presses++) {
    await page.keyboard.press("Tab");
    if (await wanted.evaluate((part) => part === document.activeElement)) return;
  }
  throw new Error("The focus never came to what was wanted.");
}

for (const { name, role } of PEOPLE) {
  test(`${name}, ${role}, signs in with one press, sees their page and signs out`, async ({ page }) => {
    const faults = watchForFaults(page);
    await page.goto("/");
    await expect(page).toHaveURL(/\/sign-in$/);
    await page.getByRole("button", { name: new RegExp(`^${name}`) }).click();
    await page.waitForURL(/\/check/);
    await expect(page.getByRole("main")).toBeVisible();
    const signOut = page.getByRole("button", { name: "Sign out" });
    // The menu closes once more when the page it stands on has settled.
    await expect(async () => {
      if (!(await signOut.isVisible())) await page.getByText(name, { exact: true }).first().click();
      await expect(signOut).toBeVisible({ timeout: 1_000 });
      await expect(page.getByText(role, { exact: true })).toBeVisible({ timeout: 1_000 });
    }).toPass();
    await signOut.click();
    await expect(page).toHaveURL(/\/sign-in$/);
    await page.goto("/check");
    await expect(page).toHaveURL(/\/sign-in\?to=%2Fcheck$/);
    faults.expectNone();
  });
}

test("a wrong password is answered by a sentence that has the focus, and the address stays", async ({
  page,
}) => {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill("idris@saltmarsh.example");
  await page.getByLabel("Password").fill("not this one");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  const notice = page.getByRole("alert");
  await expect(notice).toHaveText(/do not go together/);
  await expect(notice).toBeFocused();
  await expect(page.getByLabel("E-mail address")).toHaveValue("idris@saltmarsh.example");
});

test("signing in by keyboard alone leads where the person wanted to go", async ({ page }) => {
  await page.goto("/pack/kit-orders");
  await expect(page).toHaveURL(/\/sign-in\?to=%2Fpack%2Fkit-orders$/);
  await tabTo(page, page.getByLabel("E-mail address"));
  await page.keyboard.type("idris@saltmarsh.example");
  await page.keyboard.press("Tab");
  await page.keyboard.type("saltmarsh-demo-2026");
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/pack\/kit-orders$/);
});

test("a page without the right says who can", async ({ page }) => {
  await page.goto("/sign-in");
  await page.getByRole("button", { name: /^Wren Adlington/ }).click();
  await page.waitForURL(/\/check/);
  await page.goto("/pack/kit-orders/new");
  await expect(page.getByRole("heading", { name: "Not among your rights" })).toBeVisible();
  await expect(
    page.getByText("This is for the planner or manager. You are here as stock clerk."),
  ).toBeVisible();
});

test("an address where nothing is leads back to the start", async ({ page }) => {
  await page.goto("/no/such/place");
  await expect(page.getByRole("heading", { name: "Not here" })).toBeVisible();
  await page.getByRole("link", { name: "To the start" }).click();
  await expect(page).toHaveURL(/\/sign-in$/);
});
