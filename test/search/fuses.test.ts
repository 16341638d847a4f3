// Source: [methods-derived] A15 for what a fuse sees: 3/2 C V^2 of three neighbours over the loop's resistance.
import { describe, expect, test } from "vitest";
import type { Fuse } from "../../src/catalog/index.ts";
import { chooseFuse, fittedFuse, fuseCount, fuseOf, fuseSeesAt } from "../../src/search/fuses.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

const fuse = (name: string, melting: number | undefined, clearing: number | undefined, price: number): Fuse =>
  ({ fuse: name, melting, clearing, voltage: 3000, currency: "EUR", price }) as Fuse;
const SEES = { normalAction: 10, faultAction: 9000, leastFaultAction: 4000, voltage: 2000 };
const shape = { series: 1, parallel: 4, ties: "strings" } as const;

describe("chooseFuse(layout, rows, sees)", () => {
  test("the cheapest that lives, clears and breaks; unknown ratings never do", () => {
    const rows = [
      fuse("dear", 100, 1000, 900),
      fuse("cheap", 60, 1000, 500),
      fuse("tired", 20, 500, 100),
      fuse("slow", 400, 9000, 100),
      fuse("blank", undefined, 1000, 1),
    ];
    const choice = chooseFuse(shape, rows, SEES);
    expect(choice.chosen?.row.fuse).toBe("cheap");
    expect(choice.chosen?.purchase.cost).toBe(2000);
    expect(choice.tried).toHaveLength(5);
    expect(chooseFuse(shape, rows.slice(2), SEES).chosen).toBeNull();
    expect(chooseFuse(shape, rows, { ...SEES, leastFaultAction: null }).chosen).toBeNull();
    expect(chooseFuse(shape, rows, { ...SEES, voltage: 3001 }).chosen).toBeNull();
  });

  test("stock and single strings", () => {
    expect(chooseFuse(shape, [{ ...fuse("few", 60, 1000, 5), available: 3 }], SEES).chosen).toBeNull();
    expect(chooseFuse({ ...shape, parallel: 1 }, [fuse("any", 60, 1000, 5)], SEES)).toMatchObject({
      count: 0,
      chosen: null,
    });
  });
});

describe("fuseCount(shape)", () => {
  test("one to a unit where units share both ends, one to a string otherwise", () => {
    expect(fuseCount({ series: 2, parallel: 4, ties: "cross-tied" })).toBe(8);
    expect(fuseCount({ series: 2, parallel: 4, ties: "strings" })).toBe(4);
    expect(fuseCount({ series: 1, parallel: 4, ties: "strings" })).toBe(4);
    expect(fuseCount({ series: 4, parallel: 1, ties: "strings" })).toBe(0);
  });
});

describe("fittedFuse({ layout, unit, brief }, rows)", () => {
  test("sees the action of the worst unit and of the neighbours", () => {
    const brief = shotBrief();
    const { sees } = fittedFuse({ layout: shotLayout(brief, shape), unit: FILM, brief }, []);
    // loop of the fault: a third of 100 mohm; energy 3 x 200 J, a tenth more or less by the tolerance
    expect(sees.faultAction).toBeCloseTo((1.1 * 600) / (0.1 / 3), 3);
    expect(sees.leastFaultAction).toBeCloseTo((0.9 * 600) / (0.1 / 3), 3);
    expect(sees.voltage).toBeCloseTo(2000, 9);
    expect(sees.normalAction).toBeGreaterThan(0);
  });

  test("without a load the normal shot is unknown, and no fuse can be chosen", () => {
    const brief = shotBrief({ load: undefined });
    const choice = fittedFuse({ layout: shotLayout(brief, shape), unit: FILM, brief }, [fuse("any", 1e6, 1, 5)]);
    expect(choice).toMatchObject({ chosen: null, sees: { normalAction: null } });
  });

  test("fuseOf: blank is unknown; fuseSeesAt: an unknown tolerance or load leaves the normal action unknown, an unknown worst unit the whole voltage", () => {
    expect(fuseOf({ fuse: "x" } as Fuse)).toEqual({ meltingAction: null, clearingAction: null, dcVoltage: null });
    const loose = { ...FILM, tolerance: undefined } as unknown as typeof FILM;
    const sees = fuseSeesAt(shotBrief(), loose, shape, Number.POSITIVE_INFINITY);
    expect(sees).toMatchObject({ normalAction: null, voltage: 2000 });
    const { ties, series, parallel } = shape;
    const short = fuseSeesAt(shotBrief({ shortResistance: "0.1 ohm" }), FILM, { ties, series, parallel }, 2000);
    // the short's own resistance joins a third of the neighbours' 100 mohm
    expect(short.faultAction).toBeCloseTo((1.1 * 600) / (0.1 / 3 + 0.1), 6);
  });
});
