import { defineConfig, devices } from "@playwright/test";

const quiet = [
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

export default defineConfig({
  testDir: "e2e",
  testMatch: "**/*.spec.ts",
  outputDir: "../test-results",
  globalSetup: "./support/browser-global-setup.ts",
  forbidOnly: true,
  // One application, one database: the tests in a file go one after the other, and so do the files.
  workers: 1,
  timeout: 45_000,
  expect: { timeout: 10_000 },
  use: {
    ...devices["Desktop Chrome"],
    baseURL: process.env.COTTERPIN_TEST_URL,
    viewport: { width: 1280, height: 800 },
    locale: "en-GB",
    timezoneId: "Europe/London",
    trace: "off",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: process.env.COTTERPIN_CHROMIUM || "/usr/bin/chromium",
      args: process.getuid?.() === 0 ? ["--no-sandbox", ...quiet] : quiet,
      // Without scrollbars a grid clips its last column.
      ignoreDefaultArgs: ["--hide-scrollbars"],
    },
  },
});
