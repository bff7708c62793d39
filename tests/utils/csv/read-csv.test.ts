import { parse } from "csv-parse/sync";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { readCsv } from "~/utils/csv/read-csv";
import { sayCsvProblem } from "~/utils/csv/say-csv-problem";

const bytes = (text: string) => new TextEncoder().encode(text);

function cellsOf(input: string | Uint8Array) {
  const table = readCsv(typeof input === "string" ? bytes(input) : input);
  if (!table.ok) throw new Error(table.problems.map((problem) => sayCsvProblem(problem)).join("\n"));
  return [table.header, ...table.rows].map((row) => row.cells);
}

function linesOf(input: string) {
  const table = readCsv(bytes(input));
  return table.ok ? table.rows.map((row) => row.line) : [];
}

function problemsOf(input: string | Uint8Array) {
  const table = readCsv(typeof input === "string" ? bytes(input) : input);
  return table.ok ? [] : table.problems;
}

describe("what is read", () => {
  test.each<[string, string, string[][]]>([
    [
      "a last line without a line end",
      "a,b\n1,2",
      [
        ["a", "b"],
        ["1", "2"],
      ],
    ],
    [
      "CRLF",
      "a,b\r\n1,2\r\n",
      [
        ["a", "b"],
        ["1", "2"],
      ],
    ],
    [
      "CR alone",
      "a,b\r1,2\r",
      [
        ["a", "b"],
        ["1", "2"],
      ],
    ],
    [
      "line ends of several kinds in one file",
      "a,b\r\n1,2\n3,4\r5,6",
      [
        ["a", "b"],
        ["1", "2"],
        ["3", "4"],
        ["5", "6"],
      ],
    ],
    ["a header alone", "a,b\n", [["a", "b"]]],
    [
      "quoted delimiters",
      'a,b\n"1,5",2',
      [
        ["a", "b"],
        ["1,5", "2"],
      ],
    ],
    [
      "doubled quotes",
      'a,b\n"5"" bolt",2',
      [
        ["a", "b"],
        ['5" bolt', "2"],
      ],
    ],
    [
      "a cell that is only a quote",
      'a,b\n"""",2',
      [
        ["a", "b"],
        ['"', "2"],
      ],
    ],
    [
      "empty quoted cells",
      'a,b\n"",""',
      [
        ["a", "b"],
        ["", ""],
      ],
    ],
    [
      "spaces as data",
      "a,b\n 1 , 2 ",
      [
        ["a", "b"],
        [" 1 ", " 2 "],
      ],
    ],
    [
      "empty cells",
      "a,b,c\n,,\n1,,",
      [
        ["a", "b", "c"],
        ["", "", ""],
        ["1", "", ""],
      ],
    ],
    [
      "blank lines, skipped",
      "\n\na,b\n\n1,2\n  \n3,4\n\n",
      [
        ["a", "b"],
        ["1", "2"],
        ["3", "4"],
      ],
    ],
    ["one column", "a\n1\n\n2", [["a"], ["1"], ["2"]]],
    ["a quoted empty cell of one column, which is no blank line", 'a\n""\n2', [["a"], [""], ["2"]]],
    [
      "line breaks in a cell",
      'a,b\n"1\r\n2",3',
      [
        ["a", "b"],
        ["1\n2", "3"],
      ],
    ],
    [
      "semicolons",
      "a;b\n1,5;2",
      [
        ["a", "b"],
        ["1,5", "2"],
      ],
    ],
    [
      "tabs",
      "a\tb\n1;2\t3,4",
      [
        ["a", "b"],
        ["1;2", "3,4"],
      ],
    ],
    [
      "quoted headers",
      '"a","b"\n1,2',
      [
        ["a", "b"],
        ["1", "2"],
      ],
    ],
    [
      "a delimiter inside a quoted header",
      '"a;b;c",d\n1,2',
      [
        ["a;b;c", "d"],
        ["1", "2"],
      ],
    ],
    [
      "values that look like something else",
      "a,b\n007,1E05\n3-12,true",
      [
        ["a", "b"],
        ["007", "1E05"],
        ["3-12", "true"],
      ],
    ],
    [
      "names that objects have",
      "a,b\n__proto__,constructor",
      [
        ["a", "b"],
        ["__proto__", "constructor"],
      ],
    ],
    [
      "a comment sign as data",
      "a,b\n#1,2",
      [
        ["a", "b"],
        ["#1", "2"],
      ],
    ],
    [
      "single quotes as data",
      "a,b\n'1',2",
      [
        ["a", "b"],
        ["'1'", "2"],
      ],
    ],
    [
      "a backslash before a quote as data",
      'a,b\n"\\",2',
      [
        ["a", "b"],
        ["\\", "2"],
      ],
    ],
  ])("%s", (_, input, expected) => {
    expect(cellsOf(input)).toEqual(expected);
  });

  test.each<[string, Uint8Array, string]>([
    ["UTF-8", bytes("a,b\né,日本"), "UTF-8"],
    ["UTF-8 with BOM", new Uint8Array([0xef, 0xbb, 0xbf, ...bytes("a,b\né,日本")]), "UTF-8 with BOM"],
    ["UTF-16LE", new Uint8Array([0xff, 0xfe, ...Buffer.from("a,b\né,日本", "utf16le")]), "UTF-16LE"],
    ["UTF-16BE", new Uint8Array([0xfe, 0xff, ...Buffer.from("a,b\né,日本", "utf16le").swap16()]), "UTF-16BE"],
  ])("%s, and says so", (_, input, encoding) => {
    expect(readCsv(input)).toMatchObject({ ok: true, encoding, delimiter: "," });
    expect(cellsOf(input)).toEqual([
      ["a", "b"],
      ["é", "日本"],
    ]);
  });

  test("Windows-1252, and says so", () => {
    const input = new Uint8Array([...bytes("a,b\n"), 0xe9, 0x2c, 0x80]);
    expect(readCsv(input)).toMatchObject({ ok: true, encoding: "Windows-1252" });
    expect(cellsOf(input)).toEqual([
      ["a", "b"],
      ["é", "€"],
    ]);
  });

  test("the delimiter is said", () => {
    expect(readCsv(bytes("a;b\n1;2"))).toMatchObject({ delimiter: ";" });
    expect(readCsv(bytes("a\tb\n1\t2"))).toMatchObject({ delimiter: "\t" });
  });
});

describe("line numbers stay true", () => {
  test("past cells of several lines, blank lines and CRLF", () => {
    expect(linesOf('a,b\r\n"1\r\n2\r\n3",4\r\n\r\n5,6\r\n"7",8\r\n')).toEqual([2, 6, 7]);
  });

  test("a cell after one of several lines has a line of its own", () => {
    const table = readCsv(bytes('a,b,c\n1,"x\ny",2\n3,4,5'));
    expect(table).toMatchObject({
      rows: [
        { line: 2, cellLines: [2, 2, 3] },
        { line: 4, cellLines: null },
      ],
    });
  });
});

describe("what is refused, with line and column", () => {
  test.each<[string, string, number | null, string | null, RegExp]>([
    ["an empty file", "", 1, null, /empty file/],
    ["blank lines only", "\n\n  \n", 1, null, /empty file/],
    ["an unclosed quote, by the line on which it opened", 'a,b\n1,2\n3,"4\n5,6\n', 3, "b", /unclosed quote/],
    ["an unclosed quote in the first cell", 'a,b\n"1,2\n3,4', 2, "a", /unclosed quote/],
    ["an unclosed quote after a cell of two lines", 'a,b\n"1\n2","3', 3, "b", /unclosed quote/],
    ["an unclosed quote that a later one seems to close", 'a,b\n1,"2\n3,"4"\n', 2, "b", /unclosed quote/],
    ["an unclosed quote in the header", 'a,"b\n1,2', 1, "2", /unclosed quote/],
    ["a quote inside an unquoted cell", 'a,b\n1,2\n5" bolt,3', 3, "a", /quote inside the unquoted cell/],
    ["quotes around a part of a cell", 'a,b\n1,x"2"', 2, "b", /quote inside the unquoted cell/],
    ["a space before the opening quote", 'a,b\n1, "2"', 2, "b", /quote inside the unquoted cell/],
    ["a space after the closing quote", 'a,b\n"1" ,2', 2, "a", /closing quote/],
    ["text after the closing quote", 'a,b\n"1"x,2\n3,4', 2, "a", /quote/],
    ["too many cells", "a,b\n1,2\n3,4,5", 3, "3", /3 cells \(too many\)/],
    ["too few cells", "a,b\n\n1", 3, "b", /1 cells \(too few\)/],
    ["NUL bytes", "a,b\n1,\0", 2, null, /NUL/],
    ["a packed spreadsheet", "PK\u0003\u0004whatever", null, null, /spreadsheet/],
  ])("%s", (_, input, line, column, found) => {
    const [problem] = problemsOf(input);
    expect(problem).toMatchObject({ line, column });
    expect(sayCsvProblem(problem, "parts.csv")).toMatch(found);
    expect(problem.expected).not.toBe("");
  });

  test("half a UTF-16 character", () => {
    expect(problemsOf(new Uint8Array([0xff, 0xfe, 0x61, 0x00, 0x2c]))).toHaveLength(1);
  });

  test("more bytes than allowed", () => {
    expect(readCsv(bytes("a,b\n1,2"), { byteLimit: 5 })).toMatchObject({
      ok: false,
      problems: [{ found: "7 bytes" }],
    });
  });

  test("several rows at once, but not without end", () => {
    expect(problemsOf("a,b\n1\n2\n3,4").map((problem) => problem.line)).toEqual([2, 3]);
    expect(problemsOf(`a,b\n${"1\n".repeat(100)}`)).toHaveLength(20);
  });
});

test("reads whatever is written by the rules as another parser does", () => {
  const cell = fc.oneof(
    fc.string({ unit: fc.constantFrom("a", " ", '"', ",", ";", "\t", "\n", "é", "0", "=") }),
    fc.string({ unit: "grapheme" }).filter((text) => !/[\r\0\ufeff]/.test(text)),
  );
  const rows = fc
    .integer({ min: 1, max: 4 })
    .chain((width) =>
      fc
        .array(fc.array(cell, { minLength: width, maxLength: width }), { maxLength: 6 })
        .map((body) => ({ width, body })),
    );
  const quote = (text: string) => `"${text.replaceAll('"', '""')}"`;
  fc.assert(
    fc.property(rows, fc.constantFrom("\n", "\r\n"), ({ width, body }, end) => {
      const header = Array.from({ length: width }, (_, at) => `column${at}`);
      const text = [header, ...body].map((row) => row.map(quote).join(",")).join(end);
      expect(cellsOf(text)).toEqual(parse(text, { record_delimiter: end }));
    }),
    { numRuns: 300 },
  );
});

test("never throws, whatever the bytes", () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 60 }), (input) => {
      const table = readCsv(input);
      if (!table.ok) expect(table.problems.length).toBeGreaterThan(0);
    }),
    { numRuns: 500 },
  );
});
