import { chromium, type Page } from "@playwright/test";
import { signInAs } from "../support/browser-session";
import { type Figure, report } from "./support/figure";
import { withServedDemo } from "./support/served-demo";

const PAGES = ["/sign-in", "/check", "/check?kit=S2&quantity=10", "/pack/kit-orders"];

/** What each page loads the first time it is opened, and when Check has painted its largest part. */
await withServedDemo(async (url) => {
  const browser = await chromium.launch({
    executablePath: process.env.COTTERPIN_CHROMIUM || "/usr/bin/chromium",
    args: process.getuid?.() === 0 ? ["--no-sandbox"] : [],
  });
  try {
    const figures: Figure[] = [];
    for (const address of PAGES) {
      const context = await browser.newContext({ baseURL: url, viewport: { width: 1280, height: 800 } });
      const page = await context.newPage();
      if (address !== "/sign-in") await signInAs(page, "greta");
      const first = await openAfresh(page, address);
      figures.push(
        { name: `${address}: script, gzipped`, value: first.script, unit: "kB", target: { most: 150 } },
        { name: `${address}: fonts`, value: first.font, unit: "kB" },
        { name: `${address}: first paint`, value: first.firstPaint, unit: "ms" },
        {
          name: `${address}: largest paint`,
          value: first.largestPaint,
          unit: "ms",
          ...(address.startsWith("/check") ? { target: { most: 1000 } } : {}),
        },
      );
      await context.close();
    }
    report(figures);
  } finally {
    await browser.close();
  }
});

/** Opens the page with an empty cache; sizes are what came over the wire. */
async function openAfresh(page: Page, address: string) {
  const network = await page.context().newCDPSession(page);
  await network.send("Network.enable");
  await network.send("Network.clearBrowserCache");
  const kinds = new Map<string, string>();
  const bytes = { script: 0, font: 0 };
  network.on("Network.responseReceived", ({ requestId, type }) => kinds.set(requestId, type.toLowerCase()));
  network.on("Network.loadingFinished", ({ requestId, encodedDataLength }) => {
    const kind = kinds.get(requestId);
    if (kind === "script" || kind === "font") bytes[kind] += encodedDataLength;
  });
  await page.goto(address, { waitUntil: "networkidle" });
  const paints = await page.evaluate(readPaints);
  return { script: bytes.script / 1000, font: bytes.font / 1000, ...paints };
}

/** Runs in the page. */
async function readPaints(): Promise<{ firstPaint: number; largestPaint: number }> {
  const largestPaint = await new Promise<number>((resolve) => {
    const observer = new PerformanceObserver((list) => resolve(list.getEntries().at(-1)?.startTime ?? 0));
    observer.observe({ type: "largest-contentful-paint", buffered: true });
  });
  const firstPaint = performance.getEntriesByName("first-contentful-paint")[0]?.startTime ?? 0;
  return { firstPaint, largestPaint };
}
