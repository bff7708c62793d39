import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { guardTextCell, readTextCell } from "~/utils/csv/formula-cell";
import { readCsv } from "~/utils/csv/read-csv";
import { type CsvColumn, writeCsv } from "~/utils/csv/write-csv";

const columns: CsvColumn<{ text: string; quantity: string | null; sold: boolean }>[] = [
  { name: "text", cell: (row) => row.text },
  { name: "quantity", cell: (row) => row.quantity },
  { name: "sold", cell: (row) => row.sold },
];

describe("writeCsv", () => {
  it("writes RFC 4180 lines, numbers and dates as they are", () => {
    const rows = [
      { text: 'say "two", please', quantity: "-0.350", sold: true },
      { text: "2027-01-10", quantity: null, sold: false },
    ];
    expect(writeCsv(columns, rows)).toBe(
      'text,quantity,sold\r\n"say ""two"", please",-0.350,1\r\n2027-01-10,,0\r\n',
    );
  });

  it.each(["=1+1", "+1-2", "-x", "@sum", "\tx", "\rx", "\nx", "＝x", "＋x", "－x", "＠x", "'=x"])(
    "makes the text cell %j harmless",
    (text) => {
      expect(guardTextCell(text)).toBe(`'${text}`);
    },
  );

  it("writes only the header where there are no rows", () => {
    expect(writeCsv(columns, [])).toBe("text,quantity,sold\r\n");
  });

  it("is read back as it was, whatever the text", () => {
    const text = fc.oneof(fc.string({ unit: "grapheme" }), fc.constantFrom("=1", "'=1", "''+", "'", "-a"));
    fc.assert(
      fc.property(fc.array(text, { minLength: 1 }), (texts) => {
        const plain = texts.map((each) => `x${each}`.replaceAll(/[\0\r\n]/g, "").slice(1));
        const file = writeCsv(
          columns,
          plain.map((each) => ({ text: each, quantity: "1", sold: false })),
        );
        const table = readCsv(new TextEncoder().encode(file));
        expect(table.ok && table.rows.map((row) => readTextCell(row.cells[0]))).toEqual(plain);
      }),
    );
  });
});
