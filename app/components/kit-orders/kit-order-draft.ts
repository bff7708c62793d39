import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";

/** What stands in the form: text as it was typed. */
export interface KitOrderDraft {
  number: string;
  kit: string;
  options: string[];
  serial: string;
  wantedOn: string;
  customer: string;
  priority: string;
  note: string;
}

/** An order as the form shows it. */
export function draftOf(order: PresentedKitOrder): KitOrderDraft {
  return {
    number: order.number,
    kit: order.kit,
    options: order.options,
    serial: order.serial ?? "",
    wantedOn: order.wantedOn ?? "",
    customer: order.customer,
    priority: String(order.priority),
    note: order.note,
  };
}

/** What was typed, out of a sent form. */
export function draftFromForm(form: FormData): KitOrderDraft {
  const text = (name: string) => String(form.get(name) ?? "");
  return {
    number: text("number"),
    kit: text("kit"),
    options: form.getAll("options").map(String),
    serial: text("serial"),
    wantedOn: text("wantedOn"),
    customer: text("customer"),
    priority: text("priority"),
    note: text("note"),
  };
}
