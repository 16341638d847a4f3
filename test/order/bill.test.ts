import { expect, test } from "vitest";
import { billOf, LINE_KINDS } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

test("LINE_KINDS: every kind of line comes from some bank, and no bank gives another", () => {
  const seen = new Set<string>();
  for (const ties of ["cross-tied", "strings"] as const)
    for (const kind of ["choose", "none"] as const) {
      const brief = briefOf({ spares: 1, isolating: "0.1 ohm", section: { inductance: "1 uH" } });
      const layout = bankOf({ brief, layout: { part: "x", series: 8, parallel: 2, ties }, balance: { kind } });
      const bill = billOf({ layout, unit: UNIT, families: FAMILIES, brief, currency: "EUR", cautions: [] });
      for (const line of bill.lines) seen.add(line.line);
      expect(bill.lines.map((line) => LINE_KINDS.indexOf(line.line))).toEqual(
        bill.lines.map((line) => LINE_KINDS.indexOf(line.line)).sort((a, b) => a - b),
      );
    }
  // A shipment stands on the bill of a blend (its own test); the last kind is what a builder adds.
  expect([...seen, "shipment", "own line"].sort()).toEqual([...LINE_KINDS].sort());
});
