import { describe, expect, test } from "vitest";
import { resistorSection } from "../../../src/sheet/sections/resistors.ts";
import { BARE, FAMILIES_KNOWN, LOAD, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0]) =>
  new Map(
    tableOf({ sections: [resistorSection(sheetInput(wishes))] }, "resistors").rows.map((row) => [
      row[0]?.split(" (")[0],
      row,
    ]),
  );

describe("resistorSection(input)", () => {
  test("watts, volts and joules of a balancing element, each of what it is rated for", () => {
    const input = sheetInput();
    const balance = input.layout.balance!;
    const row = rows({}).get("balancing element")!;
    // test-2W: 2 W, half of it used, 500 V; no pulse rating, which is a blank and no pass.
    expect(row[3]).toMatch(/ of 1 W, \d/);
    expect(row[4]).toMatch(/ of 500 V, \d/);
    // Two units of 1.2 times their nominal on the stage that the hold leaves highest; that is more than an even part of the whole.
    const { charging, holding } = input.layout.share;
    const unit = input.unit.capacitance;
    const held = (2 * unit * 1.2 * holding! ** 2) / 2;
    const charged = (2 * unit * 0.8 * charging! ** 2) / 2;
    const each = Math.max(held, charged) / balance.elements;
    expect(each).toBeGreaterThan(600 / (balance.positions * balance.elements));
    expect(Number.parseFloat(row[5] ?? "")).toBeGreaterThanOrEqual(each * (1 - 1e-9));
    expect(Number.parseFloat(row[5] ?? "")).toBeLessThan(each * 1.01);
    expect(rows({ families: FAMILIES_KNOWN }).get("balancing element")?.[5]).toMatch(/ of 8 J, /);
  });

  test("the dump takes all of the energy at once: joules, volts and first watts; its ratings are blanks", () => {
    const row = rows({ brief: { dumpResistance: "1 kohm" } }).get("dump resistor")!;
    expect(row.slice(2, 6)).toEqual(["1 kohm", "4 kW of ______", "2 kV of ______", "600 J of ______"]);
    expect(rows({}).get("dump resistor")?.slice(2, 4)).toEqual([null, null]);
    expect(wordsIn(resistorSection(sheetInput({ brief: { dumpResistance: "1 kohm" } })))).toMatch(
      /2 A at its first moment, time constant 300 ms/,
    );
  });

  test("no chain: a bleed resistor of its own is a blank and is asked for", () => {
    const single = { shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } } as const;
    expect(rows(single).get("bleed resistor")?.[2]).toBeNull();
    expect(wordsIn(resistorSection(sheetInput(single)))).toMatch(/wired for good/);
    expect(rows({}).has("bleed resistor")).toBe(false);
  });

  test("isolating resistors share what one shot leaves in them; unknown without a load, or without tolerance", () => {
    const fired = sheetInput({ brief: { ...LOAD, isolating: "10 mohm" } });
    const joules = rows({ brief: { ...LOAD, isolating: "10 mohm" } }).get("isolating resistor")?.[5] as string;
    expect(Number.parseFloat(joules)).toBeGreaterThan(0);
    expect(fired.shot!.discharge.energy.isolating / 16).toBeGreaterThan(0);
    expect(rows({ brief: { isolating: "10 mohm" } }).get("isolating resistor")?.[5]).toBeNull();
    expect(rows({ unit: BARE }).get("dump resistor")?.[5]).toBeNull();
  });
});
