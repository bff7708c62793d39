/** A kit order as pages show it. One kit order is one kit. */
export interface PresentedKitOrder {
  number: string;
  kit: string;
  kitDescription: string;
  options: string[];
  serial: string | null;
  wantedOn: string | null;
  customer: string;
  priority: number;
  state: "open" | "shipped" | "cancelled";
  note: string;
  version: number;
}

/** A kit that can be ordered, with the options its structure offers. */
export interface OrderableKit {
  partNumber: string;
  description: string;
  options: { code: string; description: string }[];
}
