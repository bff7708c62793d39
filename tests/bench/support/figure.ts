import { writeFileSync } from "node:fs";

/** One line of the table. */
export interface Figure {
  name: string;
  value: number;
  unit: string;
  /** What the figure has to be, where that is laid down. */
  target?: { least: number } | { most: number };
  note?: string;
}

/** Hands the figures to `npm run bench`, or prints them where a measurement is run by itself. */
export function report(figures: Figure[]): void {
  const file = process.env.BENCH_FIGURES;
  if (file) writeFileSync(file, JSON.stringify(figures));
  else console.log(JSON.stringify(figures, null, 2));
}
