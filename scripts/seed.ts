import { closeDatabase } from "~/db/client.server";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { seedDemo } from "./seed/seed-demo";

function sayWhy(error: unknown): string {
  if (!(error instanceof AppError)) return error instanceof Error ? error.message : String(error);
  const places = error.errors
    .slice(0, 10)
    .map(({ line, column, message }) => `  ${line ?? ""} ${column ?? ""} ${message}`);
  return [error.message, ...places].join("\n");
}

try {
  const begun = Date.now();
  const seeded = await seedDemo({
    folder: "data/demo",
    today: today(),
    say: (sentence) => console.log(`${((Date.now() - begun) / 1000).toFixed(1).padStart(6)} s  ${sentence}`),
  });
  console.log(seeded ? "The demo firm is in." : "There are people or parts already; nothing was changed.");
} catch (error) {
  console.error(`The demo firm could not be put in: ${sayWhy(error)}`);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
