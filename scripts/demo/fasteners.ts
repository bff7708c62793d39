import type { BookPart } from "./book";

const GRADES: Record<string, { name: string; price: number }> = {
  Z: { name: "8.8 zinc", price: 1 },
  A2: { name: "A2 stainless", price: 1.7 },
  A4: { name: "A4 stainless", price: 2.4 },
};
const SCREWS: Record<string, string> = {
  B: "Bolt, hexagon",
  C: "Screw, socket cap",
  D: "Screw, socket button",
  E: "Screw, socket countersunk",
  G: "Screw, grub, cup point",
  S: "Stud",
};
const RINGS: Record<string, { name: string; volume: number }> = {
  N: { name: "Nut, nylon insert", volume: 1.05 },
  P: { name: "Nut, plain", volume: 0.85 },
  F: { name: "Nut, flanged, serrated", volume: 1.3 },
  W: { name: "Washer, plain, form A", volume: 0.3 },
  X: { name: "Washer, penny", volume: 0.75 },
  Q: { name: "Washer, spring", volume: 0.22 },
};
const RIVET_METALS: Record<string, { name: string; price: number; density: number }> = {
  AL: { name: "aluminium", price: 1, density: 2.7 },
  ST: { name: "stainless", price: 2.6, density: 7.9 },
  MO: { name: "nickel-copper", price: 5.2, density: 8.8 },
};
const STEEL_KG_PER_MM3 = 7.85e-6;

type Fastener = Partial<BookPart> & Pick<BookPart, "partNumber" | "description" | "sourcing">;

/** Reads a number of the house's fastener family: `FB-8X25-A4` is an M8 x 25 hexagon bolt in A4. Null for any other number. */
export function describeFastener(partNumber: string): Fastener | null {
  return (
    describeScrew(partNumber) ??
    describeRing(partNumber) ??
    describeRivet(partNumber) ??
    describePin(partNumber) ??
    describeClip(partNumber)
  );
}

function describeScrew(partNumber: string): Fastener | null {
  const match = /^F([BCDEGS])-(\d+)X(\d+)-(Z|A2|A4)$/.exec(partNumber);
  if (!match) return null;
  const [, kind, thread, length, grade] = match;
  const diameter = Number(thread);
  const head = kind === "G" || kind === "S" ? 0 : diameter * 1.8;
  const mass = 0.785 * diameter * diameter * (Number(length) + head) * STEEL_KG_PER_MM3;
  const name = kind === "B" && Number(length) <= 25 ? "Screw, hexagon" : SCREWS[kind];
  return bought(
    partNumber,
    `${name}, M${thread} x ${length}, ${GRADES[grade].name}`,
    mass,
    0.04 + mass * 5.5 * GRADES[grade].price,
  );
}

function describeRing(partNumber: string): Fastener | null {
  const match = /^F([NPFWXQ])-(\d+)-(Z|A2|A4)$/.exec(partNumber);
  if (!match) return null;
  const [, kind, thread, grade] = match;
  const mass = Number(thread) ** 3 * RINGS[kind].volume * 1.3 * STEEL_KG_PER_MM3;
  return bought(
    partNumber,
    `${RINGS[kind].name}, M${thread}, ${grade === "Z" ? "zinc" : GRADES[grade].name}`,
    mass,
    0.012 + mass * 6 * GRADES[grade].price,
  );
}

function describeRivet(partNumber: string): Fastener | null {
  const match = /^F([RI])-([\d.]+)(?:X(\d+))?-(AL|ST|MO)$/.exec(partNumber);
  if (!match) return null;
  const [, kind, size, grip, metalCode] = match;
  const metal = RIVET_METALS[metalCode];
  const length = grip ? Number(grip) : Number(size) * 2.5;
  const mass = 0.785 * Number(size) ** 2 * length * metal.density * 1.25e-6;
  const name =
    kind === "R" ? `Rivet, blind, ${size} x ${grip}, ${metal.name}` : `Nut, rivet, M${size}, ${metal.name}`;
  return bought(partNumber, name, mass, (kind === "R" ? 0.025 : 0.11) * metal.price + mass * 3);
}

function describePin(partNumber: string): Fastener | null {
  const match = /^F([KLT])-([\d.]+)X(\d+)(?:-(Z|A2|A4))?$/.exec(partNumber);
  if (!match) return null;
  const [, kind, size, length, grade] = match;
  const mass = 0.785 * Number(size) ** 2 * Number(length) * STEEL_KG_PER_MM3;
  const metal = grade === "Z" ? "zinc" : GRADES[grade ?? "A2"].name;
  const names: Record<string, string> = {
    K: "Pin, cotter",
    L: "Pin, clevis",
    T: grade === "Z" ? "Screw, wood, countersunk" : "Screw, self-tapping, pan",
  };
  const base = kind === "L" ? 0.34 : 0.03;
  return bought(partNumber, `${names[kind]}, ${size} x ${length}, ${metal}`, mass, base + mass * 9);
}

function describeClip(partNumber: string): Fastener | null {
  const match = /^(HC|CE|CI|FH)-R?(\d+)$/.exec(partNumber);
  if (!match) return null;
  const size = Number(match[2]);
  if (match[1] === "HC")
    return bought(
      partNumber,
      `Clip, hose, worm drive, ${Math.round(size * 0.65)}-${size} mm, stainless`,
      0.008 + size * 0.0003,
      0.38 + size * 0.009,
    );
  if (match[1] === "FH")
    return bought(
      partNumber,
      `Clip, R, for ${size === 2 ? "6 to 9" : "9 to 14"} mm pin, stainless`,
      0.004,
      0.21,
    );
  const where = match[1] === "CE" ? "external" : "internal";
  return bought(partNumber, `Circlip, ${where}, ${size} mm`, size * 0.00012, 0.09 + size * 0.006);
}

function bought(partNumber: string, description: string, mass: number, cost: number): Fastener {
  return {
    partNumber,
    description,
    sourcing: "buy",
    trade: "fast",
    leadTimeDays: 10,
    mass: Math.max(0.0002, Number(mass.toFixed(4))),
    cost: Number(cost.toFixed(3)),
  };
}
