import { type FormEvent, useState } from "react";
import { formatIf, type If, type IfKind } from "~/schemas/planning/if-text";
import { PartBlank } from "./part-blank";
import { TrayBlank } from "./tray-blank";

interface WhatIfTrayProps {
  seesCosts: boolean;
  onAdd: (text: string) => void;
}

const KINDS: Readonly<Record<IfKind, string>> = {
  stock: "there were more or less of a part",
  hold: "a part, or a lot of it, were held",
  order: "an open order came on another day",
  arrival: "more of a part came",
  lead: "a part took longer or shorter",
  cost: "a part cost more or less",
};

/** One change as a sentence to fill in. Nothing of it is stored: it goes into the address. */
export function WhatIfTray({ seesCosts, onAdd }: WhatIfTrayProps) {
  const [kind, setKind] = useState<IfKind>("stock");
  const kinds = (Object.keys(KINDS) as IfKind[]).filter((name) => name !== "cost" || seesCosts);

  function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = event.currentTarget;
    const values = Object.fromEntries(new FormData(form)) as Record<string, string>;
    onAdd(formatIf(readIf(kind, values)));
    form.reset();
    form.querySelector<HTMLElement>("input")?.focus();
  }

  return (
    <form onSubmit={submit} aria-label="A change to try" className="sheet mt-2 grid max-w-4xl gap-4">
      <label className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <span className="font-bold">What if</span>
        <select
          className="field w-auto max-w-full"
          value={kind}
          onChange={(event) => setKind(event.target.value as IfKind)}
        >
          {kinds.map((name) => (
            <option key={name} value={name}>
              {KINDS[name]}
            </option>
          ))}
        </select>
      </label>
      <div key={kind} className="flex flex-wrap items-end gap-x-4 gap-y-3">
        <Blanks kind={kind} />
        <button type="submit" className="button">
          Try it
        </button>
      </div>
    </form>
  );
}

function readIf(kind: IfKind, values: Record<string, string>): If {
  const text = (name: string) => (values[name] ?? "").trim();
  const partNumber = text("part");
  switch (kind) {
    case "stock":
      return { kind, partNumber, change: `${text("sign")}${text("quantity")}` };
    case "hold":
      return { kind, partNumber, lot: text("lot") };
    case "order":
      return { kind, reference: text("reference"), due: text("due") };
    case "arrival":
      return { kind, partNumber, quantity: text("quantity"), due: text("due") };
    case "lead":
      return { kind, partNumber, days: text("days") };
    case "cost":
      return { kind, partNumber, cost: text("cost") };
  }
}

const AMOUNT = {
  inputMode: "decimal",
  pattern: "\\d{1,12}(\\.\\d{1,6})?",
  title: "A quantity such as 2 or 0.350",
} as const;

function Blanks({ kind }: { kind: IfKind }) {
  switch (kind) {
    case "stock":
      return (
        <>
          <label>
            <span className="block font-bold">There are</span>
            <select name="sign" className="field mt-1 w-auto">
              <option value="+">more</option>
              <option value="-">fewer</option>
            </select>
          </label>
          <TrayBlank label="By how many" name="quantity" {...AMOUNT} />
          <PartBlank />
        </>
      );
    case "hold":
      return (
        <>
          <PartBlank />
          <TrayBlank label="Lot, or none for all of it" name="lot" required={false} />
        </>
      );
    case "order":
      return (
        <>
          <TrayBlank label="Number of the order" name="reference" />
          <TrayBlank label="Comes on" name="due" type="date" />
        </>
      );
    case "arrival":
      return (
        <>
          <TrayBlank label="How many" name="quantity" {...AMOUNT} />
          <PartBlank />
          <TrayBlank label="Come on" name="due" type="date" />
        </>
      );
    case "lead":
      return (
        <>
          <PartBlank />
          <TrayBlank
            label="Days it takes"
            name="days"
            inputMode="numeric"
            pattern="\d{1,5}"
            title="Whole days"
          />
        </>
      );
    case "cost":
      return (
        <>
          <PartBlank />
          <TrayBlank label="Price of one" name="cost" {...AMOUNT} title="A price such as 4.20" />
        </>
      );
  }
}
