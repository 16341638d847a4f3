// Shadow prices in major money, and whose prices are asked about.
import { expect, test } from "vitest";
import type { Proof } from "../../src/search/blendProof.ts";
import { nearOptions } from "../../src/search/blendWorth.ts";
import { blendsOf, partsOf } from "../support/blendLab.ts";

// Small and dear against large and cheap, one in series: 0.1 L at 9 EUR and 0.3 L at 4 EUR for each 100 uF.
const parts = partsOf({ diameter: 40, length: 62.5, price: 9 }, { diameter: 50, length: 120, price: 4 });
const bound = (maxVolume?: number) =>
  blendsOf(parts, 10000, { explain: true, asked: maxVolume === undefined ? {} : { maxVolume } });

test("worthOf: a litre between the two parts is worth 5 EUR over 0.2 L", async () => {
  const plan = await bound(0.02);
  expect(plan.worth!.volume * 1e-3).toBeCloseTo(5 / 0.2, 1);
  // The whole blends say the same, nearly: one litre more saves about as much.
  const more = await bound(0.021);
  expect(plan.blends[0]!.cost!.total - more.blends[0]!.cost!.total).toBeCloseTo(25, -0.7);
});
test("no ceiling, no worth", async () => {
  expect((await bound()).worth).toMatchObject({ volume: 0, mass: 0 });
});
test("nearOptions(proof, cheapest): open options beside the blend's own, six at most", () => {
  const plain = { survivors: Array.from({ length: 9 }, (_, option) => ({ option, strings: [1] })) };
  const cheapest = { counts: [{ option: 1, strings: 2 }], cost: 1 };
  expect(nearOptions({ plain } as unknown as Proof, cheapest)).toEqual([0, 2, 3, 4, 5, 6]);
  expect(nearOptions(null, cheapest)).toEqual([]);
});
