// What stock would change the choice: against planning again with that stock.
import { expect, test } from "vitest";
import { blendsOf, partsOf } from "../support/blendLab.ts";

const rows = [
  { price: 3, available: 6 },
  { capacitance: 150, price: 5, available: 9 },
  { capacitance: 220, price: 9 },
];

test("stockMoves: with one unit fewer the plan costs so much more; with so many on sale so much less, and with one fewer no less", async () => {
  const parts = partsOf(...rows);
  const plan = await blendsOf(parts, 900, { explain: true });
  const cost = plan.blends[0]!.cost!.total;
  const again = async (part: string, available: number) => {
    const other = parts.map((one) => (one.part === part ? { ...one, available } : one));
    return (await blendsOf(other, 900)).blends[0]?.cost?.total ?? null;
  };
  expect(plan.stockMoves.filter(({ move }) => move === "fewer")).toHaveLength(plan.blends[0]!.strings.length);
  expect(plan.stockMoves.some(({ move }) => move === "more")).toBe(true);
  for (const { part, move, units, change, next, proven } of plan.stockMoves) {
    expect(proven).toBe(true);
    expect(next).not.toBeNull();
    if (move === "fewer") {
      expect(await again(part, units)).toBe(cost);
      expect((await again(part, units - 1))! - cost).toBeCloseTo(change!, 9);
    } else {
      expect(change).toBeLessThan(0);
      expect((await again(part, units))! - cost).toBeCloseTo(change!, 9);
      expect(await again(part, units - 1)).toBe(cost);
    }
  }
});

test("stockMoves: nothing fits with fewer of the only part", async () => {
  const plan = await blendsOf(partsOf({ price: 3, available: 9 }), 900, { explain: true });
  expect(plan.stockMoves).toMatchObject([
    { part: "a", move: "fewer", units: 9, change: null, next: null, proven: true },
  ]);
});
