import autocannon from "autocannon";
import { report } from "./support/figure";
import { withServedDemo } from "./support/served-demo";
import { signIn } from "./support/sign-in";

const CONNECTIONS = 16;
const SECONDS = 4;

/** Requests a second of the ship check against those of the health check, in turns on the same server. */
await withServedDemo(async (url) => {
  const headers = { Cookie: await signIn(url) };
  const health: number[] = [];
  const check: number[] = [];
  await ask(`${url}/api/ship-check?kit=S2&quantity=10`, headers, 1);
  for (let turn = 0; turn < 3; turn++) {
    health.push(await ask(`${url}/api/health`, headers, SECONDS));
    check.push(await ask(`${url}/api/ship-check?kit=S2&quantity=10`, headers, SECONDS));
  }
  const best = { health: Math.max(...health), check: Math.max(...check) };
  report([
    { name: "GET /api/health at 16 connections", value: best.health, unit: "a second" },
    { name: "GET /api/ship-check at 16 connections", value: best.check, unit: "a second" },
    {
      name: "Ship check against health",
      value: best.check / best.health,
      unit: "times",
      target: { least: 0.5 },
    },
  ]);
});

async function ask(url: string, headers: Record<string, string>, duration: number): Promise<number> {
  const result = await autocannon({ url, headers, connections: CONNECTIONS, duration });
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${url} did not answer every time.`);
  return result.requests.average;
}
