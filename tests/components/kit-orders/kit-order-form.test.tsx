import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { renderToString } from "react-dom/server";
import { createMemoryRouter, RouterProvider } from "react-router";
import { describe, expect, test } from "vitest";
import { formRefusal } from "~/components/kit-orders/form-refusal";
import { kitOrderChange } from "~/components/kit-orders/kit-order-change";
import { draftFromForm, draftOf } from "~/components/kit-orders/kit-order-draft";
import { KitOrderForm } from "~/components/kit-orders/kit-order-form";

const draft = {
  number: "",
  kit: "S2",
  options: ["CAB"],
  serial: "098",
  wantedOn: "2027-03-14",
  customer: "Saltings Ferry Trust",
  priority: "1",
  note: "",
};

const kits = [
  { partNumber: "S2", description: "Two-seat craft", options: [{ code: "CAB", description: "Cabin" }] },
];

function form(extra: object = {}): string {
  const router = createMemoryRouter([
    { path: "/", element: <KitOrderForm kits={kits} draft={draft} {...extra} /> },
  ]);
  return renderToString(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
}

describe("the form of a kit order", () => {
  test("ties an error to its field", () => {
    const html = form({ errors: { serial: "S2 with this serial is order A-1 already." } });
    expect(html).toMatch(
      /<input[^>]*aria-invalid="true"[^>]*aria-describedby="serial-hint serial-error"[^>]*name="serial"|<input[^>]*name="serial"[^>]*aria-invalid="true"[^>]*aria-describedby="serial-hint serial-error"/,
    );
    expect(html).toContain('id="serial-error"');
  });

  test("asks a number of a new order only, and a version of a changed one", () => {
    expect(form()).toContain('name="number"');
    const changed = form({ version: 3 });
    expect(changed).not.toContain('name="number"');
    expect(changed).toMatch(/<input type="hidden" name="version" value="3"/);
  });
});

describe("what saving the form would change", () => {
  test("is a new order, or a change of the one that is there", () => {
    const order = { kit: "S2", options: ["CAB"], serial: "098", wantedOn: "2027-03-14", priority: 1 };
    expect(kitOrderChange(draft, kits, null)).toEqual({ kitOrders: { add: [{ number: "", ...order }] } });
    expect(kitOrderChange(draft, kits, "KO-1")).toEqual({
      kitOrders: { change: [{ number: "KO-1", ...order }] },
    });
  });

  test("leaves out options that the kit has not", () => {
    const change = kitOrderChange({ ...draft, options: ["CAB", "TRAILER"] }, kits, null);
    expect(change?.kitOrders?.add?.[0].options).toEqual(["CAB"]);
  });

  test.each([{ kit: "" }, { priority: "" }, { priority: "soon" }])("cannot be said with %o", (missing) => {
    expect(kitOrderChange({ ...draft, ...missing }, kits, null)).toBeNull();
  });
});

test("what was typed comes back as it was typed", () => {
  const sent = new FormData();
  for (const [name, value] of Object.entries({ ...draft, priority: "soon" })) {
    if (typeof value === "string") sent.set(name, value);
  }
  sent.append("options", "A");
  sent.append("options", "B");
  expect(draftFromForm(sent)).toEqual({ ...draft, priority: "soon", options: ["A", "B"] });
});

test("an order becomes a draft with empty text for what it has not", () => {
  const order = {
    ...draft,
    number: "KO-0001",
    kitDescription: "",
    priority: 4,
    serial: null,
    wantedOn: null,
    state: "open" as const,
    version: 1,
  };
  expect(draftOf(order)).toMatchObject({ number: "KO-0001", serial: "", wantedOn: "", priority: "4" });
});

test("errors of one field become one text, and an error of no field stands for the whole", () => {
  const errors = [
    { field: "options", message: "No option A." },
    { field: "options.1", message: "No option B." },
  ];
  expect(formRefusal({ message: "", errors })).toEqual({ errors: { options: "No option A. No option B." } });
  expect(formRefusal({ message: "Changed.", errors: [] })).toEqual({ errors: {}, problem: "Changed." });
});
