import { describe, expect, test } from "vitest";
import { timesWords } from "../../../src/sheet/draw/bleedChart.tsx";
import { bleedFigures, PAGE } from "../../../src/sheet/draw/index.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, wellFormed } from "../../support/svg.ts";

const curve = (words: string, voltage: number, tau: number) => ({
  words,
  points: [
    { time: 0, voltage },
    { time: 20 * tau, voltage: voltage * Math.exp(-20) },
  ],
});

describe("bleedFigures({ id, title, curves, thresholds })", () => {
  test("a line and a key to each path, with its times; rounded up, so that no wait is told too short", () => {
    const svg = svgOf(
      bleedFigures({
        id: "b",
        title: "t",
        curves: [curve("all chains", 2200, 113), curve("dump", 2200, 5)],
        thresholds: [{ words: "touch-safe", value: 60 }],
      })[0]!,
    );
    expect(countRole(svg, "curve")).toBe(2);
    expect(countRole(svg, "key")).toBe(2);
    expect(svg).toContain("A: all chains; 60 V after 408 s");
    expect(113 * Math.log(2200 / 60)).toBeLessThan(408);
    expect(svg).toContain("B: dump; 60 V after 18.1 s");
  });

  test("nothing to draw, no figure", () => {
    expect(bleedFigures({ id: "b", title: "t", curves: [], thresholds: [] })).toEqual([]);
    expect(bleedFigures({ id: "b", title: "t", curves: [{ words: "x", points: [] }], thresholds: [] })).toEqual([]);
  });

  test("any paths and thresholds: well-formed, inside, on the page", () => {
    const value = fc.integer({ min: 1, max: 1e8 }).map((micro) => micro / 1e3);
    fc.assert(
      fc.property(
        fc.array(fc.record({ words: fc.string({ maxLength: 60 }), voltage: value, tau: value }), {
          minLength: 1,
          maxLength: 6,
        }),
        fc.array(fc.record({ words: fc.string({ maxLength: 60 }), value }), { maxLength: 4 }),
        (paths, thresholds) => {
          const curves = paths.map(({ words, voltage, tau }) => curve(words, voltage, tau));
          for (const figure of bleedFigures({ id: "b", title: "t", curves, thresholds })) {
            const svg = svgOf(figure);
            expect(wellFormed(svg)).toBe(true);
            expect(outside(svg)).toEqual([]);
            expect(brokenNumbers(svg)).toEqual([]);
            expect(Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1])).toBeLessThanOrEqual(PAGE.height);
          }
        },
      ),
      { numRuns: 60 },
    );
  });

  test.each(ATTACKS)("%j stays text", (attack) => {
    const props = { curves: [curve(attack, 9, 1)], thresholds: [{ words: attack, value: 5 }] };
    const svg = svgOf(bleedFigures({ id: "b", title: attack, ...props })[0]!);
    expect(wellFormed(svg)).toBe(true);
    expect(
      [...svg.matchAll(/<([a-z!?]+)/gi)]
        .map(([, tag]) => tag)
        .filter((tag) => !/^(svg|title|desc|path|g|text)$/.test(tag!)),
    ).toEqual([]);
  });
});

test("timesWords(curve, thresholds): what is not reached is said, what is not known too", () => {
  const thresholds = [{ words: "safe", value: 60 }];
  const open = {
    words: "open",
    points: [
      { time: 0, voltage: 900 },
      { time: 9, voltage: 900 },
    ],
  };
  expect(timesWords(open, thresholds)).toBe("not down to 60 V in the time told");
  expect(timesWords({ words: "x", points: [] }, thresholds)).toBe("not known");
  expect(timesWords(curve("low", 50, 1), thresholds)).toBe("60 V after 0 s");
});
