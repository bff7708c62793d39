import type { Structure } from "~/domain/planning/structure/structure";
import { MAKE } from "~/domain/planning/structure/structure";
import { demoPlan } from "./demo-plan";
import { openPass } from "./open-pass";

/** A line that counts for the demo's kit, by part numbers of the structure. */
interface NettingLine {
  parent: number;
  component: number;
  num: number;
  den: number;
}

/**
 * The netting of the demo's S2 from stock as others may work it out too: parts with level, stock and yield, and the
 * lines that count. Parts that do not stand in the kit are left out.
 */
export function demoNetting() {
  const { structure, supplies } = demoPlan();
  const pass = openPass(structure, supplies, "S2");
  const lines = countingLines(structure, pass.segment.active);
  const reached = new Set([pass.segment.part]);
  for (const { parent, component } of lines) if (reached.has(parent)) reached.add(component);
  const parts = [...reached]
    .sort((a, b) => a - b)
    .map((part) => ({
      part,
      level: structure.level[part],
      stock: Number(pass.offer.stock[part]),
      isLeaf: structure.leaf[part] === 1,
      yieldNum: structure.sourcing[part] === MAKE ? structure.yieldNum[part] : 1,
      yieldDen: structure.sourcing[part] === MAKE ? structure.yieldDen[part] : 1,
    }));
  const levels = Math.max(...parts.map(({ level }) => level));
  return {
    kit: pass.segment.part,
    parts,
    levels,
    lines: lines.filter(({ parent }) => reached.has(parent)),
    pass,
  };
}

/** Parents before components. */
function countingLines({ fixed, conditional, parts }: Structure, active: Uint8Array): NettingLine[] {
  const lines: NettingLine[] = [];
  for (let parent = 0; parent < parts.length; parent++) {
    for (const group of [fixed, conditional]) {
      for (let k = group.starts[parent]; k < group.starts[parent + 1]; k++) {
        if (group === conditional && active[k] === 0) continue;
        lines.push({ parent, component: group.component[k], num: group.num[k], den: group.den[k] });
      }
    }
  }
  return lines;
}

/** Throws unless the others' net need of every part is the core's. */
export function expectSameNet(
  what: string,
  net: Map<number, number>,
  core: ArrayLike<number | bigint>,
): void {
  for (const [part, own] of net) {
    if (own !== core[part])
      throw new Error(`${what}: part ${part} lacks ${own}, the core says ${core[part]}.`);
  }
}
