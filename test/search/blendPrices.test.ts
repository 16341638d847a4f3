// Prices that change the choice, each tried: just this side of it the choice stands, just beyond it does not.
import { describe, expect, test } from "vitest";
import { blendsOf, partsOf } from "../support/blendLab.ts";

describe("winningPrices through planBlends", () => {
  const rest = [
    { price: 3, available: 6 },
    { capacitance: 150, price: 5.5, available: 9 },
  ] as const;
  const third = { capacitance: 220, pack: 2, available: 10 };
  test("a cent below the price the part is in the cheapest blend, a cent above it is not", async () => {
    const plan = await blendsOf(partsOf(...rest, { ...third, price: "" }), 1000);
    const [winning] = plan.winningPrices;
    expect(winning).toMatchObject({ part: "c", computed: true, proven: true });
    const used = async (price: number) => {
      const found = await blendsOf(partsOf(...rest, { ...third, price: price.toFixed(2) }), 1000);
      return found.blends[0]!.strings.some(({ part }) => part === "c");
    };
    const below = winning!.below!;
    expect(below).toBeGreaterThan(1);
    expect(await used(Math.floor(below * 100 - 1) / 100)).toBe(true);
    expect(await used(Math.ceil(below * 100 + 1) / 100)).toBe(false);
  });
  test("it is named among the left out, and no price helps what has no room", async () => {
    const plan = await blendsOf(partsOf(...rest, { ...third, price: "", diameter: 300 }), 1000, {
      asked: { maxVolume: 3e-3 },
    });
    expect(plan.leftOut.map(({ part }) => part)).toContain("c");
    expect(plan.winningPrices).toEqual([]);
  });
  test("more units of a part that lies on hand without a price", async () => {
    const plan = await blendsOf(partsOf(...rest, { capacitance: 220, price: "", "on hand": 2 }), 1000);
    expect(plan.blends[0]!.strings.find(({ part }) => part === "c")).toMatchObject({ bought: 0, fromHand: 2 });
    expect(plan.winningPrices[0]!.below).toBeGreaterThan(0);
  });
  test("nothing is worked out while nothing fits", async () => {
    const plan = await blendsOf(partsOf(...rest, { ...third, price: "" }), 9000);
    expect(plan.winningPrices).toEqual([{ part: "c", below: null, computed: false, proven: false }]);
  });
});

describe("priceMoves through planBlends with explain", () => {
  const rows = [
    { price: 3, available: 6 },
    { capacitance: 150, price: 4.8, available: 9, pack: 3 },
    { capacitance: 220, price: 7.5 },
  ] as const;
  test("beyond each move the cheapest blend is another, short of it the same", async () => {
    const plan = await blendsOf(partsOf(...rows), 1000, { explain: true });
    const id = plan.blends[0]!.id;
    expect(plan.priceMoves.length).toBeGreaterThanOrEqual(3);
    let tried = 0;
    for (const { part, move, perUnit } of plan.priceMoves) {
      const at = "abc".indexOf(part);
      const idAt = async (change: number) => {
        const price = rows[at]!.price + (move === "rise" ? change : -change);
        if (price <= 0) return null;
        const moved = rows.map((row, k) => (k === at ? { ...row, price: price.toFixed(2) } : row));
        return (await blendsOf(partsOf(...moved), 1000)).blends[0]!.id;
      };
      const beyond = await idAt(perUnit + 0.02);
      if (beyond === null) continue;
      tried += 1;
      expect(beyond, `${part} ${move} ${perUnit}`).not.toBe(id);
      if (perUnit > 0.03) expect(await idAt(perUnit - 0.02), `${part} ${move} ${perUnit}`).toBe(id);
    }
    expect(tried).toBeGreaterThanOrEqual(2);
  });
  test("none for what is not bought: its price plays no part", async () => {
    const plan = await blendsOf(partsOf({ "on hand": 20 }, { capacitance: 150, price: 5 }), 1000, { explain: true });
    expect(plan.blends[0]!.strings.map(({ part, bought }) => [part, bought])).toEqual([["a", 0]]);
    expect(plan.priceMoves.filter(({ part, move }) => part === "a" && move === "rise")).toEqual([]);
  });
});
