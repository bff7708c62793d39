import type { ShipCheck, WarningCode } from "~/domain/planning/types";
import { layOutTable } from "./lay-out-table";

type Demand = ShipCheck["demand"][number];

const warningWords: Record<WarningCode, string> = {
  "as-required-none-on-hand": "taken as required, and none is on hand",
  "make-without-structure": "is made here but has no structure lines, so that it counts as missing itself",
  "overdue-supply": "has an overdue order, which counts from today plus the lead time",
  "supply-without-date": "has an open order without a date",
};

const whyWords = { build: "built here", buy: "to be bought", "on-order": "on order", stock: "in stock" };

function sayDemand({ partNumber, quantity, due, options, serial, buildable, earliest }: Demand): string {
  const kit = [partNumber, ...options].join(" + ") + (serial === null ? "" : ` from serial ${serial}`);
  const wanted = due === null ? "" : `, wanted on ${due}`;
  if (buildable === null || buildable >= Number(quantity))
    return `All ${quantity} ${kit} can be made from what is on hand${wanted}.`;
  return `${buildable} of ${quantity} ${kit} can be made from what is on hand, all ${quantity} by ${earliest}${wanted}.`;
}

const dash = (text: string | null) => text ?? "-";

/** The answer as plain text: sentence, ladder, shortages, builds, critical chain, debts, warnings. */
export function formatTable(answer: ShipCheck): string {
  const lines = [
    `Today is ${answer.today}.`,
    ...answer.demand.map(sayDemand),
    ...layOutTable("Ladder", answer.ladder, [
      { head: "kits", cell: (rung) => String(rung.kits), right: true },
      { head: "kit", cell: (rung) => rung.partNumber },
      { head: "ready on", cell: (rung) => rung.readyOn },
      { head: "cost", cell: (rung) => rung.cost ?? "", right: true },
      {
        head: "stopped by",
        cell: (rung) => rung.stoppers.map((one) => `${one.partNumber} ${one.missing}`).join(", "),
      },
    ]),
    ...layOutTable("Shortages", answer.shortages, [
      { head: "part", cell: (part) => part.partNumber },
      { head: "missing", cell: (part) => part.missing, right: true },
      { head: "unit", cell: (part) => part.unit },
      { head: "gross", cell: (part) => part.gross, right: true },
      { head: "from stock", cell: (part) => part.fromStock, right: true },
      { head: "on order", cell: (part) => part.onOrder, right: true },
      { head: "short", cell: (part) => part.short, right: true },
      { head: "stops kit", cell: (part) => String(part.stopsAt), right: true },
      { head: "need by", cell: (part) => dash(part.needBy) },
      { head: "order by", cell: (part) => dash(part.orderBy) },
      { head: "ready on", cell: (part) => part.readyOn },
    ]),
    ...layOutTable("Builds to start", answer.builds, [
      { head: "part", cell: (part) => part.partNumber },
      { head: "build", cell: (part) => part.build, right: true },
      { head: "unit", cell: (part) => part.unit },
      { head: "gross", cell: (part) => part.gross, right: true },
      { head: "from stock", cell: (part) => part.fromStock, right: true },
      { head: "on order", cell: (part) => part.onOrder, right: true },
    ]),
    ...layOutTable("Critical chain", answer.criticalChain, [
      { head: "part", cell: (link) => link.partNumber },
      { head: "why", cell: (link) => whyWords[link.why] },
      { head: "ready on", cell: (link) => link.readyOn },
    ]),
    ...layOutTable("Owed to earlier demands", answer.debts ?? [], [
      { head: "part", cell: (debt) => debt.partNumber },
      { head: "quantity", cell: (debt) => debt.quantity, right: true },
      { head: "taken by demand", cell: (debt) => String(debt.from), right: true },
      { head: "owed to demand", cell: (debt) => String(debt.to), right: true },
    ]),
    ...layOutTable("Warnings", answer.warnings, [
      { head: "part", cell: (warning) => warning.partNumber },
      { head: "what", cell: (warning) => warningWords[warning.code] },
    ]),
  ];
  return `${lines.join("\n")}\n`;
}
