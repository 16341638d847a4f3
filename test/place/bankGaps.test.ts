import { describe, expect, test } from "vitest";
import { bankGaps, gapOfGroups, shares } from "../../src/place/bankGaps.ts";

const unit = (serial: string, capacitance: number, leakage?: number) => ({
  serial,
  capacitance,
  ...(leakage === undefined ? {} : { leakage }),
});

describe("gapOfGroups(ties, groups, perStage)", () => {
  test("stages add up, strings take their worst", () => {
    expect(gapOfGroups("cross-tied", [[1, 2], [3]])).toBe(0);
    expect(
      gapOfGroups("strings", [
        [1, 3],
        [1, 1],
      ]),
    ).toBeCloseTo(0.5, 14);
    expect(gapOfGroups("cross-tied", [[1], [3]], 1e9)).toBeLessThan(1e-8);
  });
});

describe("bankGaps(groups, shape)", () => {
  const shape = { series: 2, parallel: 1, ties: "cross-tied", balanceConductance: 1e-6, leakageVoltage: 100 } as const;
  test("by hand: leakage 100 and 300 uA at 100 V beside 1 Mohm is 2 and 4 uS, so the first takes 2/3", () => {
    const gaps = bankGaps([[unit("a", 1e-3, 1e-4)], [unit("b", 1e-3, 3e-4)]], shape);
    expect(gaps.charging).toBe(0);
    expect(gaps.holding).toBeCloseTo(1 / 3, 12);
  });
  test("unknown leakage: holding is null", () => {
    expect(bankGaps([[unit("a", 1e-3)], [unit("b", 1e-3, 3e-4)]], shape).holding).toBeNull();
  });
});

describe("shares(ties, groups, perStage)", () => {
  test("of V, adding to 1 along each chain", () => {
    expect(shares("cross-tied", [[1, 1], [6]])[0]).toEqual([0.75, 0.25]);
    const strings = shares("strings", [
      [1, 3],
      [2, 2],
    ]);
    expect(strings).toEqual([
      [0.75, 0.25],
      [0.5, 0.5],
    ]);
  });
});
