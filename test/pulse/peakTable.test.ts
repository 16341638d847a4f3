// peakTable: the table against the exact form it stands for, everywhere and at its seams.
import { describe, expect, test } from "vitest";
import { peakFactor } from "../../src/pulse/damping.ts";
import { peakCurrentOf } from "../../src/pulse/peaks.ts";
import { quickBankPeak, quickPeakFactor } from "../../src/pulse/peakTable.ts";

describe("quickPeakFactor(damping)", () => {
  test("lossless, critical, the end of the table, past it, and not a number", () => {
    expect(Math.abs(quickPeakFactor(0) - 1)).toBeLessThan(1e-12);
    expect(Math.abs(quickPeakFactor(1) * Math.E - 1)).toBeLessThan(1e-12);
    expect(quickPeakFactor(8)).toBe(peakFactor(8));
    expect(quickPeakFactor(1e6)).toBe(peakFactor(1e6));
    expect(quickPeakFactor(Number.NaN)).toBeNaN();
  });

  test("is within 1e-12 of the exact form at 200,000 places of the table and on both sides of every seam", () => {
    let worst = 0;
    const look = (damping: number): void => {
      worst = Math.max(worst, Math.abs(quickPeakFactor(damping) / peakFactor(damping) - 1));
    };
    for (let k = 0; k < 200_000; k++) look((k / 200_000) * 8);
    for (let piece = 1; piece <= 4096; piece++) {
      look(piece / 512);
      look((piece / 512) * (1 - 2 ** -52));
    }
    expect(worst).toBeLessThan(1e-12);
  });
});

describe("quickBankPeak(layout, outside)", () => {
  const layout = { capacitance: 3300e-6, esr: 0.02, esl: 25e-9, series: 4, parallel: 5, voltage: 1600 };

  test("with no inductance anywhere is V/R", () => {
    const peak = quickBankPeak({ ...layout, esl: 0 }, { resistance: 0.004, inductance: 0 });
    expect(peak).toBeCloseTo(1600 / (0.016 + 0.004), 8);
  });

  test("is peakCurrentOf of the bank's loop", () => {
    for (const resistance of [0, 0.01, 0.3, 5]) {
      const outside = { resistance, inductance: 60e-9 };
      const loop = {
        capacitance: (3300e-6 * 5) / 4,
        resistance: (0.02 * 4) / 5 + resistance,
        inductance: (25e-9 * 4) / 5 + 60e-9,
      };
      expect(Math.abs(quickBankPeak(layout, outside) / peakCurrentOf(loop, 1600) - 1)).toBeLessThan(1e-12);
    }
  });
});
