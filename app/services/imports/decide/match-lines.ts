import { partKey } from "~/domain/planning/part-key";
import type { StructureRow } from "~/schemas/imports/structure";
import { sameValues } from "./same-values";

interface MatchedLines {
  /** For each line of the file the one it takes the place of; null for a new one. */
  before: (StructureRow | null)[];
  /** Lines that the file does not have any more. */
  removed: StructureRow[];
  /** Keys of the parents whose lines change, or only their order. */
  changed: Set<string>;
}

/** Lines of the same parent, component and option are the same line, the first the first and so on. */
function identity(line: StructureRow): string {
  return JSON.stringify([partKey(line.parent), partKey(line.component), line.option]);
}

function byParent(lines: readonly StructureRow[]): Map<string, StructureRow[]> {
  const groups = new Map<string, StructureRow[]>();
  for (const line of lines) {
    const group = groups.get(partKey(line.parent));
    if (group) group.push(line);
    else groups.set(partKey(line.parent), [line]);
  }
  return groups;
}

/** Compares the lines of a file with the stored lines of the parents that it names. */
export function matchLines(lines: readonly StructureRow[], stored: readonly StructureRow[]): MatchedLines {
  const waiting = new Map<string, StructureRow[]>();
  for (const line of stored) {
    const group = waiting.get(identity(line));
    if (group) group.push(line);
    else waiting.set(identity(line), [line]);
  }
  const before = lines.map((line) => waiting.get(identity(line))?.shift() ?? null);
  const removed = [...waiting.values()].flat();
  const old = byParent(stored);
  const changed = new Set<string>();
  for (const [key, group] of byParent(lines)) {
    const was = old.get(key) ?? [];
    if (was.length !== group.length || !group.every((line, at) => sameValues(was[at], line)))
      changed.add(key);
  }
  return { before, removed, changed };
}
