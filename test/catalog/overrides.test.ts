// Values set by hand: read as a catalogue reads them, marked as such, never half laid over, and the catalogue's parts left as they are.
import { describe, expect, test } from "vitest";
import { OVERRIDABLE, overridden, readOverrides, withOverrides } from "../../src/catalog/overrides.ts";
import { readCapacitors } from "../../src/catalog/readCapacitors.ts";
import { RULES, stateOf } from "../../src/catalog/states.ts";

const HEAD = "part,capacitance [uF],voltage [V],polarised,surge voltage [V],price,currency\n";
const read = readCapacitors(`${HEAD}one,100,400,yes,450,2.50,EUR\ntwo,200,300,no,,,\n`, "a.csv");
if (!read.ok) throw new Error("must read");
const { parts } = read.value;
const [one, two] = parts as [(typeof parts)[number], (typeof parts)[number]];

describe("overridden(unit, texts)", () => {
  test("nothing set: the same values", () => {
    expect(overridden(one, {})).toEqual({ ok: true, value: one });
  });
  test("values in their units, each marked as set by hand; the part itself is not touched", () => {
    const before = structuredClone(one);
    const laid = overridden(one, { esr: "20 mohm", tolerance: "-10/+30 %", price: "3.10", polarised: "no" });
    if (!laid.ok) throw new Error("must lay");
    expect(laid.value).toMatchObject({ esr: 0.02, price: 310, polarised: false });
    expect(laid.value.tolerance).toEqual({ low: 0.1, high: 0.3 });
    expect(stateOf(laid.value, "esr")).toEqual({ state: "assumed", rule: RULES.hand });
    expect(stateOf(laid.value, "voltage")).toEqual({ state: "datasheet" });
    expect(one).toEqual(before);
  });
  test("an assumed leakage follows the new voltage; one that is set stays", () => {
    expect(stateOf(one, "leakage")).toMatchObject({ rule: RULES.leakage });
    const higher = overridden(one, { capacitance: "1000 uF" });
    // 0.01 x 1000 x 400 uA, by the rule of the catalogue.
    expect(higher.ok && higher.value.leakage).toBeCloseTo(4e-3, 12);
    const set = overridden(one, { leakage: "12 uA", voltage: "350 V" });
    expect(set.ok && set.value.leakage).toBeCloseTo(12e-6, 12);
  });
  test.each([
    ["a bare number where a unit is needed", { capacitance: "1e9 F" }, "out-of-range"],
    ["another quantity", { esr: "12 V" }, undefined],
    ["no such heading", { colour: "red" }, "unknown-column-name"],
    ["a name", { part: "x" }, "unknown-column-name"],
    ["a surge voltage below the rating", { voltage: "500 V" }, "contradiction"],
  ])("%s is refused whole, with its part", (_name, texts, code) => {
    const laid = overridden(one, { mass: "5 g", ...texts } as unknown as Record<string, string>);
    expect(laid.ok).toBe(false);
    if (laid.ok) return;
    if (code !== undefined) expect(laid.refusals[0]?.code).toBe(code);
    expect(laid.refusals[0]?.place.field).toMatch(/^one, /);
  });
  test("no column that names, or that others follow from, can be set", () => {
    const keys = OVERRIDABLE.map(({ key }) => key);
    for (const key of ["part", "currency", "technology", "plateArea", "measured"]) expect(keys).not.toContain(key);
    expect(keys).toContain("leakage");
  });
});

describe("withOverrides(parts, overrides, file)", () => {
  test("none: the very same parts", () => {
    expect(withOverrides(parts, {}, "o.json").parts).toBe(parts);
    expect(withOverrides(parts, { one: {} }, "o.json")).toEqual({ parts, faults: [], count: 0 });
  });
  test("one part's; the others are the same objects; a bad one and an unknown part are told with their file", () => {
    const laid = withOverrides(
      parts,
      { two: { mass: "80 g" }, one: { mass: "much" }, three: { mass: "1 g" } },
      "o.json",
    );
    expect(laid.count).toBe(1);
    expect(laid.parts[0]).toBe(one);
    expect(laid.parts[1]).toMatchObject({ mass: 0.08, capacitance: two.capacitance });
    expect(laid.faults.map(({ place }) => [place.file, place.field])).toEqual([
      ["o.json", "one, mass"],
      ["o.json", "three"],
    ]);
  });
});

test("readOverrides(json, file): texts by heading by part; anything else is refused with its place", () => {
  expect(readOverrides({ version: 1, parts: { a: { esr: "1 ohm" } } }, "o.json")).toEqual({
    ok: true,
    value: { a: { esr: "1 ohm" } },
  });
  for (const bad of [null, [], {}, { parts: [] }, { parts: { a: 1 } }, { parts: { a: { esr: 1 } } }])
    expect(readOverrides(bad, "o.json")).toMatchObject({
      ok: false,
      refusals: [{ code: "bad-value", place: { file: "o.json" } }],
    });
});
