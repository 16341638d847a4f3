import { describe, expect, test } from "vitest";
import { plan } from "../../src/search/plan.ts";
import { FAMILIES } from "../support/bank.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const run = (more: Record<string, unknown>) => {
  const read = plan({ brief: shotBrief({ maxUnits: 3, maxSeries: 2, ...more }), parts: [FILM], families: FAMILIES });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};

describe("limitChanges(input), when limits leave nothing", () => {
  test("the value said is one with which something fits", () => {
    const none = run({ maxPeakCurrent: "100 A" });
    expect(none.layouts).toEqual([]);
    const [change] = none.changes;
    expect(change).toMatchObject({ field: "maxPeakCurrent", from: 100 });
    expect(run({ maxPeakCurrent: change?.to }).layouts.length).toBeGreaterThan(0);
  });

  test("it is the least: a thousandth less fits nothing, though more in parallel than the other limits ask for is tried", () => {
    const asked = { maxUnits: 12, maxSeries: 1, maxPeakCurrent: "100 A" };
    const [change] = run(asked).changes;
    expect(change?.layout).toMatch(/1s12p/);
    expect(run({ ...asked, maxPeakCurrent: change?.to }).layouts.length).toBeGreaterThan(0);
    expect(run({ ...asked, maxPeakCurrent: (change?.to ?? 0) * 0.999 }).layouts).toEqual([]);
  });

  test("a part of the rating stays a part; a least life goes down", () => {
    const part = run({ maxPeakCurrent: "5 %" }).changes[0];
    expect(part).toMatchObject({ note: "rating", from: 0.05 });
    expect(run({ maxPeakCurrent: `${(part?.to ?? 0) * 100} %` }).layouts.length).toBeGreaterThan(0);
    const life = run({ minLife: 1e6 }).changes[0];
    expect(life?.to).toBeLessThan(1e6);
    expect(run({ minLife: life?.to }).layouts.length).toBeGreaterThan(0);
  });

  test("two limits of which neither alone gives way: nothing is promised", () => {
    expect(run({ maxPeakCurrent: "1 A", minLife: 1e6 }).changes).toEqual([]);
  });
});
