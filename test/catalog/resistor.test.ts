// Resistor families: defaults, contradictions, and the values that a range of a series holds.
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { describe, expect, test } from "vitest";
import { DEFAULT_FAMILY, readResistors } from "../../src/catalog/resistor.ts";

const families = (
  rows: string,
  heading = "family,series,lowest [ohm],highest [ohm],tolerance [%],power [W],voltage [V]",
) => {
  const made = readResistors(`${heading}\n${rows}\n`, "r.csv");
  if (!made.ok) throw new Error(JSON.stringify(made.refusals));
  return made.value;
};

describe("DEFAULT_FAMILY", () => {
  test("E24, 1 ohm to 10 Mohm, 5 %, 2 W at half, 350 V, unpriced, assumed", () => {
    expect(DEFAULT_FAMILY).toMatchObject({
      series: "E24",
      lowest: 1,
      highest: 1e7,
      tolerance: 0.05,
      power: 2,
      derating: 0.5,
      voltage: 350,
      assumed: true,
    });
    expect(DEFAULT_FAMILY.price).toBe(undefined);
    // Seven decades of 24, and 10 Mohm itself.
    expect(DEFAULT_FAMILY.values.length).toBe(7 * 24 + 1);
  });
});

describe("readResistors(text, file)", () => {
  test("blank series, range and derating: E24, 1 ohm to 10 Mohm, half the watts", () =>
    expect(families("a,,,,5,2,350").families[0]).toMatchObject({
      series: "E24",
      lowest: 1,
      highest: 1e7,
      derating: 0.5,
      assumed: false,
    }));
  test("values of the range, ends included, rising; the largest step is known", () => {
    const [one] = families("a,E3,10,1000,5,2,350").families;
    expect(one?.values).toEqual([10, 22, 47, 100, 220, 470, 1000]);
    expect(one?.step).toBeCloseTo(2.2, 12);
  });
  test("lowest above highest, and a range without a value: contradictions with their line", () => {
    const made = families("a,E24,100,10,5,2,350\nb,E3,11,21,5,2,350\nc,E3,10,21,5,2,350");
    expect(made.faults.map((f) => `${f.code} ${f.place.line}`)).toEqual(["contradiction 2", "contradiction 3"]);
    expect(made.families.map((f) => f.family)).toEqual(["c"]);
  });
  test("an uneven tolerance counts by its larger side", () =>
    expect(families("a,E24,1,10,-5/+10,2,350").families[0]?.tolerance).toBeCloseTo(0.1, 12));
  test("a name twice: the second is told", () =>
    expect(families("a,,,,5,2,350\na,,,,1,2,350").faults.map((f) => `${f.code} ${f.place.line}`)).toEqual([
      "duplicate-part 3",
    ]));
  test("tolerance, watts and volts must be given", () => {
    expect(families("a,,,,5,,350").faults.map((f) => `${f.code} ${f.place.field}`)).toEqual(["missing-value power"]);
    const made = readResistors("family,tolerance [%],power [W]\na,5,2\n", "r.csv");
    expect(!made.ok && made.refusals.map((r) => `${r.code} ${r.place.field}`)).toEqual(["missing-heading voltage"]);
  });
  test("47K3 and 4R7 as limits; E25 is no series", () => {
    expect(families("a,E96,4R7,47K3,1,2,350").families[0]).toMatchObject({ lowest: 4.7, highest: 47300 });
    expect(families("a,E25,1,10,1,2,350").faults[0]?.code).toBe("bad-choice");
  });
  test("stock of a family is not promised for any one value", () => {
    const heading = "family,tolerance [%],power [W],voltage [V],on hand,available";
    expect(families("a,5,2,350,40,60", heading).families[0]).not.toHaveProperty("onHand");
  });
  test("catalogs/resistors.csv: ten, no fault", () => {
    const made = readResistors(
      readFileSync(resolve(import.meta.dirname, "../../catalogs/resistors.csv"), "utf8"),
      "resistors.csv",
    );
    expect(made.ok && [made.value.families.length, made.value.faults, made.value.notes]).toEqual([10, [], []]);
  });
});
