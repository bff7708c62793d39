import type { Book } from "./book";

interface Skirt {
  /** Family digits: `1` gives SK-1101L. */
  series: number;
  set: string;
  suffix: string;
  /** Segments a side, and across bow and stern. */
  side: number;
  bow: number;
  stern: number;
  /** Square metres of the largest outer panel. */
  panel: number;
}

/** Sewn skirts: every station has its own cut panels; left and right segments are parts of their own. */
export function addSkirts(book: Book): void {
  book.add({
    partNumber: "SK-0030",
    description: "Patch, wear, segment foot, cut",
    sourcing: "make",
    leadTimeDays: 1,
  });
  book.addLine("SK-0030", "SK-0011", 0.028, { scrap: 0.1 });
  book.add({
    partNumber: "SK-0031",
    description: "Tab, segment, folded and bar-tacked",
    sourcing: "make",
    leadTimeDays: 1,
  });
  book.addLine("SK-0031", "SK-0011", 0.009, { scrap: 0.1 });
  book.addLine("SK-0031", "SK-0020", 1);
  addSkirt(book, { series: 1, set: "SK-100", suffix: "", side: 21, bow: 5, stern: 6, panel: 0.36 });
  addSkirt(book, {
    series: 4,
    set: "SK-400",
    suffix: ", four seats",
    side: 16,
    bow: 3,
    stern: 4,
    panel: 0.62,
  });
}

function addSkirt(book: Book, skirt: Skirt): void {
  const { set, series, suffix } = skirt;
  book.add({
    partNumber: set,
    description: `Skirt set, laced by station${suffix}`,
    sourcing: "make",
    leadTimeDays: 3,
  });
  const groups = [
    { number: `SK-${series}10`, name: "left side", hand: "L", count: skirt.side, from: 1 },
    { number: `SK-${series}20`, name: "right side", hand: "R", count: skirt.side, from: 1 },
    { number: `SK-${series}30`, name: "bow", hand: "", count: skirt.bow, from: 41 },
    { number: `SK-${series}40`, name: "stern", hand: "", count: skirt.stern, from: 51 },
  ];
  for (const group of groups) {
    book.add({
      partNumber: group.number,
      description: `Segment bundle, ${group.name}${suffix}`,
      sourcing: "make",
      leadTimeDays: 2,
    });
    book.addLine(set, group.number, 1);
    for (let index = 0; index < group.count; index++) addSegment(book, skirt, group, group.from + index);
  }
  const run = skirt.side * 0.62 + 3;
  book.addLine(set, "SK-0023", Number((run * 2).toFixed(3)), { scrap: 0.03 });
  book.addLine(set, "SK-0024", (skirt.side * 2 + skirt.bow + skirt.stern) * 3);
  book.addLine(set, "TL-03", null);
}

function addSegment(
  book: Book,
  skirt: Skirt,
  group: { number: string; name: string; hand: string },
  station: number,
): void {
  const code = `SK-${skirt.series}${station > 40 ? "3" : "1"}${String(station).padStart(2, "0")}`;
  const place = group.hand === "" ? `${group.name} ${station % 10}` : `station ${station}`;
  const size = skirt.panel * (1 - 0.012 * Math.abs((station % 40) - 9));
  addPanel(book, {
    number: `${code}-A`,
    name: `Panel, outer, ${place}${skirt.suffix}, cut`,
    cloth: "SK-0010",
    square: size,
  });
  addPanel(book, {
    number: `${code}-B`,
    name: `Panel, inner, ${place}${skirt.suffix}, cut`,
    cloth: "SK-0010",
    square: size * 0.61,
  });
  const segment = `${code}${group.hand}`;
  const hand = group.hand === "L" ? ", left" : group.hand === "R" ? ", right" : "";
  book.add({
    partNumber: segment,
    description: `Segment, skirt, ${place}${hand}${skirt.suffix}, sewn`,
    sourcing: "make",
    leadTimeDays: 2,
    yield: 0.98,
  });
  book.addLine(group.number, segment, 1);
  book.addLine(segment, `${code}-A`, 1);
  book.addLine(segment, `${code}-B`, 1);
  book.addLine(segment, "SK-0030", 1);
  book.addLine(segment, "SK-0031", 4);
  book.addLine(segment, "SK-0020", 6);
  book.addLine(segment, "SK-0021", Number((size * 4.2).toFixed(3)), { scrap: 0.03 });
  book.addLine(segment, "SK-0022", 0.008, { scrap: 0.08 });
  book.addLine(segment, "SK-0025", 0.003, { scrap: 0.1 });
  book.addLine(segment, "SK-0026", 1);
}

function addPanel(book: Book, panel: { number: string; name: string; cloth: string; square: number }): void {
  if (book.parts.has(panel.number)) return;
  book.add({ partNumber: panel.number, description: panel.name, sourcing: "make", leadTimeDays: 1 });
  book.addLine(panel.number, panel.cloth, Number(panel.square.toFixed(3)), { scrap: 0.09 });
}
