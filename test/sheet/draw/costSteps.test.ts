import { describe, expect, test } from "vitest";
import { type PurchaseTerms, purchase } from "../../../src/catalog/index.ts";
import { costSteps } from "../../../src/sheet/draw/costSteps.ts";
import fc from "../../support/property.ts";

describe("costSteps(terms, needed)", () => {
  test("packs of 8 at 4.20, 3.80 from 50: by hand", () => {
    const terms: PurchaseTerms = { price: 420, priceBreaks: [{ from: 16, price: 300 }], pack: 8, onHand: 2 };
    expect(costSteps(terms, 12)).toEqual([
      { from: 1, to: 2, bought: 0, cost: 0 },
      { from: 3, to: 10, bought: 8, cost: 3360 },
      { from: 11, to: 18, bought: 16, cost: 4800 },
    ]);
  });

  test("no price is null, not zero; ends where no more can be had", () => {
    expect(costSteps({ onHand: 1 }, 2).at(-1)!.cost).toBeNull();
    expect(costSteps({ price: 100, available: 3 }, 9).at(-1)!.to).toBe(3);
  });

  test("runs follow each other and say what the catalogue's own purchase says", () => {
    const some = fc.integer({ min: 1, max: 30 });
    fc.assert(
      fc.property(some, some, some, fc.integer({ min: 1, max: 60 }), (pack, price, from, needed) => {
        const terms: PurchaseTerms = { price: price * 10, priceBreaks: [{ from: from + 1, price: price * 7 }], pack };
        const steps = costSteps(terms, needed);
        expect(steps[0]!.from).toBe(1);
        for (const [index, step] of steps.entries()) {
          if (index > 0) expect(step.from).toBe(steps[index - 1]!.to + 1);
          for (const quantity of [step.from, step.to]) {
            const found = purchase(terms, quantity)!;
            expect([found.cost, found.bought]).toEqual([step.cost, step.bought]);
          }
        }
        expect(steps.at(-1)!.to).toBeGreaterThanOrEqual(needed);
      }),
    );
  });
});
