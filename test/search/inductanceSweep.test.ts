// The sweep over the loop's inductance, against the closed form at each inductance and the lossless bound.
import { describe, expect, test } from "vitest";
import { peaksOf } from "../../src/pulse/index.ts";
import { inductanceSweep } from "../../src/search/inductanceSweep.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const unit = { ...UNIT, esr: 0.05, esl: 30e-9 };
const sweep = (load: object | undefined, more: object = {}, of = unit) => {
  const brief = briefOf({ ...(load === undefined ? {} : { load }), ...more });
  return inductanceSweep({ layout: bankOf({ unit: of, brief }), unit: of, brief }, 21);
};

describe("inductanceSweep({ layout, unit, brief }, count)", () => {
  test("without a load, and with a current that is given: null", () => {
    expect(sweep(undefined)).toBeNull();
    expect(sweep({ current: 10, time: "1 ms" })).toBeNull();
    expect(
      sweep({
        recorded: [
          [0, 0],
          [1e-3, 10],
          [2e-3, 0],
        ],
      }),
    ).toBeNull();
  });

  test("a coil: each peak is the closed form's, a tenth to ten times the loop's own inductance, here in the middle", () => {
    const found = sweep({ resistance: "50 mohm", inductance: "20 uH" });
    // Eight in series of 1 mF and 50 mohm, two in parallel.
    const [capacitance, resistance] = [1e-3 / 4, 0.05 * 4 + 0.05];
    const own = 30e-9 * 4 + 20e-6;
    expect(found?.here).toBeCloseTo(own, 15);
    expect(found?.bound).toBe(false);
    expect(found?.points).toHaveLength(21);
    expect(found?.points[0]?.inductance).toBeCloseTo(own / 10, 15);
    expect(found?.points[10]?.inductance).toBeCloseTo(own, 15);
    for (const { inductance, peak, lossless } of found?.points ?? []) {
      const closed = peaksOf({ capacitance, inductance, resistance }, 2000);
      // 1e-9: both are closed forms, apart by rounding alone.
      expect(closed.ok && Math.abs(peak / closed.value.peakCurrent - 1)).toBeLessThan(1e-9);
      expect(lossless / (2000 * Math.sqrt(capacitance / inductance))).toBeCloseTo(1, 12);
      expect(peak).toBeLessThan(lossless);
    }
  });

  test("no resistance at all: the peaks are the lossless bound itself", () => {
    const bare = { ...UNIT, esr: 0, esl: 0 };
    const found = sweep({ inductance: "20 uH" }, { bus: { resistance: 0, inductance: 0 } }, bare);
    for (const { peak, lossless } of found?.points ?? []) expect(peak / lossless).toBeCloseTo(1, 9);
    expect(found?.points).toHaveLength(21);
  });

  test("nothing known of the inductance: usual values are swept, and every peak is a bound", () => {
    const found = sweep({ resistance: "50 mohm" }, {}, UNIT as typeof unit);
    expect(found?.here).toBeNull();
    expect(found?.bound).toBe(true);
    expect(found?.points[0]?.inductance).toBeCloseTo(20e-9, 15);
    expect(found?.points.at(-1)?.inductance).toBeCloseTo(2e-6, 12);
    expect(found?.points.every(({ peak, lossless }) => peak < lossless)).toBe(true);
  });

  test("a lamp: the peak falls with the inductance, below the lossless bound", () => {
    const lamp = { bore: "10 mm", arc: "150 mm", gas: "xenon", pressure: "60 kPa" };
    const peaks = sweep({ inductance: "40 uH", lamp })?.points ?? [];
    expect(peaks).toHaveLength(21);
    for (const [index, { peak, lossless }] of peaks.entries()) {
      expect(peak).toBeLessThan(lossless);
      if (index > 0) expect(peak).toBeLessThan(peaks[index - 1]?.peak ?? 0);
    }
  });
});
