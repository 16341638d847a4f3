import { describe, expect, test } from "vitest";
import { lotDrift } from "../../src/place/driftLot.ts";

const unit = (serial: string, values: readonly number[]) => ({
  serial,
  readings: {
    capacitance: values.map((value, k) => ({ value, uncertainty: 0.003, shots: k })),
    esr: [],
    leakage: [],
  },
});

describe("lotDrift(units, limits)", () => {
  test("nearest the end of life first; without one, changed most for the worse first", () => {
    const lot = [unit("a", [1, 0.99]), unit("b", [1, 0.8]), unit("c", [1, 1.3]), unit("d", [1])];
    expect(lotDrift(lot, { capacitance: 0.1 }).units.map(({ serial }) => serial)).toEqual(["b", "a", "c", "d"]);
    expect(lotDrift(lot, {}).units.map(({ serial }) => serial)).toEqual(["b", "a", "c", "d"]);
  });

  test("the median change is of units measured again, three or more", () => {
    const lot = [unit("a", [1, 0.99]), unit("b", [1, 0.97]), unit("c", [1, 0.9]), unit("d", [1])];
    expect(lotDrift(lot, {}).median).toEqual({ capacitance: expect.closeTo(-0.03, 12), esr: null, leakage: null });
    expect(lotDrift(lot.slice(0, 2), {}).median.capacitance).toBeNull();
  });
});
