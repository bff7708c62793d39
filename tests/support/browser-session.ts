import { expect, type Page } from "@playwright/test";

const PASSWORD = "saltmarsh-demo-2026";

/** Signs in as one of the demo firm's people and waits for the page they land on. */
export async function signInAs(page: Page, firstName: string): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(`${firstName}@saltmarsh.example`);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await page.waitForURL(/\/(check|pack)/);
}

/** Collects what must never be: errors in the console, refusals by the page's policy, failures of scripts. */
export function watchForFaults(page: Page): { expectNone(): void } {
  const faults: string[] = [];
  page.on("pageerror", (error) => faults.push(String(error)));
  page.on("console", (message) => {
    const isExpected = /status of 4(09|22)/.test(message.text());
    if (message.type() === "error" && !isExpected) faults.push(message.text());
  });
  return { expectNone: () => expect(faults).toEqual([]) };
}

/** Opens a page and waits until its script answers: the ship line has heard from the server. */
export async function openPage(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole("region", { name: "Ship line" })).toContainText("ready", { timeout: 20_000 });
}
