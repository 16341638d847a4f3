// The box of a unit, and that the columns are fit to be a table's rules.
import { describe, expect, test } from "vitest";
import { CAPACITOR_COLUMNS, unitVolume } from "../../src/catalog/capacitor.ts";

describe("unitVolume(unit): the box it takes in square packing, m3", () => {
  test.each([
    [{}, null],
    [{ diameter: 0.05 }, null],
    [{ length: 0.1, width: 0.1 }, null],
    [{ width: 0.1, height: 0.1 }, null],
    [{ diameter: 0.05, length: 0.1 }, 2.5e-4],
    [{ diameter: 0.05, height: 0.1 }, 2.5e-4],
    [{ length: 0.2, width: 0.1, height: 0.05 }, 1e-3],
  ])("%o: %s", (unit, volume) => {
    if (volume === null) expect(unitVolume(unit)).toBe(null);
    else expect(unitVolume(unit)).toBeCloseTo(volume, 12);
  });
});

describe("CAPACITOR_COLUMNS", () => {
  const names = CAPACITOR_COLUMNS.flatMap((c) => [c.heading, ...(c.also ?? [])]);
  test("no heading and no key stands twice, all headings in lower case", () => {
    expect(new Set(names).size).toBe(names.length);
    expect(new Set(CAPACITOR_COLUMNS.map((c) => c.key)).size).toBe(CAPACITOR_COLUMNS.length);
    expect(names.filter((n) => n !== n.toLowerCase())).toEqual([]);
  });
  test("every column that the format page promises is there", () => {
    const promised =
      "part,capacitance,voltage,maker,technology,polarised,tolerance,surge voltage,derating,leakage,insulation,esr,esl,peak current,ripple current,slew,reversal,rated shots,life exponent,diameter,length,width,height,mass,price,price breaks,currency,pack,minimum order,on hand,available,supplier,order code,note,plate area,gap,permittivity,plates,breakdown field";
    expect(promised.split(",").filter((n) => !names.includes(n))).toEqual([]);
  });
  test("a range of a quantity is never empty, and starts above zero where zero means nothing", () => {
    for (const { heading, type } of CAPACITOR_COLUMNS) {
      if (type.kind !== "quantity") continue;
      expect(type.least, heading).toBeLessThan(type.most);
      if (["capacitance", "voltage", "esr", "insulation", "gap"].includes(heading))
        expect(type.least, heading).toBeGreaterThan(0);
    }
  });
});
