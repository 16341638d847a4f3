// Clearance advice against A19 of the methods page, a published altitude example, and every edge of its tables.
import { describe, expect, test } from "vitest";
import { ALTITUDES, altitudeFactor, CLEARANCES, clearanceAdvice } from "../../src/hazard/clearance.ts";

const advice = (want: Parameters<typeof clearanceAdvice>[0]) => {
  const read = clearanceAdvice(want);
  return read.ok ? read.value : read.refusals[0]!.place.field;
};

describe("clearanceAdvice({ voltage, altitude, pollution })", () => {
  test.each([
    [{ voltage: 0 }, "voltage"],
    [{ voltage: Number.NaN }, "voltage"],
    [{ voltage: 100001 }, "voltage"],
    [{ voltage: 1000, altitude: 10001 }, "altitude"],
    [{ voltage: 1000, altitude: Number.NaN }, "altitude"],
  ])("refuses %j for its %s", (want, field) => expect(advice(want)).toBe(field));

  test("A19: 6 kV, case A, 3500 m: 5.5 mm x 1.215 = 6.6825 mm", () => {
    const found = advice({ voltage: 6000, altitude: 3500 });
    expect(found).toMatchObject({ base: 5.5e-3, extrapolated: true });
    expect((found as { factor: number }).factor).toBeCloseTo(1.215, 12);
    expect((found as { byTable: number }).byTable).toBeCloseTo(6.6825e-3, 12);
  });

  test("between two rows the upper one holds, never a value between", () => {
    expect(advice({ voltage: 6001 })).toMatchObject({ base: 8e-3 });
    expect(advice({ voltage: 6000 })).toMatchObject({ base: 5.5e-3 });
  });

  test("dirt sets a floor: 0.2, 0.8, 1.6 mm at 500 V", () =>
    expect(
      [1, 2, 3, 4].map((pollution) => (advice({ voltage: 500, pollution: pollution as 1 }) as { base: number }).base),
    ).toEqual([0.04e-3, 0.2e-3, 0.8e-3, 1.6e-3]));

  test("the larger of table and bench rule (3 mm for each kV) is advised", () => {
    const found = advice({ voltage: 2200 });
    expect(found).toMatchObject({ byTable: 1.5e-3, extrapolated: true });
    expect((found as { advised: number }).advised).toBeCloseTo(6.6e-3, 12);
  });

  test("thin air widens the bench rule as well, and alone is outside the standard's scope", () => {
    const found = advice({ voltage: 1000, altitude: 5000 }) as { byBench: number; factor: number };
    expect(found.factor).toBeCloseTo(1.48, 12);
    expect(found.byBench).toBeCloseTo(3e-3 * 1.48, 12);
    expect(found).toMatchObject({ extrapolated: true });
  });

  test("10 000 m itself is read; a refusal says what would be", () => {
    expect(advice({ voltage: 1000, altitude: 10e3 })).toMatchObject({ factor: 3.02 });
    const said = [{ voltage: 1000, altitude: 10001 }, { voltage: 0 }, { voltage: 1e6 }].map((want) => {
      const read = clearanceAdvice(want);
      return read.ok ? null : [read.refusals[0]!.code, read.refusals[0]!.want];
    });
    expect(said).toEqual([
      ["out-of-range", "at most 10 000 m"],
      ["out-of-range", "a voltage above zero"],
      ["out-of-range", "at most 100 kV"],
    ]);
  });

  test("inside the standard's scope it is not called extrapolated", () =>
    expect(advice({ voltage: 1500, altitude: 2000 })).toMatchObject({ extrapolated: false }));
});

describe("altitudeFactor(altitude)", () => {
  test("1 at and below 2000 m, also below the sea", () =>
    expect([-400, 0, 2000].map(altitudeFactor)).toEqual([1, 1, 1]));
  test("each row of the table, and 3.02 at the cap", () => {
    for (const [height, factor] of ALTITUDES) expect(altitudeFactor(height)).toBeCloseTo(factor, 12);
  });
  test("3.6 mm at 5000 m becomes 5.328 mm (published example, printed 5.33)", () =>
    expect(3.6 * altitudeFactor(5000)).toBeCloseTo(5.328, 9));
});

test("both tables rise from row to row", () => {
  for (const table of [CLEARANCES, ALTITUDES])
    table.slice(1).forEach((row, k) => {
      expect(row[0]).toBeGreaterThan(table[k]![0]);
      expect(row[1]).toBeGreaterThan(table[k]![1]);
    });
});
