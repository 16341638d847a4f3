import { describe, expect, test } from "vitest";
import { figuresSection } from "../../../src/sheet/sections/figures.ts";
import { BARE, LOAD, placedIn, RATED, sheetInput, tableOf } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0] = {}) =>
  tableOf({ sections: [figuresSection(sheetInput(wishes))] }, "ten-figures").rows;
const value = (name: RegExp, wishes: Parameters<typeof sheetInput>[0] = {}) =>
  rows(wishes).find((row) => name.test(row[1] ?? ""));

describe("figuresSection(input)", () => {
  test("all ten are there, in order", () => {
    const numbers = rows().map((row) => Number(row[0]));
    expect(new Set(numbers)).toEqual(new Set([1, 2, 3, 4, 5, 6, 7, 8, 9, 10]));
    expect([...numbers].sort((a, b) => a - b)).toEqual(numbers);
  });

  test("a figure with its limit: stress of rated, reversal, the unit's peak, shots", () => {
    expect(value(/worst unit while charging/)?.[3]).toMatch(/^\d+(\.\d+)? % of 400 V rated$/);
    expect(value(/^peak current of a unit/, { brief: LOAD })?.[3]).toBe("limit 3 kA");
    expect(value(/shots used/)).toEqual(["7", "shots used of rated", null, "10000 rated; from the shot log"]);
    expect(value(/energy into the shorted unit/)?.[3]).toMatch(/its own .* from others .* case contains 500 J$/);
  });

  test("the force on the bus follows from its shape and the short's current; without either it is a blank", () => {
    const bus = { shape: "flat bars", length: "1 m", width: "50 mm", gap: "2 mm", thickness: "3 mm" };
    const fired = { brief: { ...LOAD, bus } };
    const amperes = sheetInput(fired).faults.find(({ id }) => id === "load-short")!.peakCurrentWorst!;
    const force = Number.parseFloat(value(/force on the bus/, fired)![2]!);
    expect(force / ((1.25663706127e-6 * amperes ** 2) / 0.1)).toBeCloseTo(1, 2);
    expect(value(/force on the bus/)?.[2]).toBeNull();
  });

  test("unknown stays a blank that says what is missing", () => {
    expect(value(/stored energy at the highest/, { unit: BARE })?.[2]).toBeNull();
    expect(value(/charger run on/)?.slice(2)).toEqual([null, "the charger's highest voltage is not known"]);
    expect(value(/^reversal/)?.slice(2)).toEqual([null, "needs a load in the brief"]);
    expect(value(/peak fault current/, { unit: BARE })?.[2]).toBeNull();
  });

  test("measured units: bank capacitance, peak and bleed time follow from them", () => {
    const bare = sheetInput({ brief: LOAD });
    const placed = placedIn(bare);
    const positions = placed.positions.map((p) => ({ ...p, capacitance: 1.1e-3 }));
    const input = { ...bare, placed: { ...placed, positions } };
    const of = (from: typeof bare) =>
      tableOf({ sections: [figuresSection(from)] }, "ten-figures").rows.filter((row) => row[0] === "9");
    const [nominal, measured] = [of(bare), of(input)];
    // 1.1 mF each, 2 in parallel, 8 in series.
    expect(measured[0]?.slice(1, 3)).toEqual(["capacitance, predicted from the measured units", "275 µF"]);
    const heavier = sheetInput({ brief: LOAD, unit: { ...RATED, capacitance: 1.1e-3 } }).shot!.discharge.peakCurrent;
    expect(Number.parseFloat(measured[3]![2]!)).toBeCloseTo(heavier / 1000, 2);
    const seconds = (rows: typeof nominal) => Number.parseFloat(rows[4]![2]!);
    expect(seconds(measured) / seconds(nominal)).toBeCloseTo(1.1, 3);
  });

  test("the bank's resistance follows from the units' ESR with no load in the brief", () => {
    // 50 mohm, 8 in series, 2 in parallel.
    expect(value(/^resistance of the bank/)?.[2]).toBe("200 mohm");
    expect(value(/^resistance of the bank/, { unit: BARE })?.[2]).toBeNull();
  });

  test("predictions to be compared have room for the reading", () => {
    const nine = rows({ brief: LOAD }).filter((row) => row[0] === "9");
    expect(nine).toHaveLength(5);
    expect(nine.every((row) => row[3] === "read: ______")).toBe(true);
    expect(nine[0]?.[2]).toBe("250 µF");
  });
});
