// The bill of a blend adds up its groups' own bills; what the bank has once stands once, for the whole of it.
import { expect, test } from "vitest";
import { billOf } from "../../src/order/billOf.ts";
import { blendBillOf } from "../../src/order/blendBill.ts";
import { assessBuiltBlend } from "../../src/search/index.ts";
import { partsOf, priced } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: 100, voltage: 1200, spares: 1 });
const units = partsOf({ supplier: "North", price: 3 }, { supplier: "South", voltage: 1600, price: 41 });
const blend = assessBuiltBlend({
  groups: units.map((unit, at) => ({
    unit,
    layout: { part: unit.part, series: [4, 1][at]!, parallel: 3, ties: at === 0 ? "cross-tied" : "strings" },
    families: priced,
  })),
  brief,
  shipments: { each: 6.5 },
  currency: "EUR",
  minor: 100,
});
const bill = blendBillOf({ blend, units, families: priced, brief, currency: "EUR", cautions: ["mind"] });

test("blendBillOf: purchase is the blend's own cost, shipments included; consumed is no more", () => {
  expect(bill.totals.purchase).toBe(blend.cost!.total);
  expect(bill.totals.consumed!).toBeLessThanOrEqual(bill.totals.purchase!);
  // Units of North and South; the family has no supplier, and its shipment is the third.
  expect(bill.lines.filter(({ line }) => line === "shipment").map(({ purchase }) => purchase)).toEqual([6.5, 6.5, 6.5]);
  expect(bill.cautions).toEqual(["mind"]);
});

test("blendBillOf: small things as the groups' own bills count them, once-only things once and for all the energy", () => {
  const alone = blend.strings.map((layout, at) =>
    billOf({ layout, unit: units[at]!, families: priced, brief, currency: "EUR", cautions: [] }),
  );
  for (const kind of ["units", "spares", "lugs", "fuses", "shorting links", "bus bars"] as const) {
    const sum = (lines: typeof bill.lines) =>
      lines.filter(({ line }) => line === kind).reduce((total, { needed }) => total + (needed ?? 0), 0);
    expect(sum(bill.lines), kind).toBe(alone.reduce((total, { lines }) => total + sum(lines), 0));
  }
  for (const kind of ["dump resistor", "dump relay", "earthing stick", "screen", "test resistor"] as const)
    expect(
      bill.lines.filter(({ line }) => line === kind),
      kind,
    ).toHaveLength(1);
  const joules = (blend.capacitance.high! * 1200 ** 2) / 2;
  const rated = Number(/at least ([\d.]+) J/.exec(bill.lines.find(({ line }) => line === "dump resistor")!.rating)![1]);
  expect(rated).toBeGreaterThanOrEqual(joules * (1 - 1e-9));
  expect(rated).toBeLessThan(joules * 1.01);
});
