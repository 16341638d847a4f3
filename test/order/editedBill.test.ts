import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import type { Layout } from "../../src/bank/index.ts";
import { type Bill, billOf, billText, readEditedBill, withEdits } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const EUR = { currency: "EUR" };
const made = (
  more: {
    readonly price?: number;
    readonly parallel?: number;
    readonly ties?: Layout["ties"];
    readonly spares?: number;
  } = {},
): Bill => {
  const { price = 250, parallel = 2, ties = "cross-tied", spares = 2 } = more;
  const unit = { ...UNIT, price };
  const brief = briefOf({ spares });
  const layout = bankOf({ unit, brief, layout: { part: UNIT.part, series: 8, parallel, ties } });
  return billOf({ layout, unit, families: FAMILIES, brief, currency: "EUR", cautions: ["Beware."] });
};

/** Another writer and another reader than ours: the CSV as a table of strings, edited, written plainly. */
type Rows = Record<string, string>[];
const edit = (bill: Bill, work: (rows: Rows) => Rows): string => {
  const rows = work(parse(billText(bill, "csv"), { columns: true }));
  const headings = [...new Set(rows.flatMap((row) => Object.keys(row)))];
  const cell = (text: string): string => `"${text.replaceAll('"', '""')}"`;
  return [headings, ...rows.map((row) => headings.map((heading) => row[heading] ?? ""))]
    .map((row) => row.map(cell).join(","))
    .join("\n");
};
const at = (rows: Rows, line: string, cells: Record<string, string>): Rows =>
  rows.map((row) => (row.line === line ? { ...row, ...cells } : row));
const joined = (bill: Bill, text: string, money: { readonly currency: string | null } = EUR): Bill => {
  const read = readEditedBill(text, "bill.csv");
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  const both = withEdits(bill, read.value, money);
  if (!both.ok) throw new Error(JSON.stringify(both.refusals));
  return both.value;
};
const lineOf = (bill: Bill, kind: string) => bill.lines.find(({ line }) => line === kind);
const told = ({ changes = [] }: Bill) => changes.map(({ kind, line, heading }) => [kind, line, heading]);

describe("withEdits(bill, edited, money)", () => {
  test("a price whose currency nothing says is refused by its place", () => {
    const read = readEditedBill("item,line,unit price,currency\nwire,,1,\n", "bill.csv");
    const both = read.ok ? withEdits({ ...made(), lines: [] }, read.value, { currency: null }) : read;
    expect(both).toMatchObject({
      ok: false,
      refusals: [{ code: "missing-value", place: { line: 2, column: 4, field: "currency" } }],
    });
  });

  test("an untouched copy changes nothing, also when the catalogue's price has moved since", () => {
    const copy = edit(made(), (rows) => rows);
    expect(joined(made(), copy)).toEqual({
      ...made(),
      lines: made().lines.map((line) => ({ ...line, extra: [] })),
      changes: [],
    });
    const dearer = joined(made({ price: 300 }), copy);
    expect(lineOf(dearer, "units")?.unitPrice).toBe(3);
    expect(told(dearer)).toEqual([]);
  });

  test("the builder's price, choice and code are kept and told; quantities follow the new bank", () => {
    const copy = edit(made(), (rows) =>
      at(rows, "lugs", { value: "M6 ring", pack: "50", "unit price": "0.25", "order code": "L-16" }),
    );
    const bill = joined(made({ parallel: 4 }), copy);
    expect(lineOf(bill, "lugs")).toMatchObject({
      value: "M6 ring",
      needed: 64,
      toBuy: 100,
      packs: 2,
      purchase: 25,
      consumed: 16,
      currency: "EUR",
      orderCode: "L-16",
      state: "priced",
    });
    expect(told(bill)).toEqual([
      ["kept", "lugs", "value"],
      ["kept", "lugs", "pack"],
      ["kept", "lugs", "unit price"],
      ["kept", "lugs", "order code"],
    ]);
    expect(bill.changes?.[0]).toMatchObject({ made: "to be chosen", read: "M6 ring", at: 16 });
  });

  test("a requirement that was left alone is made anew with the bank: it never goes stale", () => {
    const copy = edit(made(), (rows) => at(rows, "fuses", { "unit price": "2" }));
    const higher = made();
    const lines = higher.lines.map((line) =>
      line.line === "fuses" ? { ...line, rating: "at least 2.4 kV dc" } : line,
    );
    expect(lineOf(joined({ ...higher, lines }, copy), "fuses")?.rating).toBe("at least 2.4 kV dc");
  });

  test("a price over the catalogue's is kept although the catalogue moved, and reckoned from the row alone", () => {
    const copy = edit(made({ spares: 0 }), (rows) => at(rows, "units", { "unit price": "2.10" }));
    // 16 - 3 on hand in packs of 10: 20 at 2.10.
    expect(lineOf(joined(made({ price: 300, spares: 0 }), copy), "units")).toMatchObject({
      toBuy: 20,
      surplus: 7,
      purchase: 42,
      consumed: 27.3,
    });
  });

  test("own lines and own columns come through, with their cost in the sum", () => {
    const copy = edit(made(), (rows) => [
      ...rows.slice(0, 3).map((row) => ({ ...row, shelf: "A3" })),
      { item: "wire, red", line: "", "quantity needed": "12.5", "unit price": "1.10" },
      ...rows.slice(3),
    ]);
    const bill = joined(made(), copy);
    expect(bill.lines.at(-1)).toMatchObject({
      item: "wire, red",
      line: "own line",
      purchase: 13.75,
      currency: "EUR",
      mark: "",
    });
    expect(bill.extraHeadings).toEqual(["shelf"]);
    expect(bill.lines[0]?.extra).toEqual(["A3"]);
    expect(bill.totals.purchase).toBeCloseTo((made().totals.purchase ?? 0) + 13.75, 9);
    for (const format of ["csv", "md", "html", "json"] as const) expect(billText(bill, format)).toContain("A3");
  });

  test("a line that was deleted is put back; one that the bank no longer takes is kept at 0 when it was written in", () => {
    const copy = edit(made(), (rows) =>
      at(
        rows.filter(({ line }) => line !== "screen"),
        "fuse holders",
        { "unit price": "4" },
      ),
    );
    const bill = joined(made({ parallel: 1, ties: "strings" }), copy);
    expect(told(bill)).toContainEqual(["put back", "screen", ""]);
    expect(told(bill)).toContainEqual(["not counted", "fuse holders", ""]);
    expect(bill.lines.at(-1)).toMatchObject({ item: "fuse holder", line: "own line", needed: 0, purchase: 0 });
    // The fuses were left alone: nothing of the builder's is lost with them.
    expect(lineOf(bill, "fuses")).toBeUndefined();
  });

  test("a copy of a copy stays: what was kept once is kept again, byte for byte", () => {
    const copy = edit(made(), (rows) => [
      ...at(rows, "lugs", { "unit price": "0.25", note: "shop; next door" }),
      { item: "glue", line: "own line" },
    ]);
    const first = billText(joined(made(), copy), "csv");
    expect(billText(joined(made(), first), "csv")).toBe(first);
  });

  test("what the builder wrote can be taken back: the program's own text is the program's again", () => {
    const copy = edit(made(), (rows) => at(rows, "lugs", { "unit price": "0.25" }));
    const back = edit(joined(made(), copy), (rows) => at(rows, "lugs", { "unit price": "", currency: "" }));
    expect(joined(made(), back).changes).toEqual([]);
  });

  test("a bill from before marks: what fills an open cell is the builder's, the rest is made anew", () => {
    // As the program wrote it then: no alternates, no status, no mark, footers without a kind.
    const old = edit(made(), (rows) =>
      at(rows, "lugs", { value: "M6 ring", "unit price": "0.25", "quantity needed": "99" }).map(
        ({ alternates: _a, status: _s, mark: _m, ...row }) =>
          row.line === "sum" || row.line === "caution" ? { ...row, line: "" } : row,
      ),
    );
    const bill = joined(made({ price: 300 }), old);
    expect(lineOf(bill, "lugs")).toMatchObject({ value: "M6 ring", unitPrice: 0.25, needed: 32, purchase: 8 });
    expect(lineOf(bill, "units")?.unitPrice).toBe(3);
    expect(bill.lines).toHaveLength(made().lines.length);
  });

  test("without any priced part the builder's currency is the bill's", () => {
    const unpriced = made();
    const lines = unpriced.lines.filter(({ purchase }) => purchase === null);
    const copy = edit({ ...unpriced, lines }, (rows) => at(rows, "lugs", { "unit price": "100", currency: "JPY" }));
    expect(joined({ ...unpriced, lines }, copy, { currency: null }).totals).toMatchObject({
      purchase: 3200,
      currency: "JPY",
      pricedLines: 1,
    });
  });
});

describe("totals, from the CSV alone", () => {
  /** Whole hundredths from the digits of a cell: no binary fraction, and none of the program's own arithmetic. */
  const cents = (text: string): bigint => {
    const match = /^(\d+)(?:\.(\d{1,2}))?$/.exec(text);
    if (match === null) throw new Error(`no amount: ${text}`);
    return BigInt(match[1] as string) * 100n + BigInt((match[2] ?? "").padEnd(2, "0"));
  };
  const cases = ([1, 2, 3, 7, 31] as const).flatMap((parallel) =>
    (["cross-tied", "strings"] as const).flatMap((ties) => [0, 5].map((spares) => ({ parallel, ties, spares }))),
  );

  test.each(cases)(
    "$parallel in parallel, $ties, $spares spares: rows add up, each row's packs and price give its cost",
    (given) => {
      const bill = joined(
        made(given),
        edit(made(given), (rows) => at(rows, "labels", { "unit price": "0.03", pack: "100" })),
      );
      const rows: Rows = parse(billText(bill, "csv"), { columns: true });
      const foot = rows.findIndex(({ line }) => line === "sum");
      let [spent, used, priced] = [0n, 0n, 0];
      for (const row of rows.slice(0, foot)) {
        if (!/^\d/.test(row["purchase cost"] ?? "")) {
          expect(rows[foot]?.note).toContain(row.item);
          continue;
        }
        priced++;
        spent += cents(row["purchase cost"] ?? "");
        used += cents(row["consumed cost"] ?? "");
        const [need, hand, buy, pack, packs, surplus] = [
          "quantity needed",
          "on hand",
          "to buy",
          "pack",
          "packs",
          "surplus",
        ].map((heading) => Number(row[heading]));
        expect(buy, row.item).toBe((need ?? 0) - (hand ?? 0) + (surplus ?? 0));
        if (row.line !== "spares" && given.spares === 0) expect((packs ?? 0) * (pack ?? 0), row.item).toBe(buy);
        // Unit prices here have at most two digits, so that a row is exact.
        expect(cents(row["purchase cost"] ?? ""), row.item).toBe(BigInt(buy ?? 0) * cents(row["unit price"] || "0"));
      }
      expect(priced).toBeGreaterThanOrEqual(3);
      expect([cents(rows[foot]?.["purchase cost"] ?? ""), cents(rows[foot]?.["consumed cost"] ?? "")]).toEqual([
        spent,
        used,
      ]);
    },
  );
});
