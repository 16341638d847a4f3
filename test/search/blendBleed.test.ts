// How a blend empties, against exponentials by hand.
import { expect, test } from "vitest";
import { bleedOf } from "../../src/search/blendBleed.ts";
import type { Balance } from "../../src/search/index.ts";

const brief = { voltage: 900, overshoot: 0, touchSafe: 60 };
/** Chains of `series` resistors of R side by side; high C given. */
function group(series: number, chains: number, resistance: number, high: number | null) {
  const balance = { positions: series * chains, resistance, tolerance: 0.05 } as Balance;
  const ohms = (resistance * 1.05 * series) / chains;
  const seconds = high === null ? null : ohms * high * Math.log(15);
  return { series, balance, bleed: { seconds, toVoltage: 60 }, capacitance: { low: null, nominal: 1, high }, ohms };
}

test("bleedOf(layouts, brief): the slowest alone, and all through all, no slower than that", () => {
  const [a, b] = [group(3, 1, 1e5, 1e-3), group(4, 6, 2.2e5, 4e-4)];
  const found = bleedOf([a, b], brief);
  expect(found.seconds).toBeCloseTo(Math.max(a.bleed.seconds!, b.bleed.seconds!), 9);
  const together = ((1e-3 + 4e-4) / (1 / a.ohms + 1 / b.ohms)) * Math.log(900 / 60);
  expect(found.together).toBeCloseTo(together, 9);
  expect(found.together!).toBeLessThanOrEqual(found.seconds!);
});
test("a group without a chain never empties alone; the others drain it while joined", () => {
  const bare = {
    series: 1,
    balance: null,
    bleed: { seconds: null, toVoltage: 60 },
    capacitance: { low: 1, nominal: 1, high: 1e-3 },
  };
  const a = group(3, 1, 1e5, 1e-3);
  const found = bleedOf([a, bare], brief);
  expect(found.seconds).toBeNull();
  expect(found.together).toBeCloseTo(2e-3 * a.ohms * Math.log(15), 6);
  expect(bleedOf([bare], brief)).toEqual({ seconds: null, together: null, toVoltage: 60 });
});
test("unknown high capacitance is unknown, not zero; below touch-safe nothing need bleed", () => {
  expect(bleedOf([group(3, 1, 1e5, null)], brief)).toEqual({ seconds: null, together: null, toVoltage: 60 });
  expect(bleedOf([group(3, 1, 1e5, 1e-3)], { ...brief, voltage: 50 }).together).toBe(0);
});
