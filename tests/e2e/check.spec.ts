import { expect, test } from "@playwright/test";
import { openPage, signInAs, watchForFaults } from "../support/browser-session";

test("the planner asks whether ten S2 can ship and reads the answer", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  const answer = page.getByRole("status").first();
  await expect(answer).toContainText(/Seven can be made from what is here, by .+\. The eighth waits for/);
  await expect(answer).toContainText(/All ten by \d+ \w+( \d{4})?, for [\d,]+\.\d\d more in parts\./);

  const ladder = page.getByRole("table", { name: "The ladder" });
  await expect(ladder.getByRole("row")).toHaveCount(11);
  await expect(ladder.getByRole("rowheader")).toHaveText(["10", "9", "8", "7", "6", "5", "4", "3", "2", "1"]);

  const stoppers = page.getByRole("table", { name: "What stops them" });
  expect(await stoppers.getByRole("row").count()).toBeGreaterThanOrEqual(13);
  await expect(stoppers.getByRole("columnheader", { name: "Cost" })).toBeVisible();
  await expect(page.getByRole("heading", { name: "What sets the date" })).toBeVisible();
  faults.expectNone();
});

test("another number answers as one types, and the address follows", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  const kits = page.getByRole("spinbutton", { name: "How many kits" });
  await kits.fill("7");
  await expect(page.getByRole("status").first()).toContainText("All seven can be made from what is here");
  await expect(page).toHaveURL(/quantity=7/);
  await kits.fill("300");
  await expect(page.getByRole("rowheader", { name: "1–7" })).toBeVisible();
  await kits.fill("0");
  await expect(page.getByRole("alert")).toHaveText("A whole number of kits from 1 to 1,000.");
  await expect(page).toHaveURL(/quantity=300/);
  await page.getByRole("combobox", { name: "Which kit" }).selectOption("S4");
  await expect(page).toHaveURL(/kit=S4/);
  await page.reload();
  await expect(page.getByRole("combobox", { name: "Which kit" })).toHaveValue("S4");
  faults.expectNone();
});

test("a rung opens to all that it hangs on", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  const top = page.getByRole("table", { name: "The ladder" }).getByRole("row").nth(1);
  const before = await top.getByRole("listitem").count();
  const more = top.getByRole("button", { name: /below|more/ });
  await more.click();
  expect(await top.getByRole("listitem").count()).toBeGreaterThan(before);
  await top.getByRole("button", { name: "fewer" }).click();
  await expect(top.getByRole("listitem")).toHaveCount(before);
});

test("with the keyboard alone: number, kit, date, options, ship line", async ({ page }) => {
  const faults = watchForFaults(page);
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  await expect(page.getByRole("region", { name: "Ship line" })).toContainText("ready");
  await page.keyboard.press("Tab");
  await expect(page.getByRole("link", { name: "Skip to the page" })).toBeFocused();
  await page.keyboard.press("Enter");
  await page.keyboard.press("Tab");
  await expect(page.getByRole("spinbutton", { name: "How many kits" })).toBeFocused();
  await page.keyboard.type("9");
  await expect(page).toHaveURL(/quantity=9(&|$)/);
  await page.keyboard.press("ArrowDown");
  await expect(page).toHaveURL(/quantity=8/);
  await page.keyboard.press("Tab");
  await expect(page.getByRole("combobox", { name: "Which kit" })).toBeFocused();
  await page.keyboard.press("Tab");
  const date = page.getByLabel("By which date, empty for any");
  await expect(date).toBeFocused();
  await date.fill("2029-12-31");
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/by=2029-12-31/);
  await page.getByRole("button", { name: "Any date" }).press("Enter");
  await expect(page).not.toHaveURL(/by=/);

  const why = page.getByRole("region", { name: "Ship line" }).getByText("why");
  await page.getByRole("region", { name: "Ship line" }).locator("summary").press("Enter");
  await expect(page.getByRole("link", { name: "Kit orders, first to last" })).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(why).toBeVisible();
  faults.expectNone();
});

test("options count in the answer and in the address", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  await page.getByText("no options").click();
  const first = page.getByRole("group", { name: "Options of the kit" }).getByRole("checkbox").first();
  await first.check();
  await expect(page).toHaveURL(/options=\w+/);
  await page.reload();
  await expect(page.getByText("no options")).toHaveCount(0);
});

test("an unknown kit is said in a sentence, and the question can be mended", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=NO-SUCH-KIT&quantity=2");
  await expect(page.getByRole("status").first()).toContainText("NO-SUCH-KIT");
  await page.getByRole("combobox", { name: "Which kit" }).selectOption("S2");
  await expect(page.getByRole("status").first()).toContainText("Both can be made from what is here");
});

test("when the server does not answer, the last answer stays and the page says so", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/check?kit=S2&quantity=10");
  await page.route("**/api/check-answer*", (route) =>
    route.fulfill({
      status: 503,
      contentType: "application/problem+json",
      body: JSON.stringify({ detail: "The database does not answer just now." }),
    }),
  );
  await page.getByRole("spinbutton", { name: "How many kits" }).fill("4");
  await expect(page.getByRole("alert")).toContainText("The database does not answer just now.");
  await expect(page.getByRole("status").first()).toContainText("Seven can be made from what is here");
});

test("the clerk reads the same answer without money", async ({ page }) => {
  await signInAs(page, "wren");
  await openPage(page, "/check?kit=S2&quantity=10");
  await expect(page.getByRole("status").first()).toContainText("Seven can be made from what is here");
  await expect(page.getByRole("columnheader", { name: "Cost" })).toHaveCount(0);
  await expect(page.getByText("in parts")).toHaveCount(0);
});

test("light or dark stays as chosen", async ({ page }) => {
  await signInAs(page, "idris");
  await openPage(page, "/check");
  await page.getByText("Idris Fenwick").first().click();
  await page.getByRole("radio", { name: "Dark" }).check();
  await page.reload();
  await expect(page.locator("html")).toHaveAttribute("data-theme", "dark");
});

test.describe("no page is wider than its screen", () => {
  for (const width of [360, 768, 1024, 1376, 1920]) {
    test(`at ${width} pixels`, async ({ page }) => {
      test.slow();
      await page.setViewportSize({ width, height: 800 });
      await signInAs(page, "idris");
      for (const path of [
        "/check?kit=S2&quantity=10",
        "/check?kit=S2&quantity=400",
        "/pack/kit-orders",
        "/pack/kit-orders/new",
      ]) {
        await openPage(page, path);
        expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
      }
    });
  }
});

test("Check costs at most 150 kB of script", async ({ page }) => {
  await signInAs(page, "idris");
  const client = await page.context().newCDPSession(page);
  await client.send("Network.enable");
  await client.send("Network.setCacheDisabled", { cacheDisabled: true });
  const scripts = new Set<string>();
  let bytes = 0;
  client.on("Network.responseReceived", ({ requestId, type }) => {
    if (type === "Script") scripts.add(requestId);
  });
  client.on("Network.loadingFinished", ({ requestId, encodedDataLength }) => {
    if (scripts.has(requestId)) bytes += encodedDataLength;
  });
  await openPage(page, "/check");
  expect(bytes).toBeGreaterThan(50_000);
  expect(bytes).toBeLessThan(150_000);
});
