// Lumps against the whole chain, stage by stage, at the same corner.
import { describe, expect, test } from "vitest";
import { type Chain, courseOf, type HoldCase } from "../../../src/bank/index.ts";
import { lumped, stageAtCorner, tightLumps } from "../../../src/search/sharing/lumps.ts";
import { chance } from "../../support/random.ts";

const GIVEN: HoldCase = {
  n: 7,
  m: 3,
  C: 1e-3,
  tLow: 0.2,
  tHigh: 0.3,
  leakage: 1e-3,
  insulation: 1e7,
  R: 2e4,
  q: 0.05,
  V: 1000,
  hold: 100,
};

describe("tightLumps(case, lowOthers)", () => {
  test("counts add up to n; no empty lump", () => {
    for (const low of [0, 2, 6]) {
      const lumps = tightLumps(GIVEN, low);
      expect(lumps.reduce((sum, { count }) => sum + count, 0)).toBe(7);
      expect(Math.min(...lumps.map(({ count }) => count))).toBeGreaterThan(0);
    }
  });

  test("the course of the lumps is that of all stages, 20 random corners, through hold, dump and rest: 1e-9 of V", () => {
    const c = chance(61);
    for (let i = 0; i < 20; i++) {
      const given = {
        ...GIVEN,
        n: c.whole(2, 9),
        R: c.maybe(0.3) ? null : c.between(5e3, 2e5),
        leakage: c.between(0, 5e-3),
      };
      const low = c.whole(0, given.n - 1);
      const lumps = tightLumps(given, low);
      const leaky = (capacitance: "low" | "high") =>
        stageAtCorner(given, { capacitance, leaks: true, resistor: "low" });
      const whole: Chain = [
        stageAtCorner(given, { capacitance: "low", leaks: false, resistor: "high" }),
        ...Array.from({ length: given.n - 1 - low }, () => leaky("high")),
        ...Array.from({ length: low }, () => leaky("low")),
      ];
      const program = {
        charge: { kind: "instant" } as const,
        voltage: 1000,
        hold: c.between(1, 300),
        dump: { resistance: 10, seconds: 0.5 },
        rest: 20,
      };
      const [short, long] = [
        courseOf(
          lumps.map(({ stage }) => stage),
          program,
        ),
        courseOf(whole, program),
      ];
      for (const at of [0.5, 0.9, 1].flatMap((f) => [
        f * program.hold,
        program.hold + f * 0.5,
        program.hold + 0.5 + f * 20,
      ])) {
        const all = long.voltagesAt(at);
        let first = 0;
        for (const [k, { count }] of lumps.entries()) {
          for (let s = 0; s < count; s++)
            expect(Math.abs((short.voltagesAt(at)[k] as number) / count - (all[first + s] as number))).toBeLessThan(
              1e-6,
            );
          first += count;
        }
      }
    }
  });
});

test("lumped(count, stage): one stage is itself", () => {
  const stage = stageAtCorner(GIVEN, { capacitance: "high", leaks: true, resistor: "low" });
  expect(lumped(1, stage).stage).toEqual(stage);
});
