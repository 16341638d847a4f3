// What to loosen when nothing fits: each change does what it says, and a little less does not.
import { describe, expect, test } from "vitest";
import type { BlendPlan, Loosen } from "../../src/search/index.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";

// One string is one unit: 100 uF in 0.096 L and 0.1 kg at 5 EUR; 150 uF in 0.2 L and 0.12 kg at 6 EUR.
const parts = partsOf(
  { diameter: 40, length: 60, mass: 100, price: 5, available: 8 },
  { capacitance: 150, diameter: 50, length: 80, mass: 120, price: 6, available: 6 },
);
const of = (plan: BlendPlan, field: Loosen["field"]): Loosen => plan.loosen.find((one) => one.field === field)!;

describe("loosenBlend through planBlends", () => {
  const cases = [
    ["maxVolume", { maxVolume: 1e-3 }],
    ["maxMass", { maxMass: 0.8 }],
    ["maxUnits", { maxUnits: 6 }],
  ] as const;
  test.each(cases)(
    "%s: the value it names will do at the cost it names, and 0.1 %% less will not",
    async (field, asked) => {
      const plan = await blendsOf(parts, 1000, { asked });
      expect([plan.status, plan.blends]).toEqual(["infeasible", []]);
      const { to, cost, proven, from } = of(plan, field);
      expect(proven).toBe(true);
      expect(to!).toBeGreaterThan(from);
      const round = field === "maxUnits" ? to! : to! * (1 + 1e-7);
      const then = await blendsOf(parts, 1000, { asked: { [field]: round } });
      expect(then.blends[0]!.cost!.total).toBeCloseTo(cost!, 6);
      const less = field === "maxUnits" ? to! - 1 : to! * 0.999;
      expect((await blendsOf(parts, 1000, { asked: { [field]: less } })).blends).toEqual([]);
    },
  );
  test("energy: as much as can be had, and no more", async () => {
    const plan = await blendsOf(parts, 2000);
    const { to, from, change } = of(plan, "energy");
    expect(from).toBeCloseTo((2e-3 * 400 ** 2) / 2, 9);
    // 8 x 100 + 6 x 150 = 1700 uF.
    expect(to!).toBeCloseTo((1.7e-3 * 400 ** 2) / 2, 3);
    expect(change!).toBeCloseTo(0.15, 5);
  });
  test("parts in one bank", async () => {
    const plan = await blendsOf(parts, 1600, { maxTypes: 1 });
    expect(of(plan, "maxTypes")).toMatchObject({ from: 1, to: 2, proven: true, cost: 5 * 7 + 6 * 6 });
  });
  test("the least change comes first, what cannot help last", async () => {
    const plan = await blendsOf(parts, 1000, { asked: { maxVolume: 1e-3, maxUnits: 5 } });
    const changes = plan.loosen.map(({ change }) => change ?? Number.POSITIVE_INFINITY);
    expect(changes).toEqual([...changes].sort((a, b) => a - b));
    expect(of(plan, "maxVolume").to).toBeNull();
  });
  test("where only the money is short, what the cheapest costs", async () => {
    const plan = await blendsOf(parts, 1000, { asked: { maxCost: 30 } });
    expect(plan.status).toBe("infeasible");
    const cheapest = (await blendsOf(parts, 1000)).blends[0]!.cost!.total;
    expect(plan.loosen).toEqual([
      {
        field: "maxCost",
        from: 30,
        to: cheapest,
        change: expect.closeTo(cheapest / 30 - 1, 9),
        cost: cheapest,
        proven: true,
      },
    ]);
  });
  test("with a steady current less energy is no way out, and is not offered", async () => {
    const plan = await blendsOf(parts, 1000, {
      asked: { steady: { current: 10, frequency: 5 }, ripple: 1, maxUnits: 5 },
    });
    expect(plan.loosen.map(({ field }) => field)).not.toContain("energy");
  });
});
