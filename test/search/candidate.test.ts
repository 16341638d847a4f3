// A part made ready: its limit, its capacitance by each basis, its leak.
import { describe, expect, test } from "vitest";
import type { Capacitor } from "../../src/catalog/index.ts";
import { type Brief, readBrief } from "../../src/search/brief.ts";
import { leakOf, prepare, unitLimit } from "../../src/search/candidate.ts";

const unit = (over: Partial<Capacitor> = {}): Capacitor => ({
  part: "a",
  capacitance: 1e-3,
  voltage: 450,
  tolerance: { low: 0.2, high: 0.3 },
  states: {},
  file: "c.csv",
  line: 2,
  ...over,
});
const brief = (over: object = {}): Brief => {
  const read = readBrief({ energy: 1, voltage: 400, ripple: 1, ...over });
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value;
};

describe("unitLimit(unit, brief): the lower derating holds", () => {
  test.each([
    [undefined, 0.9, 405],
    [0.85, 0.9, 382.5],
    [0.95, 0.9, 405],
    [1, 1, 450],
  ])("row %s, brief %d: %d V", (row, derating, limit) =>
    expect(unitLimit(row === undefined ? unit() : unit({ derating: row }), { derating })).toBeCloseTo(limit, 9),
  );
});

describe("leakOf(unit)", () => {
  test("nothing known is null, not zero", () => expect(leakOf(unit())).toBe(null));
  test("a leakage of zero is known", () =>
    expect(leakOf(unit({ leakage: 0 }))).toEqual({ kind: "current", amperes: 0 }));
  test("insulation where there is no current", () =>
    expect(leakOf(unit({ insulation: 1e9 }))).toEqual({ kind: "insulation", ohms: 1e9 }));
});

describe("prepare(unit, brief): capacitance by the basis", () => {
  test.each([
    ["worst case", 0, 0.8e-3],
    ["worst case", 0.1, 0.72e-3],
    ["nominal", 0.1, 1e-3],
    ["statistical", 0, 0.8e-3],
  ])("%s, ageing %d: %d F", (basis, ageing, c) =>
    expect(prepare(unit(), brief({ basis, ageing })).basis).toBeCloseTo(c, 12),
  );
  test("sizes unknown are null", () => expect(prepare(unit(), brief())).toMatchObject({ volume: null, mass: null }));
  test("tolerance unknown is null, not zero", () => {
    const { tolerance: _known, ...bare } = unit();
    expect(prepare(bare, brief()).tolerance).toBe(null);
  });
});
