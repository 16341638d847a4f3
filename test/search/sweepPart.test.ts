// One part: its layouts counted and kept, its reason when there are none. All parts together are held against a brute force in the sweep's test.
import { describe, expect, test } from "vitest";
import { requiredCapacitance } from "../../src/bank/index.ts";
import { type Capacitor, DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { type BriefInput, readBrief } from "../../src/search/index.ts";
import { sieveOf } from "../../src/search/sieve.ts";
import { type Run, sweepPart } from "../../src/search/sweepPart.ts";
import { newTable, pushRow } from "../../src/search/table.ts";
import { must } from "../support/labParts.ts";

const unit: Capacitor = {
  part: "a",
  capacitance: 3300e-6,
  voltage: 450,
  tolerance: { low: 0.2, high: 0.2 },
  leakage: 1e-3,
  price: 390,
  currency: "EUR",
  states: {},
  file: "",
  line: 2,
};
const runOf = (over: Partial<BriefInput> = {}, part: Partial<Capacitor> = {}): Run => {
  const brief = must(readBrief({ energy: 2400, voltage: 1600, ripple: 1, maxSeries: 12, ...over }));
  const required = requiredCapacitance(brief);
  const input = { parts: [{ ...unit, ...part }], families: [DEFAULT_FAMILY], brief, required, currency: "EUR" };
  return { input, judge: null, table: newTable(), sieve: null, count: 0 };
};

describe("sweepPart(run, index)", () => {
  test("without a sieve: from the least n to the limit, cross-tied before strings, each pushed and counted", () => {
    const run = runOf();
    expect(sweepPart(run, 0)).toBeNull();
    const rows = Array.from({ length: run.table.count }, (_, i) => [
      run.table.series[i],
      run.table.parallel[i],
      run.table.tied[i],
    ]);
    // 3300 uF less 20 % in n needs n C/2640 uF in parallel with C = 1875 uF; six in series share 1600 V within 405 V.
    expect(rows[0]).toEqual([6, 5, 1]);
    expect(rows[1]).toEqual([6, 5, 0]);
    expect(rows.length).toBe(14);
    expect(run.count).toBe(14);
  });
  test.each([
    ["series-limit", { maxSeries: 3 }, {}, 6],
    ["unit-limit", { maxUnits: 20 }, {}, 30],
    ["stock", {}, { available: 29 }, 30],
    ["volume-unknown", { maxVolume: "1 L" }, {}, null],
    ["mass-unknown", { maxMass: "1 kg" }, {}, null],
    ["cost-limit", { maxCost: 100 }, {}, 117],
    ["balance", {}, { leakage: 90 }, null],
  ] as const)("nothing fits for %s", (reason, brief, part, value) => {
    const run = runOf(brief, part);
    expect(sweepPart(run, 0)).toMatchObject({ reason, value });
    expect([run.count, run.table.count]).toEqual([0, 0]);
  });
  test("with a sieve that has a far better layout and enough for the order: all are counted, none is kept", () => {
    const best = newTable();
    const figures = { cost: 1, volume: 1e-9, mass: 1e-9, stress: 0.01 };
    pushRow(best, { part: 1, series: 1, parallel: 1, tied: false, family: -1, ...figures });
    const strong = { rows: Float64Array.of(0.01, 1, 1, 1e-9, 1e-9), last: 0 };
    const run = { ...runOf(), sieve: sieveOf(best, strong, { limit: 1, rank: "cost" }) };
    expect(sweepPart(run, 0)).toBeNull();
    expect([run.count, run.table.count]).toEqual([14, 0]);
    // Fourteen again, though the most reaches only up to the least n that is in stock.
    const few = { ...runOf({}, { available: 30 }), sieve: run.sieve };
    expect(sweepPart(few, 0)).toBeNull();
    expect([few.count, few.table.count]).toEqual([2, 0]);
  });
});
