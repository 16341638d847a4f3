// The cheapest accepted blend against every mix tried, with strings beyond the need.
import { expect, test } from "vitest";
import { findAccepted } from "../../../src/search/blend/accepted.ts";
import { blendTotals, isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import type { BlendCount, BlendModel } from "../../../src/search/blend/model.ts";
import { shippedModel, tinyModel } from "../../support/blendModels.ts";

/** Every blend there is, surplus and all. */
function everyBlend({ options, maxTypes }: BlendModel, visit: (counts: readonly BlendCount[]) => void): void {
  const go = (from: number, path: readonly BlendCount[]): void => {
    if (path.length > 0) visit(path);
    if (path.length === maxTypes) return;
    for (let option = from; option < options.length; option += 1)
      for (let strings = 1; strings <= options[option]!.maxStrings; strings += 1)
        go(option + 1, [...path, { option, strings }]);
  };
  go(0, []);
}

/** Some rule that no row says: an even number of strings, more than one part, a lucky sum. */
const rules: readonly ((counts: readonly BlendCount[]) => boolean)[] = [
  (counts) => counts.reduce((sum, { strings }) => sum + strings, 0) % 2 === 0,
  (counts) => counts.length > 1,
  (counts) => counts.reduce((sum, { option, strings }) => sum + option * strings, 0) % 5 === 2,
  () => false,
];

test("findAccepted: least cost of the blends that a rule lets through, 150 models, four rules, with and without shipments", () => {
  const seen = { optimal: 0, infeasible: 0, stopped: 0, rejected: 0 };
  for (let seed = 0; seed < 150; seed += 1) {
    const model = seed % 2 === 0 ? tinyModel(seed) : shippedModel(seed);
    const known = findBlend(model).best?.cost;
    if (known === undefined) continue;
    for (const rule of rules) {
      let least: number | null = null;
      everyBlend(model, (counts) => {
        if (!isFittingBlend(model, counts) || !rule(counts)) return;
        const { cost } = blendTotals(model, counts)!;
        if (least === null || cost < least) least = cost;
      });
      const answer = findAccepted(model, known, ({ counts }) => rule(counts), { most: 1e6 });
      seen[answer.status] += 1;
      seen.rejected += answer.rejected;
      if (answer.status === "stopped") continue;
      expect(answer.best?.cost ?? null, `seed ${seed}`).toBe(least);
      if (answer.best !== null) {
        expect(rule(answer.best.counts)).toBe(true);
        expect(isFittingBlend(model, answer.best.counts)).toBe(true);
        expect(answer.lowerBound).toBe(answer.best.cost);
      }
    }
  }
  expect(seen.optimal).toBeGreaterThan(100);
  expect(seen.infeasible).toBeGreaterThan(50);
  expect(seen.rejected).toBeGreaterThan(1000);
});

test("findAccepted: stopped by the count of judgements, the work or the caller, with a bound that holds", () => {
  const model = tinyModel(2);
  const known = findBlend(model).best!.cost;
  expect(findAccepted(model, known, () => false, { most: 1 })).toMatchObject({ status: "stopped", best: null });
  expect(findAccepted(model, known, () => false, { work: 1 })).toMatchObject({ status: "stopped", lowerBound: known });
  expect(findAccepted(model, known, () => false, { stop: () => true }).status).toBe("stopped");
});
