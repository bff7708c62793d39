import type { PlanDemand } from "~/domain/planning/types";
import { isIsoDate } from "~/schemas/fields/iso-date";
import { optionCodes } from "~/schemas/fields/option-codes";
import { partNumber } from "~/schemas/fields/part-number";
import { BadInput } from "./bad-input";

const shape = /^([^@:#]*)(?:@([^:#]*))?(?::([^#]*))?(?:#(.*))?$/s;

function refuse(text: string, column: string, value: string, expected: string): never {
  throw new BadInput([
    `--demand ${JSON.stringify(text)}, ${column}: found ${JSON.stringify(value)}; expected ${expected}.`,
  ]);
}

/** `KIT=10[@YYYY-MM-DD][:OPTION+OPTION][#SERIAL]`. The kit ends at the last `=`: a part number may hold any of the signs. */
export function parseDemand(text: string): PlanDemand {
  const equals = text.lastIndexOf("=");
  if (equals === -1) refuse(text, "kit", text, "KIT=10[@YYYY-MM-DD][:OPTION+OPTION][#SERIAL]");
  const kit = partNumber.safeParse(text.slice(0, equals));
  if (!kit.success) refuse(text, "kit", text.slice(0, equals), kit.error.issues[0].message);
  const [, quantity = "", due, options, serial] = shape.exec(text.slice(equals + 1)) ?? [];
  if (!/^\d{1,15}$/.test(quantity) || !/[1-9]/.test(quantity)) {
    refuse(text, "quantity", quantity, "a whole number of kits above 0, such as 10");
  }
  if (due !== undefined && !isIsoDate(due)) {
    refuse(text, "date", due, "a day of the calendar as YYYY-MM-DD, such as 2026-12-01");
  }
  const codes = optionCodes.safeParse(options ?? "");
  if (!codes.success || options?.trim() === "") {
    refuse(text, "options", options ?? "", "option codes joined by +, such as RADIO+COVER");
  }
  if (serial !== undefined && !/\d$/.test(serial))
    refuse(text, "serial", serial, "a serial that ends in digits, such as 098");
  return {
    partNumber: kit.data,
    quantity: String(Number(quantity)),
    due: due ?? null,
    options: codes.data,
    serial: serial ?? null,
  };
}
