import { describe, expect, test } from "vitest";
import { bleedNames, chargerInk, dumpInk, earthInk, fireInk } from "../../../src/sheet/draw/circuitSides.ts";
import { countOf, together } from "../../../src/sheet/draw/ink.ts";
import { schematicOf } from "../../support/drawn.ts";

const rails = { top: 34, bottom: 300 };
const resistor = { resistance: 1, words: null };

describe("chargerInk(props, rails)", () => {
  test("the isolation stands in its order on the charger's line, a diode towards the bank", () => {
    const isolation = (["relay", "diode", "resistor"] as const).map((kind) => ({ kind, ...resistor }));
    const ink = together(chargerInk(schematicOf({ isolation }), rails));
    const marks = ink.marks.filter(({ role }) => role === "isolation");
    expect(marks.map(({ name }) => name)).toEqual(["make", "diode", "resistor"]);
    expect(marks.every(({ way }) => way === "up")).toBe(true);
    expect(marks.map(({ y }) => y)).toEqual(marks.map(({ y }) => y).toSorted((a, b) => a - b));
    expect(ink.words.map(({ text }) => text)).toEqual(expect.arrayContaining(["K1", "D1", "R1", "G1", "+", "−"]));
  });
});

test("dumpInk(props, x, rails): a contact that is closed at rest above the dump resistor, both between the rails", () => {
  const ink = together(dumpInk(schematicOf(), 0, rails));
  const [contact, dump] = ["dump-relay", "dump"].map((role) => ink.marks.find((mark) => mark.role === role)!);
  expect(contact!.name).toBe("break");
  expect(dump!.y).toBeGreaterThan(contact!.y);
  expect(ink.joints.map(({ y }) => y)).toEqual([34, 300]);
  expect(countOf(ink, "relay-coil")).toBe(1);
});

test("bleedNames(props): many bleeders are the first and one for the rest", () => {
  const named = (count: number) => bleedNames(schematicOf({ bleeds: Array.from({ length: count }, () => resistor) }));
  expect([0, 1, 2, 3, 4].map(named)).toEqual([[], ["R3"], ["R3", "R4"], ["R3", "R4, R5"], ["R3", "R4 to R6"]]);
});

test("fireInk(props, x, rails): the coil stands above the load, on one line with it", () => {
  const ink = together(fireInk(schematicOf({ load: { kind: "lamp", words: null, coil: true } }), 0, rails));
  const [coil, load] = ["load-coil", "load"].map((role) => ink.marks.find((mark) => mark.role === role)!);
  expect(coil!.x).toBe(load!.x);
  expect(coil!.y).toBeLessThan(load!.y);
});

test("earthInk(props, x, rails): at the end that is earthed, at none otherwise", () => {
  const at = (earth: "negative" | "positive" | "none" | "unknown") =>
    earthInk(schematicOf({ earth }), 0, rails).marks?.[0];
  expect(at("negative")).toMatchObject({ y: 300, way: "down" });
  expect(at("positive")).toMatchObject({ y: 34, way: "up" });
  expect(at("none")).toBeUndefined();
  expect(at("unknown")).toBeUndefined();
});
