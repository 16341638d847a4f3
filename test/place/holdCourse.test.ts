import { describe, expect, test } from "vitest";
import { chainsOf, holdCourse } from "../../src/place/holdCourse.ts";

const unit = (serial: string, capacitance: number, leakage: number) => ({ serial, capacitance, leakage });
const none = Number.POSITIVE_INFINITY;

describe("holdCourse(bank)", () => {
  test("C = (1, 1, 3), G = (50, 2, 1): neither end bounds the way between. Source: [methods-derived] 0.429, 0.658, peak 0.693 of V", () => {
    const groups = [[unit("a", 1, 50)], [unit("b", 1, 2)], [unit("c", 3, 1)]];
    const bank = { groups, ties: "cross-tied", voltage: 1, leakageVoltage: 1, resistance: none, hold: none } as const;
    const course = holdCourse(bank);
    expect(course.charging.voltage).toBeCloseTo(3 / 7, 12);
    expect(course.holding.voltage).toBeCloseTo(1 / (1 / 50 + 1 / 2 + 1), 12);
    expect(Math.abs(course.peak.voltage - 693e-3)).toBeLessThan(5e-4);
    expect(course.peak.group).toBe(1);
    expect(course.above).toBeCloseTo(course.peak.voltage / course.holding.voltage - 1, 12);
  });

  test("alike units: nothing moves, and nothing stands above the ends", () => {
    const groups = [[unit("a", 1e-3, 1e-4)], [unit("b", 1e-3, 1e-4)]];
    const course = holdCourse({
      groups,
      ties: "strings",
      voltage: 100,
      leakageVoltage: 50,
      resistance: none,
      hold: 60,
    });
    expect(course.peak.voltage).toBe(100);
    const even = { groups: [groups.flat()], ties: "strings", voltage: 100, leakageVoltage: 50 } as const;
    const held = holdCourse({ ...even, resistance: 1e5, hold: 60 });
    expect([held.charging.voltage, held.peak.voltage]).toEqual([50, expect.closeTo(50, 9)]);
    expect(held.above).toBeLessThan(1e-9);
  });
});

test("chainsOf: one chain when cross-tied, one a string otherwise; leakage in proportion to its test voltage", () => {
  const groups = [
    [unit("a", 1, 2), unit("b", 3, 4)],
    [unit("c", 5, 6), unit("d", 7, 8)],
  ];
  const bank = { groups, leakageVoltage: 2, resistance: 9 };
  expect(chainsOf({ ...bank, ties: "cross-tied" })).toMatchObject([
    [
      { capacitance: 4, conductance: 3, resistance: 9 },
      { capacitance: 12, conductance: 7, resistance: 9 },
    ],
  ]);
  expect(chainsOf({ ...bank, ties: "strings" }).map((chain) => chain.map((stage) => stage.capacitance))).toEqual([
    [1, 3],
    [5, 7],
  ]);
});
