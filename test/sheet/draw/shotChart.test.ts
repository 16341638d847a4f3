import { describe, expect, test } from "vitest";
import { traceOf } from "../../../src/pulse/index.ts";
import { PAGE, shotFigures } from "../../../src/sheet/draw/index.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, wellFormed } from "../../support/svg.ts";

/** A ringing discharge from the text-book formula: V at the start, decay, angular frequency. */
const at = (time: number) => ({
  current: 14e3 * Math.exp(-4e3 * time) * Math.sin(2e4 * time),
  voltage: 2200 * Math.exp(-4e3 * time) * Math.cos(2e4 * time),
});
const peakTime = Math.atan2(2e4, 4e3) / 2e4;
const samples = traceOf({ at, duration: 6e-4, peakTime }, 200);
const peak = { time: peakTime, current: at(peakTime).current };

describe("shotFigures({ id, title, samples, peak, reversal })", () => {
  test("a trace of the pulse layer as two lines, the peak and the reversal told and marked", () => {
    const reversal = { time: 150e-6, voltage: at(150e-6).voltage };
    const svg = svgOf(shotFigures({ id: "s", title: "t", samples, peak, reversal })[0]!);
    expect(countRole(svg, "current")).toBe(1);
    expect(countRole(svg, "voltage")).toBe(1);
    expect(svg).toContain("peak 10.4 kA at 68.7 µs");
    expect(svg).toContain("reversed to -1.2 kV at 150 µs, 54.3 % of the start");
    expect(outside(svg)).toEqual([]);
  });

  test("without peak and reversal says so; fewer than two samples are no figure", () => {
    const svg = svgOf(shotFigures({ id: "s", title: "t", samples, peak: null, reversal: null })[0]!);
    expect(svg).toContain("Peak current: not known.");
    expect(svg).toContain("Voltage: not reversed.");
    expect(shotFigures({ id: "s", title: "t", samples: samples.slice(0, 1), peak, reversal: null })).toEqual([]);
    const broken = samples.map((one) => ({ ...one, current: Number.NaN }));
    expect(shotFigures({ id: "s", title: "t", samples: broken, peak, reversal: null })).toEqual([]);
  });

  test("any samples: well-formed, inside, on the page", () => {
    const value = fc.integer({ min: -1e9, max: 1e9 }).map((whole) => whole / 1e3);
    const sample = fc.record({
      time: fc.integer({ min: 0, max: 1e6 }).map((us) => us / 1e6),
      current: value,
      voltage: value,
    });
    fc.assert(
      fc.property(fc.array(sample, { minLength: 2, maxLength: 30 }), sample, (some, mark) => {
        const figures = shotFigures({ id: "s", title: "t", samples: some, peak: mark, reversal: mark });
        for (const svg of figures.map(svgOf)) {
          expect(wellFormed(svg)).toBe(true);
          expect(brokenNumbers(svg)).toEqual([]);
          expect(Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1])).toBeLessThanOrEqual(PAGE.height);
        }
      }),
      { numRuns: 50 },
    );
  });

  test.each(ATTACKS)("%j stays text", (attack) => {
    const svg = svgOf(shotFigures({ id: "s", title: attack, samples, peak, reversal: null })[0]!);
    expect(wellFormed(svg)).toBe(true);
    expect(
      [...svg.matchAll(/<([a-z!?]+)/gi)]
        .map(([, tag]) => tag)
        .filter((tag) => !/^(svg|title|desc|path|g|text)$/.test(tag!)),
    ).toEqual([]);
  });
});
