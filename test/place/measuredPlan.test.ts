import { describe, expect, test } from "vitest";
import { DEFAULT_FAMILY, readCapacitors } from "../../src/catalog/index.ts";
import { measuredPlan, partAsMeasured } from "../../src/place/measuredPlan.ts";
import { readBrief } from "../../src/search/index.ts";
import { bestGap, stagesGap } from "./brute.ts";
import { wholes } from "./lots.ts";

const catalogue = readCapacitors("part,capacitance [uF],voltage [V],tolerance [%],polarised\nu,100,400,20,no\n", "c");
const part = catalogue.ok ? catalogue.value.parts[0]! : null!;
const values = wholes(12, 5, 95, 105);
const units = values.map((c, i) => ({ serial: String(i), capacitance: c * 1e-6 }));
const read = readBrief({ energy: "10 J", voltage: "710 V", ripple: 1, basis: "measured", maxSeries: 4 });
const brief = read.ok ? read.value : null!;

test("partAsMeasured: mean, extremes and the meter's doubt, greatest leakage where all are known, only what was measured in stock", () => {
  const made = partAsMeasured(
    part,
    [
      { serial: "a", capacitance: 90e-6 },
      { serial: "b", capacitance: 110e-6 },
    ],
    0.01,
  );
  expect(made.capacitance).toBeCloseTo(100e-6, 12);
  expect(made.tolerance?.low).toBeCloseTo(1 - 0.9 * 0.99, 12);
  expect(made.tolerance?.high).toBeCloseTo(1.1 * 1.01 - 1, 12);
  expect(made).toMatchObject({ onHand: 2, available: 0, states: { capacitance: { state: "measured" } } });
  expect(made.leakage).toBe(undefined);
  const leaky = units.map((unit, i) => ({ ...unit, leakage: (i + 1) * 1e-6 }));
  expect(partAsMeasured(part, leaky, 0).leakage).toBeCloseTo(12e-6, 15);
});

describe("measuredPlan(input)", () => {
  const input = { brief, part, units, families: [DEFAULT_FAMILY], limit: 0, rank: "units" as const };

  test("two in series, where the worst case of 20 % needs three: 710/2 = 355 V of 360 V", () => {
    const planned = measuredPlan(input);
    if (!planned.ok) throw new Error();
    expect(planned.value.least?.series).toBe(2);
    // 20 %: V_1 = V 1.2/(1.2 + 0.8 (n - 1)), 426 V of 360 V at n = 2, 304 V at n = 3.
    expect(planned.value.worstCase?.series).toBe(3);
  });

  test("what is told of a layout is what full enumeration of the placing finds, with the doubt on top", () => {
    const planned = measuredPlan({ ...input, uncertainty: 0.001 });
    if (!planned.ok) throw new Error();
    const shares = planned.value.placed.filter(({ id }) => id.startsWith("u 2s2p cross-tied"));
    expect(planned.value.placed.length).toBe(planned.value.result.layouts.length);
    for (const share of shares) {
      const best = bestGap(values, { groups: 2, size: 2 }, stagesGap);
      expect(share.gap).toBeGreaterThanOrEqual(best - 1e-12);
      expect(share.charging).toBeCloseTo(355 * (1 + share.gap) * (1 + 0.002 / Math.sqrt(2)), 6);
    }
  });

  test("a meter too coarse to tell takes the gain away", () => {
    const planned = measuredPlan({ ...input, uncertainty: 0.1 });
    expect(planned.ok && planned.value.least?.series).toBe(3);
  });
});
