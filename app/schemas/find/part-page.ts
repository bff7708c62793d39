import type { MassRollUp } from "~/domain/planning/roll-up-mass";
import type { PartAnswer } from "~/schemas/parts/part-answer";

/** A line of a part's own structure, one level down. */
export interface ComponentLine {
  id: number;
  findNumber: string | null;
  partNumber: string;
  description: string;
  unit: string;
  /** For one of the parent; null as required. */
  quantity: string | null;
  scrap: string;
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
  fromDate: string | null;
  toDate: string | null;
}

/** What a supplier asks for a part, from a quantity on. Quantities and prices are in buying units. */
export interface PresentedOffer {
  supplier: string;
  supplierName: string;
  partNumber: string;
  description: string;
  supplierPartNumber: string;
  buyingUnit: string;
  /** How much of the part's unit is in one buying unit. */
  perBuyingUnit: string;
  unit: string;
  minimum: string | null;
  multiple: string | null;
  fromQuantity: string;
  /** Null for people who may not see prices. */
  unitPrice: string | null;
  currency: string;
  leadTimeDays: number | null;
  preferred: boolean;
}

export interface PartPage {
  part: PartAnswer;
  components: ComponentLine[];
  offers: PresentedOffer[];
  /** What the bought parts of one cost with nothing on the shelf; null without a cost or the right to see it. */
  rolledUpCost: string | null;
  rolledUpMass: MassRollUp | null;
  /** Orders of the ship line that wait for this part, and what each lacks of it. */
  stops: { kitOrder: string; missing: string }[];
  /** How many open kit orders were asked. */
  ordersAsked: number;
  seesCosts: boolean;
  today: string;
}
