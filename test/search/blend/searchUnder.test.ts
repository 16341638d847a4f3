// Every kind of blend under a threshold is told of, with its cheapest cost.
import { expect, test } from "vitest";
import { optionsUsed } from "../../../src/search/blend/alternatives.ts";
import { tidyCounts } from "../../../src/search/blend/evaluate.ts";
import { coreUnder, searchUnder } from "../../../src/search/blend/searchUnder.ts";
import { bruteForce, kinds } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { tinyModel } from "../../support/blendModels.ts";

test("searchUnder: 200 models, half as dear again as the cheapest: each kind at its cheapest", () => {
  let met = 0;
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const below = Math.ceil(best * 1.5) + 1;
    const told = new Map<string, number>();
    const complete = searchUnder(model, below, (found, cost) => {
      const kind = optionsUsed(tidyCounts(found));
      told.set(kind, Math.min(cost, told.get(kind) ?? cost));
      return below;
    });
    expect(complete).toBe(true);
    for (const [kind, cost] of kinds(model, below)) {
      met += 1;
      expect(told.get(kind)).toBeLessThanOrEqual(cost);
    }
  }
  expect(met).toBeGreaterThan(100);
});

test("searchUnder says when its work ran out; coreUnder grows with the threshold", () => {
  const { model } = inventInstance({ parts: 50, seed: 3, maxTypes: 4 });
  const cheap = coreUnder(model, 1);
  expect(searchUnder(model, 1e9, () => 1e9, { work: 500 })).toBe(false);
  expect(coreUnder(model, 1e9).pairs).toBeGreaterThan(cheap.pairs);
});
