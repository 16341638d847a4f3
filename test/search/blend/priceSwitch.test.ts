// The price at which the choice changes: just below it stays, just beyond it goes.
import { expect, test } from "vitest";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { bestWith, priceSwitches, withSettled } from "../../../src/search/blend/priceSwitch.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

const model = plainModel(6, [
  { capacity: 1, most: 6, price: 10, units: 2 },
  { capacity: 2, most: 3, price: 22, units: 4 },
]);

test("priceSwitches by hand: 6 of the first for 60; at half a cent more a unit the second (66) wins", () => {
  const cheapest = findBlend(model).best!;
  expect(cheapest.cost).toBe(60);
  const [rise] = priceSwitches(model, cheapest, [0]);
  // Every pair of strings given up (4 units) costs 2 more: half a cent a unit.
  expect(rise).toMatchObject({ option: 0, move: "rise", perUnit: 0.5, proven: true });
  const [fall] = priceSwitches(model, cheapest, [1]);
  expect(fall).toMatchObject({ option: 1, move: "fall", perUnit: 0.5, proven: true });
});

test("priceSwitches against trying everything with the price moved: 100 models, every option", () => {
  let met = 0;
  for (let seed = 0; seed < 100; seed += 1) {
    const tiny = tinyModel(seed);
    const best = findBlend(tiny).best;
    if (best === null) continue;
    tiny.options.forEach((option, at) => {
      for (const { move, perUnit, next } of priceSwitches(tiny, best, [at])) {
        met += 1;
        const sign = move === "rise" ? 1 : -1;
        // Brute force with a price for each string beside the table; costs need not be whole there.
        const cheapestAt = (change: number): number => {
          let low = Number.POSITIVE_INFINITY;
          bruteForce(tiny, (counts, cost) => {
            const strings = counts.find((c) => c.option === at)?.strings ?? 0;
            low = Math.min(low, cost + sign * change * option.units * strings);
          });
          return low;
        };
        const at0 = (counts: typeof best.counts) => counts.find((c) => c.option === at)?.strings ?? 0;
        const stays = best.cost + sign * perUnit * option.units * at0(best.counts);
        const goes = next.cost + sign * perUnit * option.units * at0(next.counts);
        expect(goes).toBeCloseTo(stays, 6);
        expect(cheapestAt(perUnit)).toBeCloseTo(stays, 6);
      }
    });
  }
  expect(met).toBeGreaterThan(60);
});

test("bestWith and withSettled: a count beyond a ceiling, one that does alone, none at all", () => {
  const tight = { ...model, ceilings: { ...model.ceilings, units: 11 } };
  expect(withSettled(tight, { option: 0, strings: 6 })).toBeNull();
  expect(bestWith(model, { option: 0, strings: 6 })).toMatchObject({ blend: { cost: 60 }, proven: true });
  expect(bestWith(model, { option: 0, strings: 0 })).toMatchObject({ blend: { cost: 66 }, proven: true });
  expect(bestWith({ ...model, maxTypes: 1 }, { option: 0, strings: 3 })).toEqual({ blend: null, proven: true });
});
