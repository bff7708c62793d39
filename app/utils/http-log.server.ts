import { pino } from "pino";

/** The log of the web process: one JSON line an entry on standard error, never with bodies, cookies or tokens. */
export const log = pino(
  {
    base: undefined,
    level: process.env.NODE_ENV === "test" ? "silent" : "info",
    redact: ["*.password", "*.cookie", "*.authorization", "*.token"],
  },
  pino.destination({ fd: 2, sync: false }),
);

/** What may be written down of an error: of a database's error neither message nor statement, since they hold values. */
export function describeError(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { name: typeof error };
  const frames = (error.stack ?? "").split("\n").filter((line) => line.trimStart().startsWith("at "));
  const parent = (error as { parent?: { code?: string; errno?: number } }).parent;
  const described: Record<string, unknown> = {
    name: error.name,
    frames: frames.slice(0, 12).map((line) => line.trim()),
  };
  if (error.name.startsWith("Sequelize") || error.name === "SqlError") {
    described.code = parent?.code ?? (error as { code?: string }).code;
  } else {
    described.message = error.message;
  }
  return described;
}
