// Settling: one answer as a rule, both when engines contradict each other, and something in hand when stopped.
import { describe, expect, test } from "vitest";
import { type SettledBlend, settleBlend } from "../../src/search/blend/fallback.ts";
import { settleWork } from "../../src/search/blendSettle.ts";
import { partsOf, workOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: (1e-3 * 400 ** 2) / 2, voltage: 400, basis: "nominal" });
const work = workOf(
  partsOf({ price: 3, available: 6 }, { capacitance: 150, price: 4, available: 5 }, { capacitance: 220, price: 9 }),
  brief,
);
const wish = { currency: "EUR", seconds: 5, side: { work: 1e6 }, clock: () => performance.now() };
const honest = await settleBlend(work.model);
const settle = (over: Partial<SettledBlend>) => async () => ({ ...honest, ...over });

describe("settleWork(work, wish)", () => {
  test("proven, with the proof and the bound", async () => {
    const settled = await settleWork(work, wish);
    expect(settled).toMatchObject({
      proven: true,
      provenBy: "own search",
      lowerBound: honest.best!.cost,
      disagreements: [],
    });
    expect(settled.found).toEqual([honest.best]);
  });
  test("a false optimum is not proven, and the second engine's better blend is kept beside it", async () => {
    const worse = { counts: [{ option: 2, strings: 5 }], cost: 4500 };
    const settled = await settleWork(work, { ...wish, settle: settle({ best: worse, lowerBound: 4500 }) });
    expect(settled.proven).toBe(false);
    expect(settled.proof!.named.verdict).toBe("invalid");
    expect(settled.found).toEqual([honest.best, worse]);
  });
  test("a false claim that nothing fits is contradicted", async () => {
    const none = settle({ status: "infeasible", best: null, lowerBound: Infinity });
    const settled = await settleWork(work, { ...wish, settle: none });
    expect(settled.proven).toBe(false);
    expect(settled.disagreements.map(({ engine }) => engine)).toEqual(["own search", "javascript-lp-solver"]);
    expect(settled.found[0]).toEqual(honest.best);
    expect(settled.lowerBound).toBeNull();
  });
  test("two answers of the search and its fallback are both kept, the cheaper first, without a bound", async () => {
    const other = { counts: [{ option: 2, strings: 5 }], cost: 4500 };
    const disagreements = [
      { engine: "own search" as const, blend: other, lowerBound: 4500 },
      { engine: "HiGHS" as const, blend: honest.best, lowerBound: 3000 },
    ];
    const settled = await settleWork(work, {
      ...wish,
      settle: settle({ status: "stopped", best: other, disagreements, provenBy: null }),
    });
    expect(settled.found).toEqual([honest.best, other]);
    expect(settled).toMatchObject({ proven: false, lowerBound: null });
    expect(settled.disagreements).toHaveLength(2);
  });
  test("stopped with nothing in hand: a blend that fits is found by its room or its units", async () => {
    const settled = await settleWork(work, {
      ...wish,
      settle: settle({ status: "stopped", best: null, lowerBound: 10, provenBy: null }),
    });
    expect(settled).toMatchObject({ proven: false, lowerBound: 10, proof: null });
    expect(settled.found[0]!.cost).toBeGreaterThanOrEqual(honest.best!.cost);
  });
});
