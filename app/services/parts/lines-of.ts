import type { Structure } from "~/domain/planning/structure/structure";

/** A part's lines as they were given, whatever their kind. */
export function linesOf(structure: Structure, part: number): { component: number; line: number }[] {
  const lines: { component: number; line: number }[] = [];
  for (const { starts, component, source } of [
    structure.fixed,
    structure.conditional,
    structure.asRequired,
  ]) {
    for (let k = starts[part]; k < starts[part + 1]; k++)
      lines.push({ component: component[k], line: source[k] });
  }
  return lines.sort((a, b) => a.line - b.line);
}
