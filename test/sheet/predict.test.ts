import { describe, expect, test } from "vitest";
import { METER, predictedShares, STEPS } from "../../src/sheet/predict.ts";
import { BARE, placedIn, sheetInput } from "../support/sheet.ts";

describe("predictedShares(input)", () => {
  test("not measured: every stage at 1/n, between the worst corners of the tolerance", () => {
    const rows = predictedShares(sheetInput());
    expect(rows).toHaveLength(8);
    // methods 1.2 with a = b = 0.2, n = 8: (1 + t)/(n - (n - 2)t) and (1 - t)/(n + (n - 2)t).
    expect(rows[0]).toMatchObject({ share: 1 / 8, spot: { group: 1, place: null } });
    expect(rows[0]?.high).toBeCloseTo((1.2 / (8 - 6 * 0.2)) * (1 + METER.relative), 12);
    expect(rows[0]?.low).toBeCloseTo((0.8 / (8 + 6 * 0.2)) * (1 - METER.relative), 12);
  });

  test("measured: shares by capacitance, within the doubt of both meters; in strings unit by unit", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const bank = sheetInput({ shape: { ties } });
      const placed = placedIn(bank);
      const rows = predictedShares({ ...bank, placed });
      expect(rows).toHaveLength(ties === "cross-tied" ? 8 : 16);
      const sum = rows.slice(0, 8).reduce((total, { share }) => total + share, 0);
      expect(sum).toBeCloseTo(1, 12);
      const { share, low, high } = rows[3]!;
      expect([low, high]).toEqual([share * (1 - 0.009), share * (1 + 0.009)]);
      const capacitances = placed.groups.map((group) =>
        group.map((serial) => placed.positions.find((p) => p.serial === serial)!.capacitance),
      );
      const stages = ties === "cross-tied" ? capacitances.map((group) => group[0]! + group[1]!) : capacitances[0]!;
      const series = 1 / stages.reduce((total, c) => total + 1 / c, 0);
      expect(share).toBeCloseTo(series / stages[3]!, 12);
    }
  });

  test("no tolerance, no band; one in series needs none", () => {
    expect(predictedShares(sheetInput({ unit: BARE }))[0]).toMatchObject({ low: null, high: null, share: 1 / 8 });
    const single = sheetInput({
      unit: BARE,
      shape: { series: 1, ties: "strings" },
      brief: { voltage: "300 V", energy: "10 J" },
    });
    expect(predictedShares(single)[0]).toMatchObject({ share: 1, low: 1 - METER.relative, high: 1 + METER.relative });
  });

  test("STEPS are those of practice: 10, 25, 50, 75, 100 %", () => {
    expect(STEPS).toEqual([0.1, 0.25, 0.5, 0.75, 1]);
  });
});
