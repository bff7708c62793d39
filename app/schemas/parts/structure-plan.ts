import { z } from "zod";
import type { DecimalString, IsoDate, Sourcing } from "~/domain/planning/types";

const blankIsAbsent = (value: unknown) => (value === "" || value === null ? undefined : value);
const WHOLE = "Give a whole number from 1 to 1,000.";

/** `?kits=10&options=A,B`: for how many of the part its structure is shown. */
export const structurePlanQuerySchema = z.object({
  kits: z.preprocess(
    blankIsAbsent,
    z.coerce.number({ error: WHOLE }).int(WHOLE).min(1, WHOLE).max(1000, WHOLE).default(1),
  ),
  options: z.preprocess(blankIsAbsent, z.string().max(400).optional()).transform((text) =>
    (text ?? "")
      .split(",")
      .map((code) => code.trim())
      .filter((code) => code !== ""),
  ),
});

/** A part of the structure with its figures for all the kits, counted with what is here today. */
export interface StructurePart {
  partNumber: string;
  description: string;
  unit: string;
  decimals: number;
  sourcing: Sourcing;
  /** In all of the plan: `needed` = `fromStock` + what is built, passed on or missing. */
  needed: DecimalString;
  fromStock: DecimalString;
  /** Started: null for what is bought. */
  built: DecimalString | null;
  /** Null for what is built or passed on. */
  missing: DecimalString | null;
  /** Places at which it stands in the tree. */
  places: number;
}

/** A place in the tree, depth first. */
export interface StructureRow {
  /** 1 for the top. */
  level: number;
  /** Index into the parts. */
  part: number;
  /** For one of the parent: null as required, and on the top. */
  quantity: DecimalString | null;
  isAsRequired: boolean;
  scrap: DecimalString | null;
  option: string | null;
  /** What this line asks for, for all of its parent; null where the line does not count for these kits. */
  need: DecimalString | null;
  /** Its own parts are not repeated here: they stand at the row with this index. */
  at: number | null;
}

export interface StructurePlan {
  partNumber: string;
  description: string;
  kits: number;
  options: string[];
  offered: string[];
  isSold: boolean;
  today: IsoDate;
  parts: StructurePart[];
  rows: StructureRow[];
}
