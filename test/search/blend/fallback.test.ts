// What the own search leaves open, HiGHS settles.
import { expect, test } from "vitest";
import { isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { settleBlend } from "../../../src/search/blend/fallback.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { tinyModel } from "../../support/blendModels.ts";

test("settleBlend: easy ones never reach HiGHS", async () => {
  const { model } = inventInstance({ parts: 20, seed: 503 });
  expect(await settleBlend(model)).toMatchObject({ provenBy: "own search", disagreements: [] });
});

test("settleBlend with no work of its own: HiGHS proves the brute-force cost: 60 models", async () => {
  let asked = 0;
  for (let seed = 0; seed < 60; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    const answer = await settleBlend(model, { work: 1 });
    expect(answer.status).toBe(best === null ? "infeasible" : "optimal");
    expect(answer.best?.cost ?? null).toBe(best);
    expect(answer.disagreements).toEqual([]);
    if (answer.provenBy === "HiGHS") asked += 1;
  }
  expect(asked).toBeGreaterThan(5);
});

test("settleBlend: a catalogue cut short agrees with the full own search", async () => {
  for (const seed of [9007, 9016, 9025]) {
    const { model } = inventInstance({ parts: 50, seed, maxTypes: 4 });
    const answer = await settleBlend(model, { work: 3 });
    const full = findBlend(model);
    expect([answer.status, answer.best?.cost]).toEqual([full.status, full.best?.cost]);
    if (answer.best !== null) expect(isFittingBlend(model, answer.best.counts)).toBe(true);
  }
}, 30_000);

test("settleBlend: out of time it is stopped, with a true bound; told to stop, it does not ask", async () => {
  const { model } = inventInstance({
    parts: 100,
    seed: 9008,
    maxTypes: 6,
    energy: [20, 200],
    stock: 0.3,
    mostStrings: 400,
    ceiling: 0.95,
  });
  const cut = await settleBlend(model, { work: 2000, seconds: 0.01 });
  expect(cut).toMatchObject({ status: "stopped", provenBy: null, disagreements: [] });
  expect(cut.lowerBound).toBeLessThanOrEqual(9_374_122);
  const told = await settleBlend(model, { stop: () => true });
  expect(told).toMatchObject({ status: "stopped", provenBy: null });
});
