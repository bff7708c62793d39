import type {
  IsoDate,
  PlanDemand,
  PlanLine,
  PlanPart,
  PlanStock,
  PlanSupply,
  Sharing,
} from "~/domain/planning/types";

/** Everything that a ship check is asked with, flat. */
export interface Shop {
  parts: PlanPart[];
  lines: PlanLine[];
  stock: PlanStock[];
  supply: PlanSupply[];
  demand: PlanDemand[];
  sharing: Sharing;
  today: IsoDate;
}

export const TODAY = "2026-12-01";

/** A bought part counted in pieces, unless told otherwise. */
export function buildPart(overrides: Partial<PlanPart> & { partNumber: string }): PlanPart {
  return {
    sourcing: "buy",
    unit: "EA",
    decimals: 0,
    leadTimeDays: 0,
    yield: "1",
    unitCost: null,
    massKg: null,
    ...overrides,
  };
}

/** One of the component per parent, always effective, unless told otherwise. */
export function buildLine(overrides: Partial<PlanLine> & { parent: string; component: string }): PlanLine {
  return {
    quantity: "1",
    scrap: "0",
    option: null,
    fromSerial: null,
    toSerial: null,
    fromDate: null,
    toDate: null,
    ...overrides,
  };
}

export function buildStock(partNumber: string, quantity: string, rest: Partial<PlanStock> = {}): PlanStock {
  return { partNumber, quantity, expiresOn: null, ...rest };
}

export function buildSupply(partNumber: string, quantity: string, due: IsoDate | null): PlanSupply {
  return { partNumber, quantity, due, reference: null };
}

export function buildDemand(
  partNumber: string,
  quantity: string,
  rest: Partial<PlanDemand> = {},
): PlanDemand {
  return { partNumber, quantity, due: null, options: [], serial: null, ...rest };
}

/**
 * A shop from a short text: `kit = 1 clutch + 2 bolt` a line. What stands on the left is made, the rest
 * is bought; `parts` overrides by part number.
 */
export function buildShop(
  structure: string,
  rest: Partial<Omit<Shop, "parts" | "lines">> & { parts?: Record<string, Partial<PlanPart>> } = {},
): Shop {
  const lines = structure
    .split("\n")
    .filter((text) => text.trim() !== "")
    .flatMap((text) => {
      const [parent, components] = text.split("=").map((side) => side.trim());
      return components.split("+").map((text) => {
        const [quantity, component] = text.trim().split(/\s+/);
        return buildLine({ parent, component, quantity });
      });
    });
  const made = new Set(lines.map((line) => line.parent));
  const names = new Set([
    ...made,
    ...lines.map((line) => line.component),
    ...Object.keys(rest.parts ?? {}),
    ...(rest.demand ?? []).map((demand) => demand.partNumber),
  ]);
  const { parts: overrides = {}, ...shop } = rest;
  const parts = [...names].map((partNumber) =>
    buildPart({ partNumber, sourcing: made.has(partNumber) ? "make" : "buy", ...overrides[partNumber] }),
  );
  return { parts, lines, stock: [], supply: [], demand: [], sharing: "strict", today: TODAY, ...shop };
}
