// What would change the choice, in words.
import { expect, test } from "vitest";
import { movesText, stockText, worthText } from "../../src/cli/blendMoveWords.ts";
import type { BlendPlan } from "../../src/search/index.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";

test("movesText, stockText, worthText: one line a move, what is not proven said, nothing where nothing was asked", async () => {
  const parts = partsOf(
    { price: 3, available: 6 },
    { capacitance: 150, price: 5, available: 9 },
    { capacitance: 220, price: 9 },
  );
  const plan = await blendsOf(parts, 900, { explain: true });
  const [moves] = movesText(plan, 200);
  expect(moves!.split("\n")).toHaveLength(plan.priceMoves.length + 1);
  expect(moves).toMatch(/if . (rises|falls) by more than \d+\.\d\d EUR a unit/);
  const [stock] = stockText(plan, 200);
  expect(stock).toMatch(/with fewer than \d+ of ., on hand and bought, .* is the cheapest, \d+\.\d\d EUR dearer/);
  const open = {
    ...plan,
    stockMoves: plan.stockMoves.map((one) => ({ ...one, next: null, proven: false })),
  } as BlendPlan;
  expect(stockText(open, 200)[0]).toContain("it is not known whether a blend fits (not proven)");
  expect(worthText(plan, 200)).toHaveLength(1);
  const plain = await blendsOf(parts, 900);
  expect([movesText(plain, 200), stockText(plain, 200), worthText(plain, 200)]).toEqual([[], [], []]);
});
