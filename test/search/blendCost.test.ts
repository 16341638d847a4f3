// What a blend costs: lines where anything is bought, one shipment a supplier, what has no price named.
import { expect, test } from "vitest";
import { assess } from "../../src/search/assess.ts";
import { type BuiltGroup, shipmentsOf } from "../../src/search/blendCost.ts";
import { shipmentTerms } from "../../src/search/shipmentTerms.ts";
import { partsOf, priced, termsOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: 10, voltage: 400 });
const families = priced.map((family) => ({ ...family, supplier: "North" }));
const groups = (...rows: readonly Readonly<Record<string, string | number>>[]): readonly BuiltGroup[] =>
  partsOf(...rows).map((unit) => ({
    unit,
    layout: { part: unit.part, series: 1, parallel: 4, ties: "strings" as const },
    families,
  }));
const sent = (built: readonly BuiltGroup[]) =>
  shipmentsOf(
    built,
    built.map(({ unit, layout }) => assess({ unit, layout, brief, families, currency: "EUR" })),
    { ...termsOf(brief, families), shipments: shipmentTerms({ each: 6, named: { South: 0 } }, 100) },
  );

test("shipmentsOf: each supplier once; none for what is on hand, or for one who sends free", () => {
  expect(sent(groups({ supplier: "North" }, { supplier: "North" }, { supplier: "South" }))).toEqual([
    { supplier: "North", cost: 600 },
  ]);
  expect(sent(groups({ supplier: "North", "on hand": 4 }))).toEqual([]);
  expect(sent(groups({ supplier: "North", "on hand": 3 }, {}))).toEqual([
    { supplier: "North", cost: 600 },
    { supplier: null, cost: 600 },
  ]);
});
