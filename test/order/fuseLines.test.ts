import { describe, expect, test } from "vitest";
import type { Fuse } from "../../src/catalog/index.ts";
import { fuseLines, isolatingLines } from "../../src/order/fuseLines.ts";
import { billOf } from "../../src/order/index.ts";
import { fittedFuse } from "../../src/search/index.ts";
import { FAMILIES } from "../support/bank.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

const brief = shotBrief({ isolating: "0.1 ohm" });
const layout = shotLayout(brief, { series: 1, parallel: 4, ties: "strings" });
const row = { fuse: "good", voltage: 3000, melting: 900, clearing: 900, currency: "EUR", price: 950, pack: 5 } as Fuse;
const choice = fittedFuse({ layout, unit: FILM, brief }, [row]);

describe("fuseLines(layout, choice)", () => {
  test("bought in packs: four needed, five bought, 47.50 EUR", () => {
    expect(fuseLines(layout, choice)).toMatchObject([
      { line: "fuses", item: "good", needed: 4, toBuy: 5, surplus: 1, purchase: 47.5, state: "priced" },
    ]);
    expect(fuseLines(layout, null)).toEqual([]);
    expect(fuseLines(layout, { ...choice, chosen: null })).toEqual([]);
  });

  test("in the total only when asked; the open line gives way to the chosen one", () => {
    const input = { layout, unit: FILM, families: FAMILIES, brief, currency: "EUR", cautions: [] };
    const [without, withFuse] = [billOf(input), billOf({ ...input, fuse: choice })];
    expect(without.lines.find(({ line }) => line === "fuses")?.state).toBe("to be chosen");
    expect((withFuse.totals.purchase as number) - (without.totals.purchase as number)).toBeCloseTo(47.5, 9);
    expect(withFuse.lines.filter(({ line }) => line === "fuses")).toHaveLength(1);
  });
});

test("isolatingLines(layout, brief): one to a unit, none when not asked", () => {
  expect(isolatingLines(layout, brief, "EUR")).toMatchObject([{ needed: 4, value: "100 mohm", state: "to be chosen" }]);
  const priced = shotBrief({ isolating: "0.1 ohm", isolatingPrice: 2.5, section: { inductance: "1 uH", price: 4 } });
  expect(isolatingLines(layout, priced, "EUR")).toMatchObject([
    { line: "isolating resistors", needed: 4, unitPrice: 2.5, purchase: 10, state: "priced" },
    { line: "section inductances", needed: 4, unitPrice: 4, purchase: 16, state: "priced" },
  ]);
  expect(isolatingLines(layout, priced, null)[0]).toMatchObject({ purchase: null, state: "to be chosen" });
  expect(isolatingLines(layout, shotBrief(), "EUR")).toEqual([]);
});
