// The least loosening of each limit, against trying everything.
import { expect, test } from "vitest";
import { blendTotals } from "../../../src/search/blend/evaluate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { findLoosenings, leastAmount } from "../../../src/search/blend/loosen.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

const open = Number.POSITIVE_INFINITY;

test("leastAmount: 150 models, each row, the brute-force least", () => {
  let met = 0;
  for (let seed = 0; seed < 150; seed += 1) {
    const model = tinyModel(seed);
    for (const row of ["volume", "mass", "units"] as const) {
      let least: number | null = null;
      bruteForce({ ...model, ceilings: { ...model.ceilings, [row]: open } }, (counts) => {
        const amount = blendTotals(model, counts)![row];
        least = least === null ? amount : Math.min(least, amount);
      });
      const found = leastAmount(model, row);
      if (least === null) expect(found).toEqual({ status: "infeasible", counts: null, amount: null });
      else {
        met += 1;
        expect(found.status).toBe("optimal");
        expect(found.amount! - least).toBeLessThanOrEqual(1e-7 * least + 1e-15);
        expect(found.amount! - least).toBeGreaterThanOrEqual(-1e-12);
      }
    }
  }
  expect(met).toBeGreaterThan(150);
});

test("findLoosenings by hand: one more litre is the least change", () => {
  // Ten of a part that takes a litre and a kilogram each, with room for nine of either, and one type only.
  const model = plainModel(
    10,
    [
      { capacity: 1, most: 20, price: 7, volume: 1e-3, mass: 1 },
      { capacity: 1, most: 9, price: 90, volume: 0.8e-3, mass: 3 },
    ],
    { volume: 9.5e-3, mass: 30, types: 1 },
  );
  const found = findLoosenings(model);
  expect(found[0]).toMatchObject({ limit: "volume", cost: 70, proven: true });
  expect(found[0]!.change).toBeCloseTo(10 / 9.5 - 1, 7);
  const energy = found.find(({ limit }) => limit === "requirement")!;
  expect(energy).toMatchObject({ limit: "requirement", cost: 63, proven: true });
  expect(energy.to).toBeCloseTo(9, 5);
  expect(found.find(({ limit }) => limit === "types")).toMatchObject({ to: 2, proven: true });
  expect(found.find(({ limit }) => limit === "mass")).toMatchObject({ to: null, cost: null, proven: true });
});

test("findLoosenings: what it says works, and a hair less does not: impossible ones of 200 models", () => {
  let met = 0;
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    if (bruteForce(model) !== null) continue;
    for (const { limit, to, cost } of findLoosenings(model)) {
      if (limit !== "volume" && limit !== "mass" && limit !== "units") continue;
      const under = (ceiling: number) => bruteForce({ ...model, ceilings: { ...model.ceilings, [limit]: ceiling } });
      if (to === null) expect(under(open)).toBeNull();
      else {
        met += 1;
        expect(under(to)).toBe(cost);
        expect(under(to * (1 - 1e-6))).toBeNull();
      }
    }
  }
  expect(met).toBeGreaterThan(20);
});

test("findLoosenings: where two ceilings stand in the way, the least factor on all of them, against trying factors", () => {
  const model = plainModel(
    10,
    [
      { capacity: 1, most: 12, price: 5, volume: 1, mass: 2 },
      { capacity: 2, most: 3, price: 20, volume: 1, mass: 7 },
    ],
    { volume: 6, mass: 15 },
  );
  expect(findBlend(model).best).toBeNull();
  const found = findLoosenings(model).find(({ limit }) => limit === "ceilings")!;
  // Every mix: the least of what each takes of the ceiling that it fills most.
  let least = Number.POSITIVE_INFINITY;
  for (let x = 0; x <= 12; x += 1)
    for (let y = 0; y <= 3; y += 1)
      if (x + 2 * y >= 10) least = Math.min(least, Math.max((x + y) / 6, (2 * x + 7 * y) / 15));
  expect(found.to! / least).toBeCloseTo(1, 5);
  expect(found).toMatchObject({ from: 1, proven: true });
  const one = plainModel(10, [{ capacity: 1, most: 12, price: 5, volume: 1 }], { volume: 6 });
  expect(findLoosenings(one).some(({ limit }) => limit === "ceilings")).toBe(false);
});
