// The spread of the worst unit: against a closed form for two in series, and against its own reckoned chance.
import { describe, expect, test } from "vitest";
import { shareSpread } from "../../../src/search/sharing/shareSpread.ts";
import { bankOf, briefOf, UNIT } from "../../support/bank.ts";

const DRAW = { banks: 65_536, seed: 1 };
const bank = (more: object = {}, brief = briefOf()) => ({ result: bankOf({ brief, ...more }), unit: UNIT, brief });
const must = (given: Parameters<typeof shareSpread>[0]) => {
  const spread = shareSpread(given, DRAW);
  if (spread === null) throw new Error("nothing is spread");
  return spread;
};

describe("shareSpread(bank, draw)", () => {
  test("one in series, an unknown tolerance, and none at all: null", () => {
    const one = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(shareSpread({ ...bank(), result: one }, DRAW)).toBeNull();
    const { tolerance: _, ...unknown } = UNIT;
    expect(shareSpread({ ...bank(), unit: unknown }, DRAW)).toBeNull();
    expect(shareSpread({ ...bank(), unit: { ...UNIT, tolerance: { low: 0, high: 0 } } }, DRAW)).toBeNull();
  });

  test("every bank is in a bin; the bins reach from the even share to the worst corner, overshoot included", () => {
    const spread = must(bank({}, briefOf({ overshoot: "10 %" })));
    expect(spread.bins.reduce((sum, count) => sum + count, 0)).toBe(DRAW.banks);
    expect(spread.from).toBeCloseTo(2200 / 8, 9);
    // Worst share (1 + t)/(1 + t + (n - 1)(1 - t)) of methods.md 1.1, t = 0.2, n = 8.
    expect(spread.to).toBeCloseTo((2200 * 1.2) / (1.2 + 7 * 0.8), 9);
    expect(spread.median).toBeGreaterThan(spread.from);
    expect(spread.median).toBeLessThan(spread.to);
  });

  test("two in series, one in parallel: the median is that of the closed form", () => {
    const layout = { part: "x", series: 2, parallel: 1, ties: "strings" } as const;
    const brief = briefOf({ voltage: "600 V" });
    const { median, from, to } = must(bank({ layout }, brief));
    // Worst share k/(1 + k), k the greater over the smaller of two values even on [a, b]; the chance of more than k is the area
    // beyond the line, (b - k a)^2/(k (b - a)^2). Source: [methods-derived], elementary geometry.
    const [a, b] = [0.8, 1.2];
    let [low, high] = [1, b / a];
    for (let step = 0; step < 60; step += 1) {
      const k = (low + high) / 2;
      if ((b - k * a) ** 2 / (k * (b - a) ** 2) > 0.5) low = k;
      else high = k;
    }
    // Half a percent of the range is about four standard errors of the median of 65,536 draws (1/(2 f sqrt(N)), f about 1.3 over it).
    expect(Math.abs(median - (600 * low) / (1 + low))).toBeLessThan(0.006 * (to - from));
  });

  test("banks counted above the limit agree with the chance reckoned, within four standard errors", () => {
    const brief = briefOf({ derating: "75 %", voltage: "2 kV" });
    const spread = must(bank({}, brief));
    const { from, to, bins, limit, exceed, banks } = spread;
    expect(limit).toBeCloseTo(300, 9);
    const width = (to - from) / bins.length;
    const over = bins.reduce((sum, count, bin) => sum + (from + width * bin >= limit ? count : 0), 0);
    const within = bins[Math.floor((limit - from) / width)] ?? 0;
    const noise = 4 * Math.sqrt(exceed * (1 - exceed) * banks);
    expect(exceed).toBeGreaterThan(0.001);
    expect(Math.abs(over + within / 2 - exceed * banks)).toBeLessThan(noise + within / 2);
  });

  test("a measured lot stands in for the tolerance, known or not", () => {
    const lot = [0.9e-3, 0.95e-3, 1e-3, 1.05e-3, 1.1e-3];
    const { tolerance: _, ...unknown } = UNIT;
    const spread = must({ ...bank(), unit: unknown, lot });
    expect(spread.to).toBeCloseTo((2000 * 1.1) / (1.1 + 7 * 0.9), 9);
    expect(spread.law).toContain("5 measured units");
    expect(shareSpread({ ...bank(), lot: [1e-3, 1e-3, 1e-3, 1e-3, 1e-3] }, DRAW)).toBeNull();
  });

  test("the same seed draws the same banks", () => {
    expect(must(bank()).bins).toEqual(must(bank()).bins);
    expect(shareSpread(bank(), { ...DRAW, seed: 2 })?.bins).not.toEqual(must(bank()).bins);
  });
});
