import { describe, expect, test } from "vitest";
import { courseOf } from "../../src/bank/course.ts";
import { chargedVolts, chargerOff, chargerOn, heldVolts, type StageModel } from "../../src/place/diagnoseModel.ts";
import { seeded } from "../../src/place/random.ts";

const stage = (capacitance: number, conductance: number, resistance = Number.POSITIVE_INFINITY): StageModel => ({
  capacitance,
  conductance,
  resistance,
});

describe("chargedVolts and heldVolts (stages, bank)", () => {
  test("by hand: 1 and 3 mF share 3 to 1; 2 and 4 uS hold 2 to 1", () => {
    expect(chargedVolts([stage(1e-3, 0), stage(3e-3, 0)], 400)[1]).toBeCloseTo(100, 9);
    const held = heldVolts([stage(1e-3, 1e-6, 1e6), stage(3e-3, 3e-6, 1e6)], 300);
    expect(held[0]).toBeCloseTo(200, 9);
  });
  test("stages that conduct nothing take the voltage of those that do", () => {
    expect(heldVolts([stage(1e-3, 1e-6), stage(1e-3, 0)], 100)).toEqual([0, 100]);
    expect(heldVolts([stage(1e-3, 0), stage(1e-3, 0)], 100)).toEqual([50, 50]);
  });
});

describe("chargerOn(stages, bank, times)", () => {
  test("within 2e-4 of V of the exact modal course of the bank layer, 30 chains, 0 to 10 time constants", () => {
    const random = seeded(2);
    for (let k = 0; k < 30; k++) {
      const stages = Array.from({ length: 2 + (k % 7) }, () =>
        stage(1e-2 * (0.8 + 0.4 * random()), 1e-6 * 10 ** (2 * random()), 10e3 * 10 ** random()),
      );
      const times = [0, 5, 60, 300, 1000, 4000];
      const exact = courseOf(
        stages.map((s) => ({ ...s, leakageCurrent: 0 })),
        { charge: { kind: "instant" }, voltage: 2000, hold: 5000, dump: null, rest: 0 },
      );
      for (const [t, row] of chargerOn(stages, 2000, times).entries()) {
        const right = exact.voltagesAt(times[t]!);
        for (const [i, v] of row.volts.entries()) expect(Math.abs(v - right[i]!)).toBeLessThan(0.4);
        expect(row.volts.reduce((s, v) => s + v, 0)).toBeCloseTo(2000, 6);
      }
    }
  });
  test("an endless hold ends in the holding share, and its current is V/sum(1/G)", () => {
    const stages = [stage(1e-3, 2e-6), stage(1e-3, 4e-6)];
    const [end] = chargerOn(stages, 300, [Number.POSITIVE_INFINITY]);
    expect(end!.volts[0]).toBeCloseTo(200, 9);
    expect(end!.current).toBeCloseTo(4e-4, 12);
  });
});

describe("chargerOff(stages, bank, times)", () => {
  test("each stage falls by itself: 1/e after one time constant", () => {
    const stages = [stage(1e-3, 1e-6, 1e6), stage(1e-3, 0)];
    const row = chargerOff(stages, 200, [500])[0]!;
    expect(row.volts[0]).toBeCloseTo(100 / Math.E, 9);
    expect(row.volts[1]).toBe(100);
  });
});
