import type { StructurePart, StructureRow } from "~/schemas/parts/structure-plan";

/** The tree laid out for drawing: for each row its parent, and where its own rows end. */
export interface TreeShape {
  parent: Int32Array;
  /** Index after the last row below it. */
  end: Int32Array;
  /** 1 where the row, or one below it, is of a part that is missing. */
  leadsToMissing: Uint8Array;
}

export function treeShape(rows: readonly StructureRow[], parts: readonly StructurePart[]): TreeShape {
  const parent = new Int32Array(rows.length).fill(-1);
  const end = new Int32Array(rows.length);
  const leadsToMissing = new Uint8Array(rows.length);
  const path: number[] = [];
  const close = (level: number, at: number) => {
    while (path.length >= level) end[path.pop() as number] = at;
  };
  rows.forEach((row, at) => {
    close(row.level, at);
    parent[at] = path.at(-1) ?? -1;
    path.push(at);
    if (!isMissing(parts[row.part])) return;
    for (const one of path) leadsToMissing[one] = 1;
  });
  close(1, rows.length);
  return { parent, end, leadsToMissing };
}

export function isMissing({ missing }: StructurePart): boolean {
  return missing !== null && /[1-9]/.test(missing);
}

interface Wanted {
  open: ReadonlySet<number>;
  onlyMissing: boolean;
  /** Rows whose number or description has it, and all above them; nothing for all rows. */
  words: string;
}

/** Indexes of the rows to draw, in order. */
export function visibleRows(
  rows: readonly StructureRow[],
  parts: readonly StructurePart[],
  shape: TreeShape,
  { open, onlyMissing, words }: Wanted,
): number[] {
  const kept = words === "" ? null : matching(rows, parts, shape, words.toLowerCase());
  const shown: number[] = [];
  for (let at = 0; at < rows.length; ) {
    if ((onlyMissing && shape.leadsToMissing[at] === 0) || (kept && kept[at] === 0)) {
      at = shape.end[at];
      continue;
    }
    shown.push(at);
    at = kept !== null || open.has(at) ? at + 1 : shape.end[at];
  }
  return shown;
}

function matching(
  rows: readonly StructureRow[],
  parts: readonly StructurePart[],
  { parent }: TreeShape,
  words: string,
): Uint8Array {
  const fits = parts.map(({ partNumber, description }) =>
    `${partNumber} ${description}`.toLowerCase().includes(words),
  );
  const kept = new Uint8Array(rows.length);
  rows.forEach((row, at) => {
    if (!fits[row.part]) return;
    for (let up = at; up >= 0 && kept[up] === 0; up = parent[up]) kept[up] = 1;
  });
  return kept;
}
