import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { billToCsv, csvText } from "../../src/order/csv.ts";
import { billOf } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const bill = (part = UNIT.part, note = "") => {
  const unit = { ...UNIT, part, note };
  const brief = briefOf({ spares: 2 });
  const layout = bankOf({ unit, brief });
  return billOf({ layout, unit, families: FAMILIES, brief, currency: "EUR", cautions: ["Take care, it kills."] });
};
const records = (text: string): Record<string, string>[] => parse(text, { columns: true });

describe("csvText(text)", () => {
  test("formula starts get an apostrophe: = + - @ tab CR LF, full-width forms, after blanks and quotes", () => {
    for (const text of [
      "=1+1",
      "+1",
      "-1",
      "@SUM(A1)",
      "\t=1",
      "\r=1",
      "\n=1",
      "＝1",
      "＋1",
      "－1",
      "＠x",
      "  =1",
      "'=1",
      '"=1',
    ])
      expect(csvText(text).replace(/^"/, "")[0], JSON.stringify(text)).toBe("'");
  });

  test("plain text stays plain; separators, quotes and outer blanks are quoted", () => {
    expect(csvText("lug")).toBe("lug");
    expect(csvText("a,b")).toBe('"a,b"');
    expect(csvText("a;b")).toBe('"a;b"');
    expect(csvText('a "b"')).toBe('"a ""b"""');
    expect(csvText(" a")).toBe('" a"');
  });

  test("no control or direction mark is left", () => {
    expect(csvText("a\u001b[2Jb\u202ec")).toBe("a\\u{1b}[2Jb\\u{202e}c");
  });
});

describe("billToCsv(bill)", () => {
  test("another reader gets every line back, numbers as numbers", () => {
    const made = bill();
    const rows = records(billToCsv(made));
    expect(rows).toHaveLength(made.lines.length + 1 + 1);
    expect(rows[0]).toMatchObject({ item: UNIT.part, "quantity needed": "16", "on hand": "3", "unit price": "2.5" });
    for (const [i, line] of made.lines.entries())
      if (line.purchase !== null) expect(Number(rows[i]?.["purchase cost"])).toBe(line.purchase);
  });

  test("its sum row is the sum of its own purchase column, recomputed", () => {
    const rows = records(billToCsv(bill()));
    const sum = rows.findIndex((row) => row.item === "sum of the priced lines");
    const cents = rows.slice(0, sum).reduce((total, row) => {
      const cell = Number(row["purchase cost"]);
      return Number.isNaN(cell) ? total : total + Math.round(cell * 100);
    }, 0);
    expect(cents).toBeGreaterThan(0);
    expect(Number(rows[sum]?.["purchase cost"])).toBe(cents / 100);
    expect(rows[sum]?.note).toMatch(/^Left out, no price: .*lug/);
    expect(rows.at(-1)).toMatchObject({ item: "caution", note: "Take care, it kills." });
  });

  test("a hostile part name and note stay text", () => {
    const hostile = '=cmd|"/C calc"!A0';
    const text = billToCsv(bill(hostile, "-2+3\u202e\u0007"));
    const rows = records(text);
    for (const row of rows) for (const cell of Object.values(row)) expect(/^[=+\-@\t\r]/.test(cell), cell).toBe(false);
    expect(rows[0]?.item).toBe(`'${hostile}`);
    expect(rows[0]?.note).toMatch(/^'-2\+3\\u\{202e\}\\u\{7\}\. /);
  });
});
