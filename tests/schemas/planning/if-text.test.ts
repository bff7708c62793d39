import fc from "fast-check";
import { expect, test } from "vitest";
import { formatIf, type If, parseIf } from "~/schemas/planning/if-text";

const text = fc.string({ unit: "grapheme", maxLength: 20 });

const change: fc.Arbitrary<If> = fc.oneof(
  fc.record({ kind: fc.constant("stock" as const), partNumber: text, change: text }),
  fc.record({ kind: fc.constant("hold" as const), partNumber: text, lot: text }),
  fc.record({ kind: fc.constant("order" as const), reference: text, due: text }),
  fc.record({ kind: fc.constant("arrival" as const), partNumber: text, quantity: text, due: text }),
  fc.record({ kind: fc.constant("lead" as const), partNumber: text, days: text }),
  fc.record({ kind: fc.constant("cost" as const), partNumber: text, cost: text }),
);

test("a change goes into the address and comes back as it was", () => {
  fc.assert(
    fc.property(change, (one) => {
      expect(parseIf(formatIf(one))).toEqual({ ...one });
    }),
  );
});

test("it reads as it is said", () => {
  expect(formatIf({ kind: "stock", partNumber: "HB-2041", change: "+2" })).toBe("stock:HB-2041:+2");
  expect(formatIf({ kind: "hold", partNumber: "A:B", lot: "50%" })).toBe("hold:A%3AB:50%25");
});

test.each(["", "stock", "stock:A", "stock:A:1:2", "toString:a:b", "buy:A:2"])("%j is no change", (one) => {
  expect(parseIf(one)).toBeNull();
});
