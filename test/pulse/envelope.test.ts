// envelope: refusals, nulls, and that no point inside the ranges lies outside the envelope of a linear loop.

import { describe, expect, test } from "vitest";
import { type Corner, envelopeOf, type LoopSpread } from "../../src/pulse/envelope.ts";
import { peaksOf } from "../../src/pulse/peaks.ts";
import fc from "../support/property.ts";
import { codesOf, got, near } from "./near.ts";

const figuresOf = ({ capacitance, esr, inductance, resistance }: Corner) =>
  peaksOf({ capacitance, inductance, resistance: esr + resistance }, 3000);
const spread: LoopSpread = {
  capacitance: { low: 400e-6, nominal: 500e-6, high: 600e-6 },
  esr: { low: 0.005, nominal: 0.01, high: 0.02 },
  inductance: { low: 1e-6, nominal: 2e-6, high: 3e-6 },
  resistance: { low: 0.03, nominal: 0.03, high: 0.03 },
};

describe("envelopeOf(spread, linear, figuresOf)", () => {
  test("no spread at all: low, nominal and high are one", () => {
    const point = (value: number) => ({ low: value, nominal: value, high: value });
    const flat = { capacitance: point(5e-4), esr: point(0.01), inductance: point(2e-6), resistance: point(0.03) };
    const { peakCurrent, proven } = got(envelopeOf(flat, true, figuresOf));
    near(peakCurrent.low, 31280.4767);
    expect(peakCurrent.high).toBe(peakCurrent.low);
    expect(proven).toBe(true);
  });

  test("a corner that is refused refuses the whole", () => {
    const bad = { ...spread, inductance: { low: -1, nominal: 2e-6, high: 3e-6 } };
    expect(codesOf(envelopeOf(bad, true, figuresOf))).toEqual(["pulse.loop.inductance"]);
  });

  test("a lossless corner has no upper end to its action", () => {
    const bare = { ...spread, esr: { low: 0, nominal: 0.01, high: 0.02 }, resistance: { low: 0, nominal: 0, high: 0 } };
    const { action } = got(envelopeOf(bare, true, figuresOf));
    expect(action.high).toBeNull();
    near(action.low, (0.5 * 400e-6 * 9e6) / 0.02);
  });

  test("no point inside the ranges of a linear loop lies outside", () => {
    const part = fc.double({ min: 0, max: 1, noNaN: true });
    const wide = {
      ...spread,
      inductance: { low: 1e-7, nominal: 2e-6, high: 2e-5 },
      resistance: { low: 0.001, nominal: 0.03, high: 1 },
    };
    const envelope = got(envelopeOf(wide, true, figuresOf));
    fc.assert(
      fc.property(part, part, part, part, (c, e, l, r) => {
        const at = ({ low, high }: { low: number; high: number }, x: number): number => low + (high - low) * x;
        const figures = got(
          figuresOf({
            capacitance: at(wide.capacitance, c),
            esr: at(wide.esr, e),
            inductance: at(wide.inductance, l),
            resistance: at(wide.resistance, r),
          }),
        );
        for (const name of ["peakCurrent", "peakTime", "reversal", "action"] as const) {
          expect(figures[name] ?? 0).toBeGreaterThanOrEqual((envelope[name].low ?? 0) * (1 - 1e-12));
          expect(figures[name] ?? 0).toBeLessThanOrEqual((envelope[name].high ?? 0) * (1 + 1e-12));
        }
      }),
      { numRuns: 500 },
    );
  });
});
