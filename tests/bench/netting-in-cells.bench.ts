import { HyperFormula } from "hyperformula";
import { bestTime, bestTimeEach } from "./support/best-time";
import { demoNetting, expectSameNet } from "./support/demo-netting";
import { report } from "./support/figure";

/** The netting of ten S2 by the core against the same netting as cells of a spreadsheet, after the kit count changed. */
const { kit, parts, lines, pass } = demoNetting();
const row = new Map(parts.map(({ part }, at) => [part, at + 1]));
const uses = new Map<number, string[]>(parts.map(({ part }) => [part, []]));
for (const { parent, component, num, den } of lines) {
  const begin = `D${row.get(parent)}`;
  const need = den === 1 ? `${begin}*${num}` : `CEILING(${begin}*${num}/${den},1)`;
  uses.get(component)?.push(need);
}

// Columns: gross need, stock, net need, started. The kit count stands in F1.
const sheet = parts.map(({ part, stock, isLeaf, yieldNum, yieldDen }, at) => {
  const r = at + 1;
  const asked = [...(part === kit ? ["F1"] : []), ...(uses.get(part) ?? [])];
  const started = yieldDen === 1 ? `C${r}` : `CEILING(C${r}*${yieldNum}/${yieldDen},1)`;
  const cells = [`=${inSums(asked)}`, stock, `=MAX(A${r}-B${r},0)`, isLeaf ? 0 : `=${started}`];
  return r === 1 ? [...cells, null, 1] : cells;
});
const cells = HyperFormula.buildFromArray(sheet, { licenseKey: "gpl-v3", precisionRounding: 10 });
const count = { sheet: 0, row: 0, col: 5 };
let other = 10;
const change = (kits: number) => cells.setCellContents(count, [[kits]]);
change(10);
const net = new Map(
  parts.map(({ part }, at) => [part, Number(cells.getCellValue({ sheet: 0, row: at, col: 2 }))]),
);
expectSameNet("Cells", net, pass.run(10).net);
const inCells = bestTime(20, () => {
  other = 19 - other;
  change(other);
});
const inCore = bestTimeEach(100, 20, (run) => pass.run(9 + (run % 2)));
report([
  {
    name: "S2 at 10 kits: one netting pass",
    value: inCore * 1000,
    unit: "µs",
    note: `${parts.length} parts, ${lines.length} lines`,
  },
  { name: "S2 at 10 kits: the same as cells of a spreadsheet engine", value: inCells, unit: "ms" },
  {
    name: "S2 at 10 kits: cells against the core",
    value: inCells / inCore,
    unit: "times",
    target: { least: 300 },
  },
]);

/** A sum that no parser has to nest deeply. */
function inSums(terms: string[]): string {
  const sums: string[] = [];
  for (let at = 0; at < terms.length; at += 100) sums.push(`SUM(${terms.slice(at, at + 100).join(",")})`);
  return sums.length === 0 ? "0" : sums.join("+");
}
