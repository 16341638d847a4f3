// Fronts and ladder of a brief: each point is what planning under its own limit finds.
import { expect, test } from "vitest";
import { blendFronts } from "../../src/search/blendFronts.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";

const parts = partsOf(
  { price: 3, available: 12, diameter: 60 },
  { capacitance: 150, price: 5, diameter: 40, mass: 90 },
  { capacitance: 100, voltage: 1000, price: 9, diameter: 30, length: 50, mass: 60 },
);

test("blendFronts: every point of room, mass and units is the cheapest under its own ceiling, and nothing beats another", async () => {
  const { fronts } = await blendsOf(parts, 900, { fronts: ["volume", "mass", "units"] });
  const keys = { volume: "maxVolume", mass: "maxMass", units: "maxUnits" } as const;
  for (const { against, points } of fronts) {
    expect(points.length, against).toBeGreaterThan(1);
    for (const [at, point] of points.entries()) {
      expect(point.proven).toBe(true);
      const under = await blendsOf(parts, 900, {
        asked: { [keys[against as keyof typeof keys]]: against === "units" ? point.amount : point.amount * (1 + 1e-9) },
      });
      expect(under.blends[0]!.cost!.total, `${against} ${point.amount}`).toBe(point.cost);
      const next = points[at + 1];
      if (next !== undefined) expect(next.cost > point.cost && next.amount < point.amount).toBe(true);
    }
  }
});

test("blendFronts against stress: each point is the plan at a lower derating, and bears no more than that", async () => {
  const { fronts } = await blendsOf(parts, 900, { fronts: ["stress"] });
  const [front] = fronts;
  expect(front!.points.length).toBeGreaterThan(1);
  for (const { amount, cost } of front!.points) {
    const derating = Math.ceil(amount / 0.05 - 1e-9) * 0.05;
    const under = await blendsOf(parts, 900, { asked: { derating } });
    expect(under.blends[0]!.cost!.total).toBe(cost);
    expect(under.blends[0]!.stress!).toBeCloseTo(amount, 9);
  }
});

test("blendLadder: the asked energy stands on exactly one step, at the plan's cost; ends of a step plan to its cost", async () => {
  const { ladder, blends } = await blendsOf(parts, 900, { ladder: 0.4 });
  const asked = ladder!.steps.filter((step) => step.asked);
  expect(asked).toHaveLength(1);
  expect(asked[0]!.cost).toBe(blends[0]!.cost!.total);
  for (const { to, energy, cost } of ladder!.steps) {
    expect(energy.to).toBeCloseTo((to * 400 ** 2) / 2, 9);
    const at = await blendsOf(parts, to * 1e6);
    expect(at.blends[0]!.cost!.total).toBe(cost);
  }
  expect(ladder!.end).toBe("complete");
});

test("nothing asked, nothing told", async () => {
  const plan = await blendsOf(parts, 900);
  expect([plan.fronts, plan.ladder]).toEqual([[], null]);
  expect(blendFronts([], undefined as never)).toEqual([]);
});
