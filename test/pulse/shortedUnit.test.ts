// shortedUnit: no neighbours first, then the worked bank both ways, and the energy balance of the equalisation.

import { describe, expect, test } from "vitest";
import { drivingCapacitance, isolationOf, type ShortCase, shortedUnit } from "../../src/pulse/shortedUnit.ts";
import fc from "../support/property.ts";
import { near } from "./near.ts";

const strings: ShortCase = { series: 4, parallel: 5, ties: "strings", capacitance: 3300e-6, voltage: 1600, worst: 400 };
const tied: ShortCase = { ...strings, ties: "cross-tied" };

describe("shortedUnit(bank)", () => {
  test("one chain alone: nothing is poured in, the survivors keep V/n, the bank falls to V(n - 1)/n", () => {
    for (const ties of ["strings", "cross-tied"] as const) {
      const result = shortedUnit({ ...strings, ties, parallel: 1 });
      expect(result.neighbours).toBe(0);
      near(result.survivorAlone, 400, 1e-14);
      near(result.bankAlone, 1200, 1e-14);
    }
  });

  test("one stage alone: all the others empty into it and nothing stands", () => {
    for (const ties of ["strings", "cross-tied"] as const) {
      const result = shortedUnit({ ...strings, ties, series: 1, worst: 1600 });
      near(result.neighbours, 4 * 0.5 * 3300e-6 * 1600 ** 2, 1e-14);
      expect(result).toMatchObject({ held: 0, survivorAlone: 0, bankAlone: 0 });
    }
  });

  test("worked, strings: 264 J own, 66 J equalising, 1500 V common, 500 V each survivor, 533.3 V when held", () => {
    const result = shortedUnit(strings);
    near(result.own, 264, 1e-12);
    near(result.neighbours, 66, 1e-12);
    near(result.bankAlone, 1500, 1e-12);
    near(result.survivorAlone, 500, 1e-12);
    near(result.held, 533.333333);
  });

  test("worked, cross-tied: the neighbours pour in 1056 J; alone the other stages keep 400 V, 1200 V in all", () => {
    const result = shortedUnit(tied);
    near(result.neighbours, 1056, 1e-12);
    expect(result).toMatchObject({ survivorAlone: 400, bankAlone: 1200 });
  });

  test("strings: energy before is energy after plus own plus equalising, for any bank at even shares", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 30 }), fc.integer({ min: 1, max: 30 }), (series, parallel) => {
        const bank: ShortCase = { ...strings, series, parallel, worst: 1600 / series };
        const { own, neighbours, bankAlone } = shortedUnit(bank);
        const unit = bank.capacitance / 2;
        const before = unit * series * parallel * bank.worst ** 2;
        const intact = (parallel - 1) * (bank.capacitance / series / 2) * bankAlone ** 2;
        const faulted = (bank.capacitance / (series - 1) / 2) * bankAlone ** 2;
        near(before, intact + faulted + own + neighbours, 1e-12);
      }),
    );
  });

  test("drivingCapacitance: the neighbours, in series with what they refill", () => {
    near(drivingCapacitance(tied), 4 * 3300e-6, 1e-14);
    near(drivingCapacitance(strings), 1 / (1 / ((4 * 3300e-6) / 4) + 1 / (3300e-6 / 3)), 1e-12);
  });
});

describe("isolationOf(bank, resistance)", () => {
  test("null without neighbours or without a resistor", () => {
    expect(isolationOf({ ...tied, parallel: 1 }, 0.05)).toBeNull();
    expect(isolationOf(tied, 0)).toBeNull();
    expect(isolationOf(tied, -1)).toBeNull();
    near(isolationOf({ ...tied, parallel: 2 }, 0.05)?.peakCurrent, 4000, 1e-12);
    expect(isolationOf(strings, 0.05)).toEqual(isolationOf(tied, 0.05));
  });

  test("worked: 50 mohm each gives 6400 A, 844.8 J in the faulted leg, 52.8 J in each other, 16 896 A^2 s", () => {
    const isolation = isolationOf(tied, 0.05);
    near(isolation?.peakCurrent, 6400, 1e-12);
    near(isolation?.faultedLegEnergy, 844.8, 1e-12);
    near(isolation?.neighbourLegEnergy, 52.8, 1e-12);
    near(isolation?.faultedLegAction, 16896, 1e-12);
  });
});
