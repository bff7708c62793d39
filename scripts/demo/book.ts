import { describeFastener } from "./fasteners";

/** One part of the firm's book, as the generator carries it; money and mass are per unit. */
export interface BookPart {
  partNumber: string;
  description: string;
  sourcing: "buy" | "make" | "phantom";
  unit: string;
  decimals: number;
  leadTimeDays: number;
  cost: number | null;
  mass: number | null;
  yield: number;
  sold: boolean;
  /** The trade it is bought in; null for made parts. */
  trade: string | null;
  /** Kept by lot. */
  lotted: boolean;
}

export interface BookLine {
  parent: string;
  component: string;
  /** Null is "as required". */
  quantity: number | null;
  scrap: number;
  option: string;
  fromSerial: string;
  toSerial: string;
  fromDate: string;
  toDate: string;
}

export type LineTerms = Partial<Omit<BookLine, "parent" | "component" | "quantity">>;

/** Parts and lines in the order in which they were written down. */
export class Book {
  readonly parts = new Map<string, BookPart>();
  readonly lines: BookLine[] = [];

  add(part: Partial<BookPart> & Pick<BookPart, "partNumber" | "description" | "sourcing">): void {
    if (this.parts.has(part.partNumber)) throw new Error(`${part.partNumber} is in the book twice.`);
    this.parts.set(part.partNumber, {
      unit: "EA",
      decimals: 0,
      leadTimeDays: 0,
      cost: null,
      mass: null,
      yield: 1,
      sold: false,
      trade: null,
      lotted: false,
      ...part,
    });
  }

  addLine(parent: string, component: string, quantity: number | null, terms: LineTerms = {}): void {
    this.lines.push({
      parent,
      component,
      quantity,
      scrap: 0,
      option: "",
      fromSerial: "",
      toSerial: "",
      fromDate: "",
      toDate: "",
      ...terms,
    });
    if (!this.parts.has(component)) {
      const fastener = describeFastener(component);
      if (fastener) this.add(fastener);
    }
  }

  part(partNumber: string): BookPart {
    const part = this.parts.get(partNumber);
    if (!part) throw new Error(`${partNumber} is not in the book.`);
    return part;
  }
}
