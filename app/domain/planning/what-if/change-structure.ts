import type { CompiledStructure } from "../compile-structure";
import { compileStructure } from "../compile-structure";
import { partKey } from "../part-key";
import type { Structure } from "../structure/structure";
import type { PlanLine } from "../types";
import type { WhatIf } from "./what-if";

/** The structure with parts changed or added and the lines of the named parents replaced whole. */
export function changeStructure(
  structure: Structure,
  { parts, structure: parents }: Pick<WhatIf, "parts" | "structure">,
): CompiledStructure {
  if (parts.length === 0 && parents.length === 0) return { ok: true, structure };
  const changed = new Map(parts.map((part) => [partKey(part.partNumber), part]));
  const all = structure.parts.map((part) => {
    const key = partKey(part.partNumber);
    const other = changed.get(key);
    changed.delete(key);
    return other ?? part;
  });
  const replaced = new Set(parents.map(({ parent }) => partKey(parent)));
  const lines: PlanLine[] = structure.lines.filter((line) => !replaced.has(partKey(line.parent)));
  for (const { lines: own } of parents) lines.push(...own);
  return compileStructure([...all, ...changed.values()], lines);
}
