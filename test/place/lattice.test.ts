import { describe, expect, test } from "vitest";
import { toLattice } from "../../src/place/lattice.ts";
import { capacitances } from "./lots.ts";

describe("toLattice(values)", () => {
  test("readings on a decimal grid become the whole numbers they were, over their common divisor", () => {
    expect([...toLattice([941.7e-6, 1059.3e-6]).values]).toEqual([9417, 10593].map((x) => x / 3));
    expect(toLattice([1000e-6, 1010e-6]).onGrid).toBe(true);
    expect([...toLattice([1000e-6, 1010e-6]).values]).toEqual([100, 101]);
  });

  test("values off every grid keep a relative error of 1e-12 at most, and their total stays exact", () => {
    const values = Array.from({ length: 60 }, (_, i) => 1e-3 * (1 + 0.1 * Math.sin(i + Math.SQRT2)));
    const lattice = toLattice(values);
    expect(lattice.onGrid).toBe(false);
    for (const [i, v] of values.entries()) {
      expect(Math.abs(lattice.values[i]! / lattice.values[0]! / (v / values[0]!) - 1)).toBeLessThan(1e-12);
    }
    expect(lattice.values.reduce((s, v) => s + v, 0)).toBeLessThan(2 ** 53);
  });

  test("a lot in whole nF comes back as whole nF", () => {
    const lot = capacitances("uniform", 420, 3);
    const { values, onGrid } = toLattice(lot);
    expect(onGrid).toBe(true);
    for (const [i, v] of lot.entries()) expect(values[i]! / values[0]!).toBeCloseTo(v / lot[0]!, 12);
  });

  test("one value, tiny values and values of very different size stay whole and positive", () => {
    expect([...toLattice([4.7e-12]).values]).toEqual([1]);
    const wide = toLattice([1e-12, 1]).values;
    expect(wide.every((v) => Number.isInteger(v) && v >= 1)).toBe(true);
  });
});
