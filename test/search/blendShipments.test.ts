// Who sends what, and what it costs: by name, by the hand, by family.
import { expect, test } from "vitest";
import { readResistors } from "../../src/catalog/index.ts";
import {
  familyGroups,
  handMatters,
  paidSenders,
  senderOf,
  sendersOf,
  shipmentOf,
} from "../../src/search/blendShipments.ts";
import { type StringType, stringType } from "../../src/search/blendString.ts";
import { shipmentTerms } from "../../src/search/shipmentTerms.ts";
import { partsOf, priced, termsOf } from "../support/blendLab.ts";
import { briefOf, must } from "../support/labParts.ts";

const families = must(
  readResistors(
    "family,tolerance [%],power [W],voltage [V],price,currency,supplier\nx,5,2,350,0.10,EUR,East\ny,5,2,350,0.05,EUR,West\nz,5,2,350,,,",
    "r.csv",
  ),
).families.map((one) => (one.family === "y" ? { ...one, onHand: 100 } : one));
const shipments = shipmentTerms({ each: 5, named: { West: 0, North: 7.5 } }, 100);
const terms = { ...termsOf(briefOf({ voltage: 1200 }), families), shipments };
const typeOf = (row: Readonly<Record<string, string | number>>): StringType =>
  stringType(partsOf(row)[0]!, terms) as StringType;

test("shipmentOf(terms, sender): by name, else the common amount; nothing unless told", () => {
  expect(shipmentOf(terms, "North")).toBe(750);
  expect(shipmentOf(terms, "West")).toBe(0);
  expect(shipmentOf(terms, "")).toBe(500);
  expect(shipmentOf(termsOf(briefOf({})), "North")).toBe(0);
  expect(senderOf({})).toBe("");
});

test("paidSenders(parts, terms): who of the catalogues costs a shipment; nobody when none does", () => {
  const parts = partsOf({ supplier: "North" }, { supplier: "West" }, { supplier: "Gone", available: 0 });
  expect(paidSenders(parts, terms)).toEqual(["North", "East", ""]);
  expect(paidSenders(parts, termsOf(briefOf({})))).toEqual([]);
});

test("sendersOf(type, strings, paid): what is on hand needs no shipment, spares and resistors counted", () => {
  const type = typeOf({ supplier: "North", "on hand": 9 });
  // Four units a string at 1.2 kV: two strings are in the drawer. West's resistors are cheaper and cost no shipment.
  expect(type.series).toBe(4);
  expect(sendersOf(type, 2, ["North", "East", ""])).toEqual([]);
  expect(sendersOf(type, 3, ["North", "East", ""])).toEqual(["North"]);
  expect(sendersOf(type, 0, ["North"])).toEqual([]);
  const east = stringType(type.unit, { ...terms, families: [families[0]!] }) as StringType;
  expect(sendersOf(east, 2, ["North", "East", ""])).toEqual(["East"]);
});

test("familyGroups(terms, paid): one group a paid sender, one for all who are free, those without a price in each", () => {
  expect(familyGroups(terms, ["East", ""]).map((group) => group.map(({ family }) => family))).toEqual([
    ["x", "z"],
    ["y", "z"],
  ]);
  expect(familyGroups(terms, [])).toEqual([families]);
  expect(familyGroups({ ...terms, families: priced }, ["East"])).toEqual([priced]);
});

test("handMatters(type, paid): only where something on hand is otherwise sent at a cost", () => {
  const type = typeOf({ supplier: "North", "on hand": 9 });
  expect(handMatters(type, ["North"])).toBe(true);
  expect(handMatters(type, ["East"])).toBe(false);
  expect(handMatters(typeOf({ supplier: "North" }), ["North"])).toBe(false);
  expect(handMatters(typeOf({ supplier: "North" }), ["West"])).toBe(true);
});
