import { describe, expect, test } from "vitest";
import { drift, type Remeasured } from "../../src/place/drift.ts";

const series = (values: readonly number[], uncertainty = 0.003): Remeasured[] =>
  values.map((value, k) => ({ value, uncertainty, shots: 1000 * k, day: 20_000 + 100 * k }));

describe("drift(kind, readings, limit)", () => {
  test("one reading, or no limit: not assessed, and nothing is looked ahead", () => {
    expect(drift("capacitance", series([1e-3]), 0.2)).toMatchObject({ verdict: "not assessed", real: false, due: [] });
    expect(drift("capacitance", series([1e-3, 0.9e-3]), undefined)).toMatchObject({
      verdict: "not assessed",
      real: true,
      used: null,
    });
  });

  test("a change within both readings' doubt is not real: 0.8 % against 1.96 x 0.3 % x sqrt 2", () => {
    const { real, plusMinus } = drift("capacitance", series([1, 0.992]), 0.2);
    expect(real).toBe(false);
    expect(plusMinus).toBeCloseTo(1.96 * 0.003 * Math.SQRT2 * 0.992, 12);
  });

  test("over its end fails, within doubt of it warns, else passes", () => {
    expect(drift("capacitance", series([1, 0.79]), 0.2)).toMatchObject({
      verdict: "fail",
      used: expect.closeTo(1.05, 9),
    });
    expect(drift("capacitance", series([1, 0.803]), 0.2).verdict).toBe("warn");
    expect(drift("capacitance", series([1, 0.95]), 0.2).verdict).toBe("pass");
    expect(drift("esr", series([0.1, 0.25], 0.05), 1).verdict).toBe("fail");
    expect(drift("leakage", series([1e-4, 2.1e-3], 0.1), 2e-3).verdict).toBe("fail");
    expect(drift("leakage", series([0, 1e-3], 0.1), 2e-3).verdict).toBe("pass");
  });

  test("due by shots and by day, as the readings have both; the stretch beyond what was watched", () => {
    const { due, straight } = drift("capacitance", series([1, 0.98, 0.96, 0.94]), 0.1);
    expect(straight).toBe(true);
    expect(due).toMatchObject([
      { axis: "shots", best: expect.closeTo(5000, 6), stretch: expect.closeTo(5 / 3, 9) },
      { axis: "day", best: expect.closeTo(20_500, 6) },
    ]);
  });

  test("what was read within its limit is not due before that reading, whatever the line says", () => {
    const strayed = drift("capacitance", series([1, 0.8, 0.95]), 0.1);
    expect(strayed.verdict).toBe("pass");
    for (const { axis, best, soonest, stretch } of strayed.due) {
      const last = axis === "shots" ? 2000 : 20_200;
      expect(best ?? last).toBeGreaterThanOrEqual(last);
      expect(soonest!).toBeGreaterThanOrEqual(last);
      expect(stretch ?? 1).toBeGreaterThanOrEqual(1);
    }
    // A line that is already over its limit at the start, by its doubt, is not due at the start.
    const wide = drift("capacitance", series([1, 0.99, 0.98], 0.2), 0.1);
    expect(wide.due.map(({ soonest }) => soonest)).toEqual([2000, 20_200]);
  });

  test("a first reading without a date still is what the loss is counted from", () => {
    const [first, ...later] = series([1, 0.98, 0.96]);
    const undated = [{ value: first?.value ?? 0, uncertainty: 0.003, shots: 0 }, ...later];
    const { due } = drift("capacitance", undated, 0.1);
    // 2 % in 100 days from day 20,100 at 0.98: at 0.90 four hundred days later.
    expect(due.find(({ axis }) => axis === "day")?.best).toBeCloseTo(20_500, 6);
  });

  test("readings that stray from a line say so", () => {
    expect(drift("capacitance", series([1, 0.99, 0.9, 0.99, 0.98]), 0.2).straight).toBe(false);
  });
});
