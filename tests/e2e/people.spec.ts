import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

// So tall that nothing lies half behind the ship line, from where one could scroll it.
const viewport = { width: 1280, height: 4000 };
test.use({ viewport });

const RULES = ["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"];

async function expectNothingInTheWay(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
  const found = violations.map((one) => `${one.id}: ${one.nodes.map(({ html }) => html).join(" | ")}`);
  expect.soft(found, page.url()).toEqual([]);
}

/** Opens the newest mail to the address and gives its link: the worker catches it within two seconds. */
async function linkFromMail(page: Page, email: string): Promise<string> {
  await page.goto("/admin/mail");
  const mail = page.getByRole("listitem").filter({ hasText: email }).first();
  await expect(mail).toBeVisible();
  await mail.getByRole("link").click();
  const link = page.getByRole("link", { name: /\/(welcome|new-password)\// });
  await expect(link).toBeVisible();
  const { pathname } = new URL((await link.getAttribute("href")) ?? "");
  return pathname;
}

test("the manager invites somebody, who comes in, forgets the password, and is kept out", async ({
  page,
  browser,
}) => {
  test.slow();
  const faults = watchForFaults(page);
  const email = `bryn.${Date.now().toString(36)}@saltmarsh.example`;
  await signInAs(page, "greta");
  await openPage(page, "/pack/kit-orders");
  await page.getByText("Greta Lindqvist").first().click();
  await page.getByRole("link", { name: "People", exact: true }).click();
  await expect(page.getByRole("heading", { name: "People", level: 1 })).toBeVisible();
  await expectNothingInTheWay(page);

  await page.getByLabel("Name").fill("Bryn Hale");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByText("Give at least one role.")).toBeVisible();
  await expect(page.getByLabel("E-mail address")).toHaveValue(email);
  await page.getByLabel("stock clerk").check();
  await page.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByRole("status")).toContainText("invitation is in the outbox");
  const row = page.getByRole("row").filter({ hasText: email });
  await expect(row).toContainText("has not accepted yet");

  const theirs = await browser.newContext({ viewport });
  const bryn = await theirs.newPage();
  const welcome = await linkFromMail(page, email);
  await expectNothingInTheWay(page);
  await bryn.goto(welcome);
  await expectNothingInTheWay(bryn);
  await bryn.getByLabel("Your name").fill("Bryn Hale-Moor");
  await bryn.getByLabel("Password").fill("wide water, slow boat");
  await bryn.getByRole("button", { name: "Set the password and come in" }).click();
  await bryn.waitForURL(/\/check/);
  await expect(bryn.getByText("Bryn Hale-Moor").first()).toBeAttached();
  await bryn.goto("/admin/people");
  await expect(bryn.getByRole("heading", { name: "Not among your rights" })).toBeVisible();

  // The link has been used up.
  const stranger = await (await browser.newContext({ viewport })).newPage();
  await stranger.goto(welcome);
  await expect(stranger.getByRole("heading", { name: "does not work any more" })).toBeVisible();

  await stranger.goto("/sign-in");
  await stranger.getByRole("link", { name: "Forgotten your password?" }).click();
  await expectNothingInTheWay(stranger);
  await stranger.getByLabel("E-mail address").fill(email);
  await stranger.getByRole("button", { name: "Send the link" }).click();
  await expect(stranger.getByRole("status")).toContainText("on its way");
  await stranger.goto(await linkFromMail(page, email));
  await stranger.getByRole("textbox", { name: "New password" }).fill("slow boat, wide water");
  await stranger.getByRole("button", { name: "Set the new password" }).click();
  await expect(stranger.getByRole("status")).toContainText("new password is set");
  await bryn.goto("/check");
  await expect(bryn).toHaveURL(/sign-in/);
  await stranger.getByLabel("E-mail address").fill(email);
  await stranger.getByLabel("Password").fill("slow boat, wide water");
  await stranger.getByRole("button", { name: "Sign in", exact: true }).click();
  await stranger.waitForURL(/\/check/);

  await page.goto("/admin/people");
  await page.getByRole("row").filter({ hasText: email }).getByRole("link").click();
  await expect(page.getByRole("button", { name: /End the session/ })).toBeVisible();
  await expectNothingInTheWay(page);
  await page.getByRole("button", { name: "Keep this person out" }).click();
  await expect(page.getByRole("status")).toContainText("kept out");
  await stranger.goto("/check");
  await expect(stranger).toHaveURL(/sign-in/);

  await page.getByRole("link", { name: "What was changed about this person" }).click();
  const events = page.getByRole("list", { name: "Events" }).getByRole("listitem");
  await expect(events.filter({ hasText: "sessions ended" }).first()).toContainText("Greta Lindqvist");
  await expectNothingInTheWay(page);
  faults.expectNone();
});

test("the last manager stays", async ({ page }) => {
  await signInAs(page, "greta");
  await page.goto("/admin/people");
  await page.getByRole("link", { name: "Greta Lindqvist" }).click();
  await page.getByRole("button", { name: "Keep this person out" }).click();
  await expect(page.getByRole("alert")).toContainText("Nobody would be left to manage the shop");
});

test("the audit is searched and taken out", async ({ page }) => {
  await signInAs(page, "greta");
  await page.goto("/admin/audit?act=people");
  const events = page.getByRole("list", { name: "Events" }).getByRole("listitem");
  await expect(events.first()).toContainText("people");
  const download = page.waitForEvent("download");
  await page.getByRole("link", { name: "Take out as CSV" }).click();
  expect((await download).suggestedFilename()).toBe("audit.csv");
  await page.getByLabel("Done to").fill("no such thing");
  await page.getByRole("button", { name: "Search" }).click();
  await expect(page.getByText("Nothing was done that this search finds")).toBeVisible();
});
