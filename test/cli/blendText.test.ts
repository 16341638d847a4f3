// Blends as text: what to build, what stayed out, rivals, and two engines that disagree.
import { describe, expect, test } from "vitest";
import { blendText } from "../../src/cli/blendText.ts";
import type { BlendPlan } from "../../src/search/index.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";
import { UNSAFE } from "../support/fakePorts.ts";

const flat = (text: string) => text.replace(/\s+/g, " ");
const rows = [
  { price: 3, available: 6, supplier: "North" },
  { capacitance: 150, price: 4, supplier: "South" },
  { capacitance: 220, price: "", supplier: "South" },
] as const;
const plan = await blendsOf(partsOf(...rows), 1000, { within: 0.3 });
const text = (of: Partial<BlendPlan> = {}, width = 80) =>
  blendText({ plan: { ...plan, ...of }, single: undefined, width });

describe("blendText({plan, single, width})", () => {
  test("the strings with their counts, the money, the left out and the price that would win", () => {
    const out = text();
    const { strings, cost } = plan.blends[0]!;
    for (const one of strings) expect(flat(out)).toContain(`${one.part} 1s${one.parallel}p strings ${one.units}`);
    expect(out).toContain(`${cost!.total.toFixed(2)} EUR (capacitors`);
    expect(flat(out)).toContain("- c: it has no price, and what is on hand does not make a string");
    expect(flat(out)).toMatch(/c: a price below \d+\.\d\d EUR a unit would win/);
  });
  test("rivals of another kind, cheapest first, none of the best's own kind", () => {
    expect(plan.blends.length).toBeGreaterThan(1);
    expect(plan.alternativesComplete).toBe(true);
    const costs = plan.blends.map(({ cost }) => cost!.total);
    expect(costs).toEqual([...costs].sort((a, b) => a - b));
    expect(costs.at(-1)!).toBeLessThanOrEqual(costs[0]! * 1.3 + 1e-9);
    expect(new Set(plan.blends.map(({ kind }) => kind)).size).toBe(plan.blends.length);
    expect(plan.blends.slice(1).every(({ certificate }) => certificate === null)).toBe(true);
    expect(text()).toMatch(/Others that differ in parts or ties/);
  });
  test("narrow and wide: within the width and safe to print", () => {
    for (const width of [60, 80, 140]) {
      const out = text({}, width);
      expect(Math.max(...out.split("\n").map((line) => line.length)), `${width}`).toBeLessThanOrEqual(width);
      expect(UNSAFE.test(out)).toBe(false);
    }
  });
  test("nothing fits: what to loosen first", async () => {
    const none = await blendsOf(partsOf(...rows), 1000, { asked: { maxUnits: 5 } });
    const out = blendText({ plan: none, single: undefined, width: 80 });
    expect(flat(out)).toMatch(
      /NO BLEND FITS within the limits\. Each of these alone would do, the least change first: - (raise|lower)/,
    );
  });
  test("two engines that disagree: both answers, and nothing is called proven", async () => {
    const honest = await blendsOf(partsOf(...rows), 1000);
    const out = text({
      ...honest,
      status: "stopped",
      gap: null,
      lowerBound: null,
      disagreements: [
        { engine: "own search", cost: 4500, id: "b 1s7p strings" },
        { engine: "HiGHS", cost: 2600, id: "a 1s6p strings + b 1s3p strings" },
      ],
    });
    expect(flat(out)).toMatch(/TWO ENGINES DISAGREE\. Both answers are kept; nothing is proven\./);
    expect(flat(out)).toContain("- own search: b 1s7p strings, 4500 minor units of EUR");
    expect(flat(out)).toContain("- HiGHS: a 1s6p strings + b 1s3p strings, 2600 minor units of EUR");
    expect(out).not.toMatch(/cheapest is proven/);
  });
});
