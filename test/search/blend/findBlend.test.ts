// The cheapest blend, held against trying everything and against general solvers.

import { describe, expect, test } from "vitest";
import { solve as solveWithYalps } from "yalps";
import { allPairs, optionForm } from "../../../src/search/blend/blendPrograms.ts";
import { certificatePairs, certify } from "../../../src/search/blend/certificate.ts";
import { blendTotals, isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import type { BlendModel } from "../../../src/search/blend/model.ts";
import { lazyOption } from "../../../src/search/blend/tabulate.ts";
import { solveWithHighs } from "../../../src/search/highs.ts";
import { solveWhole } from "../../../src/search/solve.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";
import { tierProgram } from "../../support/blendTiers.ts";

function expectSettled(model: BlendModel, best: number | null): void {
  const answer = findBlend(model);
  expect(answer.status).toBe(best === null ? "infeasible" : "optimal");
  expect(answer.best?.cost ?? null).toBe(best);
  if (answer.best === null) return;
  expect(isFittingBlend(model, answer.best.counts)).toBe(true);
  expect(blendTotals(model, answer.best.counts)!.cost).toBe(best);
  expect(answer).toMatchObject({ lowerBound: best, gap: 0 });
}

describe("edges", () => {
  test("no options, none in stock, an exact fit, a zero ceiling, a free bank", () => {
    expectSettled(plainModel(1e-3, [], { types: 2 }), null);
    expectSettled(plainModel(1e-3, [{ capacity: 1, most: 0, price: 1 }]), null);
    expectSettled(plainModel(500e-6, [{ capacity: 50e-6, most: 10, price: 3 }]), 30);
    expectSettled(plainModel(500e-6, [{ capacity: 50e-6, most: 9, price: 3 }]), null);
    expectSettled(plainModel(1e-6, [{ capacity: 1e-6, most: 1, price: 3, volume: 1 }], { volume: 0 }), null);
    expectSettled(plainModel(1e-6, [{ capacity: 1e-6, most: 1, price: 3 }], { volume: 0, mass: 0 }), 3);
    expectSettled(plainModel(1e-6, [{ capacity: 1e-6, most: 1, price: 0 }]), 0);
  });

  test("farads and picofarads give the same counts", () => {
    const scaled = (by: number) =>
      plainModel(7.3 * by, [
        { capacity: by, most: 5, price: 11 },
        { capacity: 0.7 * by, most: 9, price: 7 },
      ]);
    const counts = [1, 1e-6, 1e-12].map((by) => findBlend(scaled(by)).best!.counts);
    expect(counts[1]).toEqual(counts[0]);
    expect(counts[2]).toEqual(counts[0]);
  });
});

describe("brute force", () => {
  test("1,000 tiny models with shared parts, open ceilings and stepped prices", () => {
    let impossible = 0;
    for (let seed = 0; seed < 1000; seed += 1) {
      const model = tinyModel(seed);
      const best = bruteForce(model);
      expectSettled(model, best);
      if (best === null) impossible += 1;
    }
    expect(impossible).toBeGreaterThan(100);
    expect(impossible).toBeLessThan(900);
  });

  test("200 invented catalogues of 5 and 8 parts with packs, price breaks, stock, minimum orders", () => {
    for (let seed = 1; seed <= 200; seed += 1) {
      const { model } = inventInstance({ parts: seed % 2 === 0 ? 5 : 8, seed, mostStrings: 24 });
      expectSettled(model, bruteForce(model));
    }
  });
});

describe("general solvers", () => {
  test("HiGHS, zero gap, tier variables: 30 catalogues of 20 to 200 parts cost the same to the cent", async () => {
    for (let seed = 1; seed <= 30; seed += 1) {
      const instance = inventInstance({
        parts: seed % 10 === 0 ? 200 : [20, 50, 20, 100][seed % 4]!,
        seed: 6000 + seed,
      });
      const own = findBlend(instance.model);
      const other = await solveWithHighs(tierProgram(instance, true), { seconds: 30 });
      expect(other.status).toBe(own.status);
      if (other.status === "optimal") expect(Math.round(other.cost)).toBe(own.best!.cost);
    }
  }, 60_000);

  test("javascript-lp-solver on every core of up to 120 pairs, and yalps, cost the same", () => {
    let cores = 0;
    for (let seed = 1; seed <= 60; seed += 1) {
      const { model } = inventInstance({ parts: [5, 20, 100][seed % 3]!, seed: 7000 + seed });
      const own = findBlend(model);
      const pairs = own.status === "infeasible" ? allPairs(model) : certificatePairs(certify(model, own)!);
      if (pairs.length === 0 || pairs.length > 120) continue;
      cores += 1;
      const { program } = optionForm(model, pairs);
      const claim = solveWhole(program);
      // The core holds what could be cheaper than the optimum; the optimum itself may lie outside when the bound settled it.
      if (claim.status === "claimed") expect(claim.cost).toBe(Math.max(claim.cost, own.best!.cost));
      else expect(claim.status).toBe("claimed infeasible");
      const third = solveWithYalps(
        {
          direction: "minimize",
          objective: "goal",
          constraints: Object.fromEntries(
            program.rows.map((row, at) => [
              `r${at}`,
              {
                ...(Number.isFinite(row.least) ? { min: row.least } : {}),
                ...(Number.isFinite(row.most) ? { max: row.most } : {}),
              },
            ]),
          ),
          variables: program.columns.map((column, c) => [
            `v${c}`,
            Object.fromEntries([
              ["goal", column.cost],
              ...program.rows.flatMap((row, at) =>
                row.terms.filter(([k]) => k === c).map(([, v]) => [`r${at}`, v] as const),
              ),
            ]),
          ]),
          binaries: true,
        },
        { maxIterations: 1e6, timeout: 20_000 },
      );
      expect(third.status).toBe(claim.status === "claimed" ? "optimal" : "infeasible");
      if (claim.status === "claimed") expect(Math.round(third.result)).toBe(claim.cost);
    }
    expect(cores).toBeGreaterThan(25);
  }, 60_000);
});

describe("when stopped", () => {
  const hard = inventInstance({
    parts: 100,
    seed: 9008,
    maxTypes: 6,
    energy: [20, 200],
    stock: 0.3,
    mostStrings: 400,
    ceiling: 0.95,
  }).model;

  test("the bound is true, the gap is that of bound and cost, at every budget", () => {
    // By HiGHS with zero gap, in all four ways of writing the programme, and by a full run of the own search (a second or two).
    const optimum = 9_374_122;
    let stopped = 0;
    for (const work of [1, 100, 10_000, 130_000]) {
      const answer = findBlend(hard, { work });
      expect(answer.lowerBound).toBeLessThanOrEqual(optimum);
      if (answer.status !== "stopped") continue;
      stopped += 1;
      if (answer.best === null) expect(answer.gap).toBeNull();
      else {
        expect(answer.best.cost).toBeGreaterThanOrEqual(optimum);
        expect(isFittingBlend(hard, answer.best.counts)).toBe(true);
        expect(answer.gap).toBeCloseTo((answer.best.cost - answer.lowerBound) / answer.best.cost, 12);
      }
    }
    expect(stopped).toBeGreaterThan(1);
  });

  test("the callback ends it", () => {
    let asked = 0;
    expect(findBlend(hard, { stop: () => ++asked > 3 }).status).toBe("stopped");
    expect(asked).toBe(4);
  });
});

test("lazy tables: the same answers with floors, and most tables never built", () => {
  let built = 0;
  let all = 0;
  for (let seed = 1; seed <= 30; seed += 1) {
    const { model } = inventInstance({ parts: 100, seed: 8000 + seed });
    const options = model.options.map(({ costs, ...facts }) => {
      let perString = Number.POSITIVE_INFINITY;
      for (let x = 1; x <= facts.maxStrings; x += 1) perString = Math.min(perString, costs[x]! / x);
      all += 1;
      return lazyOption(facts, { fixed: 0, perString: facts.maxStrings === 0 ? 0 : perString }, () => {
        built += 1;
        return costs;
      });
    });
    expect(findBlend({ ...model, options }).best?.cost).toBe(findBlend(model).best?.cost);
  }
  expect(built).toBeLessThan(0.5 * all);
});
