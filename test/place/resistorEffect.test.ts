import { describe, expect, test } from "vitest";
import { place } from "../../src/place/place.ts";
import { resistorEffect } from "../../src/place/resistorEffect.ts";
import { units } from "./lots.ts";

describe("resistorEffect(units, request, { placing, resistances })", () => {
  test("the smaller the resistor the nearer to even, for the placing as it stands", () => {
    const lot = units("uniform", 16, 3, 0.5);
    const request = { series: 4, parallel: 4, ties: "cross-tied", leakageVoltage: 400 } as const;
    const placed = place(lot, request);
    if (!placed.ok) throw new Error("refused");
    // Four units of 400 uA at 400 V are 4 uS: 250 kohm doubles that, 25 kohm swamps it.
    const read = resistorEffect(lot, request, { placing: placed.value, resistances: [250e3, 25e3] });
    if (!read.ok) throw new Error("refused");
    const [none, some, much] = read.value;
    expect(none!.resistance).toBe(Number.POSITIVE_INFINITY);
    expect(none!.asPlaced).toBeCloseTo(placed.value.holding!.gap, 12);
    expect(some!.asPlaced!).toBeLessThan(none!.asPlaced!);
    expect(much!.asPlaced!).toBeLessThan(some!.asPlaced! / 3);
    for (const row of read.value) expect(row.replaced!).toBeLessThanOrEqual(row.asPlaced! + 1e-9);
  });

  test("a search too short to find anything better keeps the placing at hand", () => {
    for (const seed of [1, 2, 3, 4, 5, 6]) {
      const lot = units("uniform", 24, seed, 0.5);
      const request = { series: 4, parallel: 6, ties: "cross-tied", leakageVoltage: 400 } as const;
      const placed = place(lot, { ...request, moves: 1e6 });
      if (!placed.ok) throw new Error("refused");
      const few = { ...request, moves: 1, goal: "charging" } as const;
      const read = resistorEffect(lot, few, { placing: placed.value, resistances: [250e3] });
      if (!read.ok) throw new Error("refused");
      for (const row of read.value) expect(row.replaced!).toBeLessThanOrEqual(row.asPlaced!);
    }
  });
});
