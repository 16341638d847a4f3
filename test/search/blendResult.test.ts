// The shape that others read: what is promised of `plan --blend --json`, plain enough to be written down.
import { expect, test } from "vitest";
import { blendsOf, partsOf } from "../support/blendLab.ts";

test("a blend holds at least what is promised, and survives being written as JSON", async () => {
  const plan = await blendsOf(partsOf({ price: 3, available: 6 }, { capacitance: 150, price: 4 }), 1000);
  const text = JSON.stringify(plan);
  expect(JSON.parse(text)).toEqual(plan);
  expect(plan.blends[0]).toMatchObject({
    id: expect.stringMatching(/ \+ /),
    strings: [
      {
        part: "a",
        series: 1,
        parallel: expect.any(Number),
        ties: "strings",
        units: expect.any(Number),
        bought: expect.any(Number),
      },
      {
        part: "b",
        series: 1,
        parallel: expect.any(Number),
        ties: "strings",
        units: expect.any(Number),
        bought: expect.any(Number),
      },
    ],
    capacitance: { low: expect.any(Number), nominal: expect.any(Number), high: expect.any(Number) },
    cost: {
      capacitors: expect.any(Number),
      resistors: 0,
      lines: 0,
      total: expect.any(Number),
      currency: "EUR",
      unpriced: [],
    },
    certificate: { claim: "cheapest", verdict: "valid", prices: { cost: 1 } },
  });
  expect(plan.blends[0]!.cost!.total * 100).toBe(plan.blends[0]!.certificate!.cost);
});
