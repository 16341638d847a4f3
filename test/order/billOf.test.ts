import { describe, expect, test } from "vitest";
import { billOf } from "../../src/order/index.ts";
import { bankOf, briefOf, DEFAULT_FAMILY, FAMILIES, UNIT } from "../support/bank.ts";

describe("billOf(input)", () => {
  test("units, spares, resistors and clamps come first, then what is forgotten; totals agree with the layout's own cost", () => {
    const brief = briefOf({ spares: 2 });
    const layout = bankOf({ brief });
    const bill = billOf({ layout, unit: UNIT, families: FAMILIES, brief, currency: "EUR", cautions: [] });
    expect(bill.lines.slice(0, 4).map((line) => line.line)).toEqual([
      "units",
      "spares",
      "balancing resistors",
      "clamp diodes",
    ]);
    expect(bill.totals.purchase).toBe(layout.cost?.total);
    expect(bill.totals.pricedLines).toBe(3);
    expect(bill.layout).toBe(layout.id);
  });

  test("the assumed family is found although no catalogue has it", () => {
    const layout = bankOf({ families: [DEFAULT_FAMILY] });
    const brief = briefOf();
    const bill = billOf({ layout, unit: UNIT, families: [DEFAULT_FAMILY], brief, currency: "EUR", cautions: [] });
    expect(bill.lines[1]?.rating).toBe("2 W, 350 V, +-5 %");
    expect(bill.totals.unpriced[0]).toMatch(/assumed 2 W/);
  });
});
