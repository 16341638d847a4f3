import { describe, expect, test } from "vitest";
import { neededWords } from "../../../src/sheet/draw/costChart.tsx";
import { costFigures, costSteps, PAGE } from "../../../src/sheet/draw/index.ts";
import fc from "../../support/property.ts";
import { ATTACKS, brokenNumbers, countRole, outside, svgOf, wellFormed } from "../../support/svg.ts";

const terms = { price: 420, priceBreaks: [{ from: 50, price: 380 }], pack: 8, minimumOrder: 10, onHand: 5 };
const steps = costSteps(terms, 60);

describe("costFigures({ id, title, steps, needed, currency })", () => {
  test("a tread to each step, what the bank needs in words", () => {
    const svg = svgOf(costFigures({ id: "c", title: "t", steps, needed: 60, currency: "EUR" })[0]!);
    expect(countRole(svg, "step")).toBe(steps.length);
    expect(svg).toContain("60 needed: 56 bought, 212.80 EUR");
    expect(outside(svg)).toEqual([]);
  });

  test("nothing priced, no figure; quantities without a price are left out and said", () => {
    expect(costFigures({ id: "c", title: "t", steps: costSteps({}, 9), needed: 9, currency: "EUR" })).toEqual([]);
    expect(
      costFigures({ id: "c", title: "t", steps: costSteps({ onHand: 3 }, 9), needed: 9, currency: "EUR" }),
    ).toEqual([]);
    const some = [...costSteps({ price: 100, available: 3 }, 3), { from: 4, to: 9, bought: 9, cost: null }];
    const svg = svgOf(costFigures({ id: "c", title: "t", steps: some, needed: 9, currency: "EUR" })[0]!);
    expect(svg).toContain("Without a price: left out");
    expect(svg).toContain("9 needed: 9 bought, no price");
  });

  test("any terms: well-formed, inside, on the page", () => {
    const whole = (max: number) => fc.integer({ min: 1, max });
    fc.assert(
      fc.property(
        whole(20),
        whole(1e7),
        whole(300),
        fc.constantFrom("EUR", "JPY", "KWD"),
        (pack, price, needed, currency) => {
          const all = costSteps({ pack, price }, needed);
          for (const svg of costFigures({ id: "c", title: "t", steps: all, needed, currency }).map(svgOf)) {
            expect(wellFormed(svg)).toBe(true);
            expect(outside(svg)).toEqual([]);
            expect(brokenNumbers(svg)).toEqual([]);
            expect(Number(/viewBox="0 0 510 ([\d.]+)"/.exec(svg)?.[1])).toBeLessThanOrEqual(PAGE.height);
          }
        },
      ),
      { numRuns: 40 },
    );
  });

  test.each(ATTACKS)("%j stays text", (attack) => {
    const svg = svgOf(costFigures({ id: "c", title: attack, steps, needed: 60, currency: "EUR" })[0]!);
    expect(wellFormed(svg)).toBe(true);
    expect(
      [...svg.matchAll(/<([a-z!?]+)/gi)]
        .map(([, tag]) => tag)
        .filter((tag) => !/^(svg|title|desc|path|g|text)$/.test(tag!)),
    ).toEqual([]);
  });
});

test("neededWords(props): bought and paid, or not to be had", () => {
  expect(neededWords({ steps, needed: 3, currency: "EUR" })).toBe("3 needed: 0 bought, 0.00 EUR");
  expect(neededWords({ steps: costSteps({ price: 1, available: 2 }, 9), needed: 9, currency: "EUR" })).toBe(
    "9 needed: not to be had",
  );
});
