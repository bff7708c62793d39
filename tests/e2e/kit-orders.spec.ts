import { expect, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

/** A serial that no other run of these tests has used. */
const serial = () => `T${Date.now()}`;

test("the planner enters, changes and cancels a kit order", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await page.getByRole("link", { name: "Pack" }).click();
  await page.getByRole("link", { name: "Enter a kit order" }).click();
  const chosen = serial();
  await page.getByLabel("Kit", { exact: true }).selectOption("S4");
  await page.getByLabel("Customer").fill("Ferry Trust of Lowmere");
  await page.getByLabel("Wanted on").fill("2030-05-02");
  await page.getByLabel("Priority").fill("9999");
  await page.getByLabel("Serial").fill(chosen);
  await page.getByRole("button", { name: "Enter the order" }).click();

  const said = page.getByRole("status");
  await expect(said).toContainText(/KO-\d+ is entered/);
  const number = (await said.textContent())?.match(/KO-\d+/)?.[0] ?? "";
  const row = page.getByRole("row", { name: new RegExp(number) });
  await expect(row).toContainText("2 May 2030");

  await row.getByRole("link", { name: number }).click();
  await page.getByLabel("Customer").fill("Ferry Trust of Highmere");
  await page.getByRole("button", { name: "Save the changes" }).click();
  await expect(page.getByRole("row", { name: new RegExp(number) })).toContainText("Highmere");

  await page.getByRole("link", { name: number }).click();
  await page.getByRole("link", { name: /Cancel this order/ }).click();
  await page.getByRole("button", { name: `Cancel ${number}` }).click();
  await expect(page.getByRole("status")).toContainText(`${number} is cancelled`);
  await expect(
    page.getByRole("region", { name: "Closed" }).getByRole("row", { name: new RegExp(number) }),
  ).toBeVisible();
  faults.expectNone();
});

test("what is wrong is said beside its field, and what was typed stays", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/pack/kit-orders/new");
  await page.getByLabel("Customer").fill("Ferry Trust of Lowmere");
  await page.getByLabel("Priority").fill("soon");
  const answered = page.waitForResponse((response) => response.request().method() === "POST");
  await page.getByRole("button", { name: "Enter the order" }).click();
  expect((await answered).status()).toBe(422);
  const priority = page.getByLabel("Priority");
  await expect(priority).toHaveAccessibleDescription(/Give a whole number from 1/);
  await expect(priority).toBeFocused();
  await expect(priority).toHaveValue("soon");
  await expect(page.getByLabel("Customer")).toHaveValue("Ferry Trust of Lowmere");
});

test("nobody writes over somebody else's change", async ({ page, context }) => {
  await signInAs(page, "idris");
  await openPage(page, "/pack/kit-orders/new");
  await page.getByLabel("Customer").fill("First");
  await page.getByLabel("Priority").fill("9998");
  await page.getByRole("button", { name: "Enter the order" }).click();
  const number = (await page.getByRole("status").textContent())?.match(/KO-\d+/)?.[0] ?? "";
  await page.getByRole("link", { name: number }).click();
  await expect(page.getByLabel("Customer")).toHaveValue("First");

  const other = await context.newPage();
  await other.goto(`/pack/kit-orders/${number}`);
  await other.getByLabel("Customer").fill("Second");
  await other.getByRole("button", { name: "Save the changes" }).click();
  await expect(other.getByRole("status")).toContainText("is changed");

  await page.getByLabel("Customer").fill("Third");
  await page.getByRole("button", { name: "Save the changes" }).click();
  await expect(page.getByRole("alert")).toContainText("Nothing of yours was saved");
  await expect(page.getByLabel("Customer")).toHaveValue("Third");
  await page.getByRole("link", { name: "Load the order again" }).click();
  await expect(page.getByLabel("Customer")).toHaveValue("Second");

  await page.getByRole("link", { name: /Cancel this order/ }).click();
  await page.getByRole("button", { name: `Cancel ${number}` }).click();
  await expect(page.getByRole("status")).toContainText("is cancelled");
});

test("the ship line asks again after an act", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/pack/kit-orders/new");
  await page.getByLabel("Priority").fill("9997");
  const asked = page.waitForResponse((response) => response.url().endsWith("/api/ship-line"));
  await page.getByRole("button", { name: "Enter the order" }).click();
  expect((await asked).ok()).toBe(true);
  const number = (await page.getByRole("status").textContent())?.match(/KO-\d+/)?.[0] ?? "";
  await page.goto(`/pack/kit-orders/${number}/cancel`);
  await page.getByRole("button", { name: `Cancel ${number}` }).click();
  await expect(page.getByRole("status")).toContainText("is cancelled");
});

test("what an order does is said before it is saved, and is so afterwards", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/pack/kit-orders/new");
  const effect = page.getByRole("group", { name: "What this does to the ship line" });
  const line = page.getByRole("region", { name: "Ship line" });
  const ready = async () => /\d+ of \d+ ready/.exec((await line.textContent()) ?? "")?.[0] ?? "";
  await expect(effect).toContainText(/\d+ of \d+ ready/);
  const height = (await effect.boundingBox())?.height;

  await page.getByLabel("Priority").fill("");
  await expect(effect).toContainText("Choose a kit and give a priority");
  await page.getByLabel("Priority").fill("1");
  await page.getByLabel("Serial").fill("blue");
  await expect(effect).toContainText("End the serial in digits");
  await page.getByLabel("Serial").fill("");
  await page.getByLabel("Wanted on").fill("2026-01-01");
  await expect(effect).toContainText(/would (be first|become ready|stop at)/);
  const told = await effect.textContent();
  const after = /(\d+ of \d+ ready)/.exec(told ?? "")?.[1];
  expect((await effect.boundingBox())?.height).toBe(height);
  await page.getByRole("button", { name: "Enter the order" }).click();
  const number = (await page.getByRole("status").textContent())?.match(/KO-\d+/)?.[0] ?? "";
  expect(told).toContain(number);
  await expect.poll(ready).toBe(after);

  await page.getByRole("link", { name: number }).click();
  await expect(effect).toContainText(`Nothing changes on the ship line: ${after}.`);
  await page.getByRole("link", { name: /Cancel this order/ }).click();
  await expect(effect).toContainText(/Ship line .*\d+ of \d+ ready/);
  const restored = /(\d+ of \d+ ready)/.exec((await effect.textContent()) ?? "")?.[1];
  await page.getByRole("button", { name: `Cancel ${number}` }).click();
  await expect(page.getByRole("status")).toContainText("is cancelled");
  await expect.poll(ready).toBe(restored);
  faults.expectNone();
});

test("the clerk may look at kit orders and not enter them", async ({ page }) => {
  await signInAs(page, "wren");
  await page.goto("/pack/kit-orders");
  await expect(page.getByRole("heading", { name: "Kit orders" })).toBeVisible();
  await expect(page.getByRole("link", { name: "Enter a kit order" })).toHaveCount(0);
  const refused = await page.goto("/pack/kit-orders/new");
  expect(refused?.status()).toBe(403);
});
