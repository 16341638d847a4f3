// shortedHold: one, two stages first; then the holding formula, and a circuit stepped in time with the short at any instant.
import { describe, expect, test } from "vitest";
import type { HoldCase } from "../../src/bank/cornersHold.ts";
import { shortedHold } from "../../src/bank/shortedHold.ts";

const can: HoldCase = {
  n: 3,
  m: 4,
  C: 1e-3,
  tLow: 0.02,
  tHigh: 0.02,
  leakage: 3e-3,
  insulation: Number.POSITIVE_INFINITY,
  R: 8800,
  q: 0.05,
  V: 900,
  hold: Number.POSITIVE_INFINITY,
};

/** Kirchhoff stepped in time: the tight stage low, the others high and leaky; one of them shorts at `at` of the hold. */
function stepped({ n, m, C, tLow, tHigh, leakage, R, q, V }: HoldCase, hold: number, at: number): number {
  const [c1, c2] = [m * C * (1 - tLow), m * C * (1 + tHigh)];
  const [g1, g2] = R === null ? [0, 0] : [1 / (R * (1 + q)), 1 / (R * (1 - q))];
  let others = n - 1;
  let v = (V * c2) / (c2 + others * c1);
  const steps = 40000;
  let most = v;
  for (let k = 0; k <= steps; k++) {
    if (k === Math.round(at * steps)) {
      const lost = (V - v) / others;
      others -= 1;
      v += (lost * c2) / (c2 + others * c1);
    }
    const rest = (V - v) / others;
    // the same current through all: c1 dv + g1 v = c2 drest + g2 rest + leak, drest = -dv/others
    v += (((g2 * rest + m * leakage - g1 * v) / (c1 + c2 / others)) * hold) / steps;
    most = Math.max(most, v);
  }
  return most;
}

describe("shortedHold(given)", () => {
  test("one stage leaves nothing, two leave the whole voltage to the other", () => {
    expect(shortedHold({ ...can, n: 1 })).toBe(0);
    expect(shortedHold({ ...can, n: 2 })).toBe(900);
  });

  // Source: [methods-derived] 2.1 with n - 1 = 2: V_1 (1/1.05 + 1/0.95) = 900/0.95 + 4 x 3 mA x 8800 ohm.
  test("for ever: the holding formula of the stages left, 525.2 V on 450 V units", () => {
    const expected = (900 / 0.95 + 4 * 3e-3 * 8800) / (1 / 1.05 + 1 / 0.95);
    expect(expected).toBeCloseTo(525.2, 1);
    expect(shortedHold(can)).toBeCloseTo(expected, 6);
  });

  test("60 s at 840 V with 15 kohm: 478.1 V where the charge alone gives 428.4 V", () => {
    const finite = { ...can, m: 2, R: 15e3, V: 840, hold: 60 };
    expect(shortedHold(finite)).toBeCloseTo(478.1, 1);
  });

  test.each([0, 0.3, 0.7, 0.999])("a short at %d of the hold never stands higher than told", (at) => {
    for (const wide of [can, { ...can, m: 1, tLow: 0.1, tHigh: 0.5, R: 30e3, leakage: 4e-3 }])
      for (const hold of [20, 200]) {
        const told = shortedHold({ ...wide, hold });
        expect(stepped(wide, hold, at)).toBeLessThanOrEqual(told * (1 + 1e-4));
      }
  });

  test("late in a long hold the charge of the shorted one can be the worst, and is told", () => {
    const wide = { ...can, m: 1, tLow: 0.1, tHigh: 0.5, R: 30e3, leakage: 8e-3 };
    const told = shortedHold({ ...wide, hold: 2000 });
    expect(told).toBeCloseTo(stepped(wide, 2000, 0.9999), 0);
  });
});
