import { type Figure, report } from "./support/figure";
import { withServedDemo } from "./support/served-demo";
import { signIn } from "./support/sign-in";

const TIMES = 60;

/** What forms ask as one types, each time with another figure, so that no answer can be a kept one. */
const forms: [string, (figure: number) => object][] = [
  [
    "a kit order",
    (figure) => ({ kitOrders: { add: [{ kit: "S2", options: ["HEATER"], priority: figure }] } }),
  ],
  ["a stock posting", (figure) => ({ stock: [{ partNumber: "HB-2041", change: `+${figure}` }] })],
  [
    "an open order entered",
    (figure) => ({ supply: { add: [{ partNumber: "HB-2041", quantity: String(figure) }] } }),
  ],
  ["a lead time", (figure) => ({ parts: [{ part_number: "HB-2041", lead_time_days: String(figure) }] })],
];

/** The time from asking what an act does to the ship line to the whole answer, on the served demo. */
await withServedDemo(async (url) => {
  const headers = { Cookie: await signIn(url), Origin: url, "Content-Type": "application/json" };
  const ask = async (change: object): Promise<number> => {
    const begin = performance.now();
    const answer = await fetch(`${url}/api/effects`, {
      method: "POST",
      headers,
      body: JSON.stringify({ change }),
    });
    await answer.json();
    if (!answer.ok) throw new Error(`The effect was refused: ${answer.status}.`);
    return performance.now() - begin;
  };
  const figures: Figure[] = [];
  for (const [name, change] of forms) {
    const times: number[] = [];
    for (let figure = 1; figure <= TIMES; figure++) times.push(await ask(change(figure)));
    times.sort((a, b) => a - b);
    figures.push({
      name: `Effect of ${name}, half of ${TIMES} answers within`,
      value: times[TIMES / 2],
      unit: "ms",
      target: { most: 100 },
      note: `the fastest ${times[0].toFixed(1)} ms, nine of ten within ${times[Math.floor(TIMES * 0.9)].toFixed(1)} ms`,
    });
  }
  report(figures);
});
