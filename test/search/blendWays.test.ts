// The ways to have strings of one part: one as a rule, more where the hand or the resistors spare a shipment.
import { expect, test } from "vitest";
import type { StringType } from "../../src/search/blendString.ts";
import { stringsCost } from "../../src/search/blendString.ts";
import { costTable, typesOf, waysOf } from "../../src/search/blendWays.ts";
import { shipmentTerms } from "../../src/search/shipmentTerms.ts";
import { partsOf, priced, termsOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: 10, voltage: 1200 });
const families = [
  { ...priced[0]!, family: "x", supplier: "East" },
  { ...priced[0]!, family: "y", supplier: "North" },
];
const terms = { ...termsOf(brief, families), shipments: shipmentTerms({ each: 5 }, 100) };
const senders = ["North", "East"];

test("typesOf(unit, terms, senders): one type a sender of resistors; single units take none; a reason where none is safe", () => {
  const [unit] = partsOf({ supplier: "North" });
  expect(
    (typesOf(unit!, terms, senders) as readonly StringType[]).map((type) => type.terms.families[0]!.family),
  ).toEqual(["x", "y"]);
  expect(typesOf(unit!, terms, [])).toHaveLength(1);
  expect(typesOf(partsOf({ voltage: 1600 })[0]!, terms, senders)).toHaveLength(1);
  expect(typesOf(partsOf({ tolerance: "" })[0]!, terms, senders)).toMatchObject({ reason: "tolerance-unknown" });
});

test("waysOf: from the hand as far as it goes, and bought from one string on; both at their own cost", () => {
  const [unit] = partsOf({ supplier: "North", "on hand": 9 });
  const [type] = typesOf(unit!, terms, senders) as readonly StringType[];
  const ways = waysOf(type!, 6, { partIndex: 3, senders }, brief);
  expect(ways.map(({ maxStrings, suppliers, partIndex }) => [maxStrings, suppliers, partIndex])).toEqual([
    [2, [1], 3],
    [6, [0, 1], 3],
  ]);
  for (const { costs, maxStrings } of ways)
    for (let x = 1; x <= maxStrings; x += 1) expect(costs[x]).toBeLessThanOrEqual(stringsCost(type!, x)!);
  expect(costTable(type!, 4, (x) => x === 3)[1]).toBe(stringsCost(type!, 3));
});

test("waysOf: nobody and a supplier without a name are two sets of senders", () => {
  const [unit] = partsOf({ voltage: 1600, "on hand": 2 });
  const [type] = typesOf(unit!, terms, [""]) as readonly StringType[];
  const ways = waysOf(type!, 3, { partIndex: 0, senders: [""] }, brief);
  expect(ways.map(({ maxStrings, suppliers }) => [maxStrings, suppliers ?? []])).toEqual([
    [2, []],
    [3, [0]],
  ]);
});
