// Time until a rule is cleared for good: the worked number, each breakpoint, and a slow walk down the decay as brute force.
import { describe, expect, test } from "vitest";
import { clearingVoltage, timeUntilClear } from "../../src/hazard/clear.ts";
import { ARTICLE_360, energyClass } from "../../src/hazard/energyClass.ts";

/** The last moment at which the bank is hazardous, by looking at 400 000 moments of the decay. */
function lastHazard({
  capacitance,
  resistance,
  voltage,
}: {
  capacitance: number;
  resistance: number;
  voltage: number;
}) {
  const span = resistance * capacitance * 12;
  let last = 0;
  for (let k = 0; k <= 400000; k++) {
    const seconds = (span * k) / 400000;
    const volts = voltage * Math.exp(-seconds / (resistance * capacitance));
    if (energyClass({ energy: (capacitance * volts * volts) / 2, voltage: volts }).hazardous) last = seconds;
  }
  return { last, step: span / 400000 };
}

describe("timeUntilClear({ capacitance, resistance, voltage })", () => {
  test("never hazardous: 0; open path: Infinity; at the clearing voltage itself: 0", () => {
    expect(timeUntilClear({ capacitance: 1e-9, resistance: 1e6, voltage: 1000 })).toBe(0);
    expect(timeUntilClear({ capacitance: 825e-6, resistance: Number.POSITIVE_INFINITY, voltage: 1600 })).toBe(Infinity);
    expect(timeUntilClear({ capacitance: 825e-6, resistance: 1e3, voltage: 100 })).toBe(0);
    expect(timeUntilClear({ capacitance: 825e-6, resistance: 1e3, voltage: 0 })).toBe(0);
  });

  test("through an open path at the clearing voltage itself: 0, not a product of nothing and for ever", () =>
    expect(timeUntilClear({ capacitance: 825e-6, resistance: Number.POSITIVE_INFINITY, voltage: 100 })).toBe(0));

  test("tiers in any order; a laxer tier above a stricter one never loosens it; two at one voltage count as the stricter", () => {
    expect(clearingVoltage(12.5e-6, [...ARTICLE_360].reverse())).toBeCloseTo(400, 9);
    // 8 uF: 1 J at 500 V; the laxer 50 J from 400 V on must not count, nor the 4 J that begin where the next tier does
    const odd = [
      { fromVoltage: 400, energy: 50 },
      { fromVoltage: 0, energy: 1 },
    ];
    expect(clearingVoltage(8e-6, odd)).toBeCloseTo(500, 9);
    expect(clearingVoltage(8e-6, [{ fromVoltage: 500, energy: 4 }, { fromVoltage: 500, energy: 1 }, ...odd])).toBe(500);
  });

  test("A5 of the methods page: 825 uF, 82 kohm, 1600 V: 187.565627 s, when it passes 100 V", () =>
    expect(timeUntilClear({ capacitance: 825e-6, resistance: 82000, voltage: 1600 }) / 187.565627).toBeCloseTo(1, 8));

  test.each([
    // The voltage that clears: sqrt(2E/C) inside a tier, or the tier's edge. Worked by hand from the tiers.
    ["0.1 F: 100 J, below 100 V", 0.1, Math.sqrt(200 / 0.1)],
    ["20 mF: 100 J falls just at 100 V", 0.02, 100],
    ["825 uF: the edge at 100 V", 825e-6, 100],
    ["200 uF: 1 J just at 100 V", 200e-6, 100],
    ["50 uF: 1 J inside the middle tier", 50e-6, 200],
    ["12.5 uF: 1 J would be at 400 V, where 0.25 J holds", 12.5e-6, 400],
    ["5 uF: the edge at 400 V", 5e-6, 400],
    ["1 uF: 0.25 J inside the top tier", 1e-6, Math.sqrt(0.5 / 1e-6)],
  ])("clearingVoltage: %s", (_, capacitance, volts) => expect(clearingVoltage(capacitance)).toBeCloseTo(volts, 6));

  test.each([0.1, 0.02, 825e-6, 50e-6, 12.5e-6, 5e-6, 1e-6, 0.4e-6])(
    "%d F from 3 kV: agrees with a walk down the decay",
    (capacitance) => {
      const bank = { capacitance, resistance: 1e4, voltage: 3000 };
      const { last, step } = lastHazard(bank);
      expect(Math.abs(timeUntilClear(bank) - last)).toBeLessThanOrEqual(step * 1.001);
    },
  );
});
