import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import type { Layout } from "../../src/bank/index.ts";
import { type Bill, billOf, billText, readEditedBill, withEdits } from "../../src/order/index.ts";
import { BUILDERS_COLUMNS } from "../../src/order/marks.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";
import fc from "../support/property.ts";

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

  test("saved again with decimal commas, or with noughts after the point, nothing is edited", () => {
    const odd = made({ price: 640 });
    const copy = edit(odd, (rows) => rows);
    const table = copy.replaceAll('","', '";"').replace(/"(\d+)\.(\d+)"/g, (_, whole, part) => `"${whole},${part}"`);
    expect(table).toContain('"6,4"');
    expect(told(joined(odd, table))).toEqual([]);
    expect(joined(odd, table).totals).toEqual(odd.totals);
    const padded = copy.replace(/"(\d+)\.(\d+)"/g, (_, whole, part) => `"${whole}.${part}0"`);
    expect(told(joined(odd, padded))).toEqual([]);
  });

  test("a price alone leaves the packs of units and spares together as they were", () => {
    const bill = made();
    const [units, spares] = [lineOf(bill, "units"), lineOf(bill, "spares")];
    const now = joined(
      bill,
      edit(bill, (rows) => at(rows, "units", { "unit price": "5" })),
    );
    for (const [kind, before] of [
      ["units", units],
      ["spares", spares],
    ] as const) {
      const { toBuy, packs, surplus, note } = before!;
      expect(lineOf(now, kind)).toMatchObject({ toBuy, packs, surplus, note, unitPrice: 5, purchase: 5 * toBuy! });
    }
    // 8 x 2 + 2 - 3 on hand = 15: two packs of ten, bought once.
    expect(units!.toBuy! + spares!.toBuy!).toBe(20);
  });

  test("what was chosen for another demand is kept, and to be checked again; what was left alone is made anew in silence", () => {
    const copy = edit(made(), (rows) =>
      at(rows, "dump relay", { value: "2.5 kV, normally closed", "unit price": "80" }),
    );
    const now = made();
    const lines = now.lines.map((line) => ({ ...line, rating: line.rating.replaceAll("2 kV", "3 kV") }));
    const bill = joined({ ...now, lines }, copy);
    expect(lineOf(bill, "dump relay")).toMatchObject({
      value: "2.5 kV, normally closed",
      rating: "at least 3 kV dc",
      purchase: 80,
    });
    expect(bill.changes?.filter(({ kind }) => kind === "check again")).toEqual([
      expect.objectContaining({
        line: "dump relay",
        heading: "rating",
        made: "at least 3 kV dc",
        read: "at least 2 kV dc",
      }),
    ]);
  });

  test("a price that was written beside another part is not taken over, and that is told; a note is kept", () => {
    const copy = edit(made(), (rows) =>
      at(rows, "units", { "unit price": "2.10", "order code": "Z-9", note: "ask Ada" }),
    );
    const now = made({ price: 300 });
    const lines = now.lines.map((line) => (line.line === "units" ? { ...line, item: "another-1000-400" } : line));
    const bill = joined({ ...now, lines }, copy);
    expect(lineOf(bill, "units")).toMatchObject({
      item: "another-1000-400",
      unitPrice: 3,
      orderCode: "X-1",
      note: "ask Ada",
    });
    expect(told(bill)).toEqual([
      ["not taken over", "units", "unit price"],
      ["not taken over", "units", "order code"],
      ["kept", "units", "note"],
    ]);
    // With the part named by the builder the row is the builder's.
    const named = edit(made(), (rows) => at(rows, "units", { item: "surplus-1000-400", "unit price": "2.10" }));
    expect(lineOf(joined({ ...now, lines }, named), "units")).toMatchObject({
      item: "surplus-1000-400",
      unitPrice: 2.1,
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

describe("any edit", () => {
  const fresh = made();
  const kinds = fresh.lines.map(({ line }) => line);
  const texts: Readonly<Record<string, fc.Arbitrary<string>>> = {
    number: fc.integer({ min: 1, max: 9999 }).map(String),
    money: fc.integer({ min: 0, max: 99_999 }).map((cents) => (cents / 100).toFixed(2)),
    text: fc.constantFrom("M6 ring", "=1+1", "<b>", "a;b", 'say "x"', "ü, ö", "12", "-", "@x", "to be bought"),
    currency: fc.constant("EUR"),
  };
  const edits = fc.array(
    fc
      .record({ kind: fc.constantFrom(...kinds), column: fc.constantFrom(...BUILDERS_COLUMNS) })
      .chain(({ kind, column }) =>
        (texts[column.key === "currency" ? "currency" : column.kind] as fc.Arbitrary<string>).map((text) => ({
          kind,
          column,
          text,
        })),
      ),
    { minLength: 1, maxLength: 5 },
  );

  test("is in the new bill as it was written, costs what its cells say, and stays when read again", () => {
    fc.assert(
      fc.property(edits, (list) => {
        const copy = edit(fresh, (rows) =>
          list.reduce((now, { kind, column, text }) => at(now, kind, { [column.heading]: text }), rows),
        );
        const bill = joined(fresh, copy);
        const last = new Map(list.map((one) => [`${one.kind} ${one.column.key}`, one]));
        for (const { kind, column, text } of last.values()) {
          const cell = lineOf(bill, kind)?.[column.key];
          expect(column.kind === "text" ? cell : Number(cell)).toBe(column.kind === "text" ? text : Number(text));
        }
        // Units and spares are one purchase: what is written beside one moves the other.
        const together = new Set(["units", "spares"]);
        const untouched = kinds.filter(
          (kind) => !list.some((one) => one.kind === kind || (together.has(one.kind) && together.has(kind))),
        );
        for (const kind of untouched)
          expect({ ...lineOf(bill, kind), extra: undefined }).toEqual({ ...lineOf(fresh, kind), extra: undefined });
        const cents = bill.lines.reduce((sum, { purchase }) => sum + Math.round((purchase ?? 0) * 100), 0);
        expect(Math.round((bill.totals.purchase ?? Number.NaN) * 100)).toBe(cents);
        const written = billText(bill, "csv");
        expect(billText(joined(fresh, written), "csv")).toBe(written);
      }),
      { numRuns: 60 },
    );
  });

  test("payloads in own headings, own lines and cells end no cell, start no tag and run nowhere", () => {
    const payloads = [
      "=cmd|'/C calc'!A0",
      "<script>alert(1)</script>",
      "a|b`c`",
      "[x](https://y)",
      "\u202etxt",
      "+1",
      "]]>--><svg onload=x>",
    ];
    for (const payload of payloads) {
      const copy = edit(fresh, (rows) => [
        ...at(rows, "lugs", { note: payload, supplier: payload }).map((row) => ({
          ...row,
          [`own ${payload}`]: payload,
        })),
        { item: payload, line: "own line", "quantity needed": "1" },
      ]);
      const bill = joined(fresh, copy);
      expect(bill.lines.at(-1)?.line).toBe("own line");
      expect(billText(bill, "html")).not.toMatch(/<(script|svg)|\u202e/);
      const markdown = billText(bill, "md");
      const widths = markdown
        .split("\n")
        .filter((line) => line.startsWith("|"))
        .map((line) => line.replace(/\\\|/g, "").split("|").length);
      expect(new Set(widths).size).toBe(1);
      expect(markdown).not.toMatch(/<(script|svg)|\]\(https:/);
      for (const row of parse(billText(bill, "csv"), { columns: false }) as string[][])
        for (const cell of row) expect(cell).not.toMatch(/^[=+\-@\t\r]/);
    }
  });
});
