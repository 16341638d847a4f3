// Both ways of writing a blend as a programme mean the same as the model.
import { expect, test } from "vitest";
import { allPairs, optionForm, runForm } from "../../../src/search/blend/blendPrograms.ts";
import { blendTotals, isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { isProgramPoint, programCost } from "../../../src/search/blend/program.ts";
import { solveWithHighs } from "../../../src/search/highs.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("runForm folds equal steps into one run: 5 strings at one price and a jump are two runs", () => {
  const { program, read } = runForm(
    plainModel(6, [{ capacity: 1, most: 6, price: [5, 8, 11, 14, 17, 40], units: 2 }], { units: 12 }),
  );
  expect(program.columns.map(({ cost, most }) => [cost, most])).toEqual([
    [5, 1],
    [3, 4],
    [40, 1],
  ]);
  expect(read([1, 2, 0])).toEqual([{ option: 0, strings: 3 }]);
  expect(read([0, 0, 1])).toEqual([{ option: 0, strings: 6 }]);
});

test("optionForm holds exactly the fitting blends: 100 models, random picks of pairs", () => {
  let fitting = 0;
  for (let seed = 0; seed < 100; seed += 1) {
    const model = tinyModel(seed);
    const pairs = allPairs(model);
    const { program, read } = optionForm(model, pairs);
    for (let at = 0; at < 60; at += 1) {
      const values = pairs.map((_, p) =>
        (p * 7 + at * 13 + seed) % Math.max(2, Math.floor(pairs.length / 3)) === 0 ? 1 : 0,
      );
      const counts = read(values);
      const twice =
        new Set(pairs.filter((_, p) => values[p] === 1).map(({ option }) => option)).size <
        values.filter((v) => v === 1).length;
      const fits = !twice && isFittingBlend(model, counts);
      if (fits) fitting += 1;
      expect(isProgramPoint(program, values, 1e-12)).toBe(fits);
      if (fits) expect(programCost(program, values)).toBe(blendTotals(model, counts)!.cost);
    }
  }
  expect(fitting).toBeGreaterThan(50);
});

test("HiGHS on either form finds the brute-force cost: 40 models", async () => {
  for (let seed = 0; seed < 40; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    for (const { program, read } of [runForm(model), optionForm(model, allPairs(model))]) {
      const answer = await solveWithHighs(program);
      expect(answer.status).toBe(best === null ? "infeasible" : "optimal");
      if (answer.status !== "optimal") continue;
      expect(answer.cost).toBe(best);
      expect(isFittingBlend(model, read(answer.values))).toBe(true);
    }
  }
});
