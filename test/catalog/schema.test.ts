// Capacitors as data: what the readers make passes, what no column allows does not.
import { readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import { describe, expect, test } from "vitest";
import { readCapacitors } from "../../src/catalog/index.ts";
import { readCapacitorData } from "../../src/catalog/schema.ts";

const CATALOGS = resolve(import.meta.dirname, "../../catalogs");
const parts = readdirSync(CATALOGS)
  .filter((name) => name.endsWith(".csv") && !/resistors|fuses/.test(name))
  .flatMap((name) => {
    const read = readCapacitors(readFileSync(resolve(CATALOGS, name), "utf8"), name);
    return read.ok ? read.value.parts : [];
  });
const fields = (input: unknown): readonly (string | undefined)[] => {
  const read = readCapacitorData(input);
  return read.ok ? [] : read.refusals.map((r) => r.place.field);
};
const one = { part: "a", capacitance: 1e-3, voltage: 450 };

describe("readCapacitorData(input)", () => {
  test("not an object: refused, not thrown", () => {
    for (const input of [null, 7, "a", [], undefined]) expect(readCapacitorData(input).ok).toBe(false);
  });
  test.each([
    ["no capacitance", { part: "a", voltage: 450 }, ["capacitance"]],
    ["voltage 0", { ...one, voltage: 0 }, ["voltage"]],
    ["voltage NaN", { ...one, voltage: Number.NaN }, ["voltage"]],
    ["1e300 V", { ...one, voltage: 1e300 }, ["voltage"]],
    ["tolerance of 100 % downwards", { ...one, tolerance: { low: 1, high: 0 } }, ["tolerance.low"]],
    ["a pack of a half", { ...one, pack: 0.5 }, ["pack"]],
    ["three faults at once", { part: "a", capacitance: -1, voltage: -1, esr: 0 }, ["capacitance", "voltage", "esr"]],
  ])("%s", (_what, input, expected) => expect(fields(input)).toEqual(expected));
  test("a key that is no column is refused", () => expect(readCapacitorData({ ...one, volts: 1 }).ok).toBe(false));
  test("the least that must be there is enough", () => expect(readCapacitorData(one).ok).toBe(true));
  test("every capacitor of the shipped catalogues passes as it was read", () => {
    expect(parts.length).toBeGreaterThan(60);
    for (const part of parts) expect([part.part, fields(part)]).toEqual([part.part, []]);
  });
});
