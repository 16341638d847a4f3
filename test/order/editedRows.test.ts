import { describe, expect, test } from "vitest";
import { BILL_COLUMNS, billOf, billText, readEditedBill } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";
import fc from "../support/property.ts";

const brief = briefOf();
const CSV = billText(
  billOf({ layout: bankOf(), unit: UNIT, families: FAMILIES, brief, currency: "EUR", cautions: ["Beware."] }),
  "csv",
);
const refusals = (text: string) => {
  const read = readEditedBill(text, "bill.csv");
  return read.ok ? [] : read.refusals.map(({ code, place }) => [code, place.line, place.column ?? null]);
};
const rows = (text: string) => {
  const read = readEditedBill(text, "bill.csv");
  return read.ok ? read.value.rows : [];
};

describe("readEditedBill(text, file)", () => {
  test("nothing, binary, another table, a heading twice: refused by place", () => {
    expect(refusals("")).toEqual([["empty-file", undefined, null]]);
    expect(refusals("item,line\n\u0000")).toEqual([["binary-file", undefined, null]]);
    expect(refusals("part,price\na,1\n")).toEqual([
      ["missing-heading", 1, null],
      ["missing-heading", 1, null],
    ]);
    expect(refusals("item,line,note,note\n")).toEqual([["duplicate-heading", 1, 4]]);
  });

  test("every fault of every row is told with its line and column", () => {
    const text =
      'item,line,unit price,pack\nlug,lugs,free,0\nlug,lug,,\nlug,lugs,,,9\n,,1,\nfuse,fuses,1,\nfuse,fuses,2,\n"x,own line,,\n';
    expect(refusals(text)).toEqual([
      ["broken-quotes", 8, null],
      ["bad-price", 2, 3],
      ["bad-count", 2, 4],
      ["bad-choice", 3, 2],
      ["row-too-long", 4, 5],
      ["missing-value", 5, null],
      ["duplicate-line", 7, null],
    ]);
    const read = readEditedBill(text, "bill.csv");
    expect(read.ok ? "" : read.refusals[3]?.want).toMatch(/^perhaps "lugs"/);
  });

  test("a mark of a later version is refused; one that is none is no mark", () => {
    expect(refusals("item,line,mark\nlug,lugs,v2.abc\n")).toEqual([["newer-version", 2, 3]]);
    expect(rows("item,line,mark\nlug,lugs,mine\n")[0]?.mark).toBe("");
  });

  test("what the program wrote reads back: every line, no sum, no caution", () => {
    const bill = billOf({ layout: bankOf(), unit: UNIT, families: FAMILIES, brief, currency: "EUR", cautions: [] });
    expect(rows(CSV).map(({ line, mark }) => [line, mark])).toEqual(bill.lines.map(({ line, mark }) => [line, mark]));
    for (const [i, row] of rows(CSV).entries())
      for (const { key, builders } of BILL_COLUMNS)
        if (builders)
          expect(row.cells.get(key)?.value ?? null, key).toBe(
            bill.lines[i]?.[key] === "" ? row.cells.get(key)?.value : bill.lines[i]?.[key],
          );
  });

  test("a spreadsheet's ways: byte-order mark, semicolons with decimal commas, headings in capitals, columns moved", () => {
    const [row] = rows("\ufeffLINE;Unit  Price;Item\r\nlugs;0,25;lug\r\n");
    expect([row?.line, row?.cells.get("unitPrice")?.value, row?.cells.get("item")?.value, row?.at]).toEqual([
      "lugs",
      0.25,
      "lug",
      2,
    ]);
  });

  test("the guard against formulas is taken off again", () => {
    expect(rows("item,line\n'=1+1,\n")[0]?.cells.get("item")?.value).toBe("=1+1");
    expect(rows("item,line\n'plain,\n")[0]?.cells.get("item")?.value).toBe("'plain");
  });

  test("headings of the builder's own come with their cells", () => {
    const read = readEditedBill("item,line,who buys,,shelf\nlug,lugs,me,,3\n", "bill.csv");
    expect(read).toMatchObject({
      ok: true,
      value: { extraHeadings: ["who buys", "shelf"], rows: [{ extra: ["me", "3"] }] },
    });
  });
});

describe("readEditedBill(text, file), mutated", () => {
  const MARKS = [
    ",",
    ";",
    "\t",
    '"',
    "\n",
    "\r",
    "'",
    "=",
    "0",
    "-1",
    "1e309",
    "NaN",
    "\u202e",
    "\u0000",
    "v2.",
    "€",
    "lugs",
    "sum",
    "",
  ];
  const cut = fc.record({ at: fc.nat(CSV.length), drop: fc.nat(40), put: fc.constantFrom(...MARKS) });

  test("whatever is cut and put: no throw, every refusal names the file, every row taken is a row of the file with values of its kind", () => {
    fc.assert(
      fc.property(fc.array(cut, { minLength: 1, maxLength: 6 }), (cuts) => {
        let text = CSV;
        for (const { at, drop, put } of cuts) text = text.slice(0, at) + put + text.slice(at + drop);
        const read = readEditedBill(text, "bill.csv");
        if (!read.ok) {
          expect(read.refusals.length).toBeGreaterThan(0);
          for (const { code, place } of read.refusals) {
            expect(place.file, code).toBe("bill.csv");
            if (!["empty-file", "binary-file"].includes(code)) expect(place.line, code).toBeGreaterThan(0);
          }
          return;
        }
        const lines = text.split(/\r\n|\n|\r/).length;
        // One claim a reading: thousands of them would be slow.
        const odd = read.value.rows.filter(
          (row) =>
            row.at > lines ||
            BILL_COLUMNS.some(({ key, kind }) => {
              const value = row.cells.get(key)?.value ?? null;
              return value !== null && (kind === "text" ? typeof value !== "string" : !((value as number) >= 0));
            }),
        );
        expect(odd).toEqual([]);
      }),
      { numRuns: 120 },
    );
  });
});
