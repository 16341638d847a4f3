import { expect, test } from "vitest";
import { smallBank } from "../support/placeCli.ts";

test("placeJson: the agreed keys, no number that JSON lacks, what a later reading needs", async () => {
  const { bank, out } = await smallBank();
  expect(out).not.toMatch(/NaN|Infinity/);
  expect(Object.keys(bank)).toEqual(
    expect.arrayContaining(["ties", "groups", "spares", "charging", "holding", "floor", "units", "bank", "positions"]),
  );
  expect(bank.charging).toMatchObject({
    worst: expect.any(Number),
    gap: expect.any(Number),
    lowerBound: expect.any(Number),
    proof: expect.stringMatching(/^(optimal|within)$/),
    attained: expect.any(Number),
  });
  expect(bank.charging.worstVoltage).toBeCloseTo(1000 * bank.charging.worst, 9);
  expect(bank.bank).toMatchObject({ voltage: 1000, limit: 360, resistance: 1e5, leakageVoltage: 360 });
  expect(bank.replacements[bank.groups[0][0]][0]).toMatchObject({ spare: bank.spares[0], allowed: true });
});
