// Plate capacitors against the worked examples, published numerical solutions, and a moment method solved by ml-matrix.
import { Matrix, solve } from "ml-matrix";
import { describe, expect, test } from "vitest";
import {
  AIR_STRENGTH,
  discEdge,
  ELECTRIC_CONSTANT,
  PERMITTIVITIES,
  type PlateRow,
  plateCapacitor,
  stackEdge,
  stripEdge,
} from "../../src/catalog/plate.ts";

const sheet: PlateRow = { plateArea: 0.12, gap: 100e-6, permittivity: 2.2, plates: 11, breakdownField: 30e6 };
const made = (row: PlateRow) => {
  const read = plateCapacitor(row);
  if (!read.ok) throw new Error(read.refusals[0]!.code);
  return read.value;
};
const code = (row: PlateRow) => {
  const read = plateCapacitor(row, { file: "home.csv", line: 4 });
  return read.ok ? "ok" : `${read.refusals[0]!.code} ${read.refusals[0]!.place.field} ${read.refusals[0]!.place.line}`;
};

describe("plateCapacitor(row) refuses", () => {
  test.each([
    [{ ...sheet, plateArea: undefined }, "missing-value plate area 4"],
    [{ ...sheet, gap: undefined }, "missing-value gap 4"],
    [{ ...sheet, permittivity: undefined }, "missing-value permittivity 4"],
    [{ ...sheet, plates: undefined }, "missing-value plates 4"],
    [{ ...sheet, gap: 0 }, "out-of-range gap 4"],
    [{ ...sheet, plateArea: -1 }, "out-of-range plate area 4"],
    [{ ...sheet, plateArea: Number.POSITIVE_INFINITY }, "out-of-range plate area 4"],
    [{ ...sheet, permittivity: 0.5 }, "out-of-range permittivity 4"],
    [{ ...sheet, permittivity: Number.NaN }, "out-of-range permittivity 4"],
    [{ ...sheet, plates: 1 }, "out-of-range plates 4"],
    [{ ...sheet, plates: 10.5 }, "out-of-range plates 4"],
    [{ ...sheet, breakdownField: 0 }, "out-of-range breakdown field 4"],
  ])("%o: %s", (row, want) => expect(code(row)).toBe(want));
});

describe("plateCapacitor(row)", () => {
  test("A16 of the methods page: stack 0.233750558 uF without its edge, 3 kV at 30 kV/mm, 1.05187751 J", () => {
    const { ideal, voltage } = made(sheet);
    expect(ideal / 2.33750558e-7).toBeCloseTo(1, 8);
    expect(voltage).toBeCloseTo(3000, 9);
    expect((ideal * 3000 ** 2) / 2 / 1.05187751).toBeCloseTo(1, 8);
  });

  test("A16: discs of 0.1 m, gap 5 mm: ideal 55.6325028 pF, Kirchhoff 60.8680291 pF, 0.27 % below Love's 61.0306108 pF", () => {
    const disc = made({ plateArea: Math.PI * 0.01, gap: 0.005, permittivity: 1, plates: 2 });
    expect(disc.ideal / 5.56325028e-11).toBeCloseTo(1, 8);
    expect(disc.capacitance / 6.08680291e-11).toBeCloseTo(1, 8);
    expect(1 - disc.capacitance / 6.10306108e-11).toBeCloseTo(0.0027, 4);
    expect(disc.validity).toBe("good");
  });

  test("without a breakdown field there is no voltage, not a voltage of zero", () =>
    expect(made({ ...sheet, breakdownField: undefined })).not.toHaveProperty("voltage"));

  test("in the same dielectric all round, the edge is er times that in air; air is the default", () => {
    expect(made({ ...sheet, outside: "same" }).edge / made(sheet).edge).toBeCloseTo(2.2, 12);
    expect(made({ ...sheet, outside: "air" })).toEqual(made(sheet));
  });

  test("a shape not known is taken as a disc: below the square and the 2:1 plate of the same area", () => {
    for (const [length, width] of [
      [0.2, 0.2],
      [0.2 * Math.SQRT2, 0.1 * Math.SQRT2],
    ] as const) {
      for (const plates of [2, 9]) {
        const row = { plateArea: 0.04, gap: 0.004, permittivity: 1, plates };
        const square = made({ ...row, shape: { kind: "rectangle", length, width } });
        expect(made(row).edge).toBeGreaterThan(0);
        expect(made(row).edge).toBeLessThan(square.edge);
      }
    }
  });

  test("square, d/a = 0.1: additive form 1.327252 of ideal, 1.7 % over the 3-D moment method of the methods page", () => {
    const square = made({
      plateArea: 0.01,
      gap: 0.01,
      permittivity: 1,
      plates: 2,
      shape: { kind: "rectangle", length: 0.1, width: 0.1 },
    });
    const product = (1 + 0.1 / Math.PI + (0.1 / Math.PI) * Math.log(20 * Math.PI)) ** 2;
    expect(square.capacitance / square.ideal).toBeCloseTo(1.327252, 6);
    // The page gives the product form as 3.8 % over the same moment method, hence the truth and this form's error.
    expect(square.capacitance / square.ideal / (product / 1.038) - 1).toBeCloseTo(0.017, 2);
  });

  test("validity by gap over radius: good to 0.1, rough to 0.5, beyond that no edge is added", () => {
    const at = (gap: number) => made({ plateArea: Math.PI, gap, permittivity: 1, plates: 2 });
    expect([at(0.1).validity, at(0.11).validity, at(0.5).validity, at(0.51).validity]).toEqual([
      "good",
      "rough",
      "rough",
      "outside",
    ]);
    expect(at(0.51).edge).toBe(0);
  });

  test("corona: polythene 0.1 mm at 40 kV/mm stands 4 kV, but air beside it glows from 3 kV/mm/2.1 = 143 V", () => {
    const stack = made({ ...sheet, permittivity: PERMITTIVITIES.polythene, breakdownField: 40e6 });
    expect(stack.voltage).toBeCloseTo(4000, 9);
    expect(stack.coronaVoltage).toBeCloseTo((AIR_STRENGTH / 2.1) * 1e-4, 9);
    expect(stack.coronaLimited).toBe(true);
  });

  test("air plates have no corona voltage apart from breakdown itself", () => {
    const air = made({ plateArea: 0.03, gap: 0.005, permittivity: PERMITTIVITIES.air, plates: 2, breakdownField: 3e6 });
    expect([air.coronaVoltage, air.coronaLimited]).toEqual([null, false]);
  });

  test("one microfarad holds one microcoulomb for each volt (common practice, no source): Q = C V", () => {
    const gap = 1e-4;
    const plateArea = (1e-6 * gap) / ELECTRIC_CONSTANT;
    expect(made({ plateArea, gap, permittivity: 1, plates: 2 }).ideal * 1).toBeCloseTo(1e-6, 15);
  });
});

describe("discEdge({ radius, gap }) against Love's integral equation, C/(eps0 R) as the methods page computed it", () => {
  test.each([
    [0.2, 20.703049, 20.2347197],
    [0.1, 36.9323219, 36.6358302],
    [0.05, 68.9285251, 68.744904],
    [0.02, 164.0036484, 163.9089743],
  ])("d/R = %d: Love %d, Kirchhoff %d", (gap, love, kirchhoff) => {
    const value = Math.PI / gap + discEdge({ radius: 1, gap });
    expect(value / kirchhoff).toBeCloseTo(1, 8);
    expect(value).toBeLessThan(love);
  });
});

/**
 * Capacitance over eps0 of `plates` alternating strips of unit gap, per metre, by a 2-D moment method: constant charge on
 * graded segments, no charge in all, the linear system solved by ml-matrix.
 */
function momentStrips(plates: number, width: number, segments: number): number {
  const edges = Array.from({ length: segments + 1 }, (_, k) => (-width / 2) * Math.cos((Math.PI * k) / segments));
  const cells = Array.from({ length: plates * segments }, (_, k) => {
    const [from, to] = [edges[k % segments]!, edges[(k % segments) + 1]!];
    return { x: (from + to) / 2, half: (to - from) / 2, y: Math.floor(k / segments) };
  });
  const logIntegral = (u: number, y: number): number =>
    (u * Math.log(u * u + y * y)) / 2 - u + (y === 0 ? 0 : y * Math.atan2(u, y));
  const count = cells.length;
  const system = Matrix.zeros(count + 1, count + 1);
  cells.forEach((at, row) => {
    cells.forEach((from, column) => {
      const y = Math.abs(at.y - from.y);
      const u = at.x - from.x;
      system.set(row, column, -(logIntegral(u + from.half, y) - logIntegral(u - from.half, y)) / (2 * Math.PI));
    });
    system.set(row, count, -1);
    system.set(count, row, 2 * at.half);
  });
  const potentials = Matrix.columnVector([...cells.map((cell) => (cell.y % 2 === 0 ? 1 : 0)), 0]);
  const density = solve(system, potentials);
  return cells.reduce((sum, cell, k) => sum + (cell.y % 2 === 0 ? density.get(k, 0) * 2 * cell.half : 0), 0);
}

describe("edges against a 2-D moment method (ml-matrix)", () => {
  test("stripEdge: width 20 gaps, 0.12 % low", () => {
    const whole = momentStrips(2, 20, 60);
    expect((20 + stripEdge({ length: 1, width: 20, gap: 1 })) / whole).toBeCloseTo(0.9988, 3);
  });

  test("stackEdge: a lower estimate for 3, 4 and 7 plates, nearer with more; (N - 1) times the pair's edge is far too much", () => {
    const excess = (plates: number) => momentStrips(plates, 10, 36) - 10 * (plates - 1);
    const share = [3, 5, 7].map((plates) => stackEdge({ perimeter: 2, plates }) / excess(plates));
    for (const one of [...share, stackEdge({ perimeter: 2, plates: 4 }) / excess(4)]) expect(one).toBeLessThan(1);
    expect(share[0]!).toBeLessThan(share[1]!);
    expect(share[1]!).toBeLessThan(share[2]!);
    expect(share[2]!).toBeGreaterThan(0.75);
    expect((6 * stripEdge({ length: 1, width: 10, gap: 1 })) / excess(7)).toBeGreaterThan(2);
  });
});
