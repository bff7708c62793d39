import type { Standing } from "~/schemas/parts/part-answer";
import type { PresentedOffer } from "./part-page";

interface PartNamed {
  partNumber: string;
  description: string;
  unit: string;
}

/** A balance as the page of its bin shows it. */
export interface BinBalance extends PartNamed {
  lot: string | null;
  standing: Standing;
  expiresOn: string | null;
  quantity: string;
}

export interface BinPage {
  code: string;
  zone: string;
  description: string;
  balances: BinBalance[];
  today: string;
}

/** A line of a purchase order. */
export interface OrderLine extends PartNamed {
  number: string;
  line: number;
  quantity: string;
  received: string;
  /** What is still to come; nothing of a closed line or order. */
  open: string;
  due: string | null;
  /** For one of the part's unit; null without the right to see it. */
  unitPrice: string | null;
}

export interface SupplierPage {
  code: string;
  name: string;
  email: string;
  phone: string;
  currency: string;
  leadTimeDays: number | null;
  note: string;
  offers: PresentedOffer[];
  lines: OrderLine[];
  seesCosts: boolean;
  today: string;
}

export interface PurchaseOrderPage {
  number: string;
  state: "draft" | "sent" | "closed" | "cancelled";
  supplier: string | null;
  supplierName: string | null;
  orderedOn: string | null;
  note: string;
  lines: OrderLine[];
  seesCosts: boolean;
  today: string;
}

export interface ShopOrderComponent extends PartNamed {
  promised: string;
  picked: string;
}

export interface ShopOrderPage extends PartNamed {
  number: string;
  state: "planned" | "released" | "finished" | "cancelled";
  quantity: string;
  finished: string;
  due: string | null;
  components: ShopOrderComponent[];
  today: string;
}
