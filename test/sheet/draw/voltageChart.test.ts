import { describe, expect, test } from "vitest";
import { PAGE, voltageFigures } from "../../../src/sheet/draw/index.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, wellFormed } from "../../support/svg.ts";

/** Whole millivolts up to 100 kV: less is not a voltage of a bank. */
const known = fc.integer({ min: -1e8, max: 1e8 }).map((value) => value / 1e3);
const volts = fc.option(known, { nil: null });

describe("voltageFigures({ id, title, bars, limits })", () => {
  test("any bars and limits: well-formed, inside, on the page, a bar to each known value", () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ words: fc.string({ maxLength: 60 }), nominal: volts, worst: volts }), { maxLength: 40 }),
        fc.array(fc.record({ words: fc.string({ maxLength: 30 }), value: known.map((value) => Math.abs(value) + 1) }), {
          maxLength: 4,
        }),
        (bars, limits) => {
          const svgs = voltageFigures({ id: "v", title: "t", bars, limits }).map(svgOf);
          for (const svg of svgs) {
            expect(wellFormed(svg)).toBe(true);
            expect(outside(svg)).toEqual([]);
            expect(brokenNumbers(svg)).toEqual([]);
            expect(Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1])).toBeLessThanOrEqual(PAGE.height);
          }
          const all = svgs.join("");
          expect(countRole(all, "worst")).toBe(bars.filter(({ worst }) => worst !== null).length);
          expect(countRole(all, "nominal")).toBe(bars.filter(({ nominal }) => nominal !== null).length);
        },
      ),
      { numRuns: 60 },
    );
  });

  test("no bars, no figure", () => {
    expect(voltageFigures({ id: "v", title: "t", bars: [], limits: [] })).toEqual([]);
  });

  test.each(ATTACKS)("%j stays text", (attack) => {
    const bars = [{ words: attack, nominal: 1, worst: 9 }];
    const [figure] = voltageFigures({ id: "v", title: attack, bars, limits: [{ words: attack, value: 5 }] });
    const svg = svgOf(figure!);
    expect(wellFormed(svg)).toBe(true);
    expect(
      [...svg.matchAll(/<([a-z!?]+)/gi)]
        .map(([, tag]) => tag)
        .filter((tag) => !/^(svg|title|desc|path|g|text)$/.test(tag!)),
    ).toEqual([]);
  });
});
