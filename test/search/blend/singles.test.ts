// Banks of one type, and a cost beyond all.
import { expect, test } from "vitest";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { bestSingle, beyondAnyCost } from "../../../src/search/blend/singles.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("bestSingle is the brute-force optimum when one type is allowed", () => {
  for (let seed = 0; seed < 300; seed += 1) {
    const model = { ...tinyModel(seed), maxTypes: 1 };
    expect(bestSingle(model, buildPool(model, null, true))?.cost ?? null).toBe(bruteForce(model));
  }
});

test("bestSingle passes over a lazy option whose floor is too dear without building its table", () => {
  const model = plainModel(1e-3, [{ capacity: 1e-4, most: 20, price: 7 }]);
  const lazy = {
    ...model.options[0]!,
    floor: { fixed: 100, perString: 8 },
    get costs(): Float64Array {
      throw new Error("must not be read");
    },
  };
  const both = { ...model, options: [model.options[0]!, lazy] };
  expect(bestSingle(both, buildPool(both, null, false))).toEqual({ counts: [{ option: 0, strings: 10 }], cost: 70 });
});

test("beyondAnyCost is above every blend", () => {
  for (let seed = 0; seed < 100; seed += 1) {
    const model = tinyModel(seed);
    const beyond = beyondAnyCost(model, buildPool(model, null, true));
    bruteForce(model, (counts, cost) => {
      // Counts past what is of use are not the search's business.
      if (counts.length === 1) expect(cost).toBeLessThan(beyond);
    });
    expect(bruteForce(model) ?? 0).toBeLessThan(beyond);
  }
});
