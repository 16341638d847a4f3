// What can hurt, as findings: the hazard layer's, one shorted unit, and the brief's own limits.
import { describe, expect, test } from "vitest";
import { hazards, limits, oneShorted } from "../../src/search/dangerFindings.ts";
import { bankOf, briefOf, findingsInput, UNIT } from "../support/bank.ts";

describe("hazards(input)", () => {
  test("600 J at 2 kV, the high end of the capacitance, is hazardous; the bleed is told elsewhere", () => {
    const found = hazards(findingsInput());
    const energy = found.find((f) => f.id === "energy-class");
    expect(energy).toMatchObject({ verdict: "warn", limit: 0.25 });
    expect(energy?.value).toBeCloseTo(600, 9);
    expect(found.map((f) => f.id)).not.toContain("bleed-time");
  });
});

describe("oneShorted(input)", () => {
  test("seven left of eight, one low and six high: 400 V on units rated 400 V passes at once, not after a hold without end", () => {
    const worst = (2000 * 1.2) / (1.2 + 6 * 0.8);
    const [found] = oneShorted(findingsInput({ brief: briefOf({ hold: "0 s" }) }));
    expect(found?.value).toBeCloseTo(worst, 9);
    const [held] = oneShorted(findingsInput());
    expect(held?.value).toBeGreaterThan(worst);
    expect(held?.verdict).toBe("warn");
    expect(found).toMatchObject({ verdict: "pass", limit: 400, state: "faulted" });
    expect(oneShorted(findingsInput({ unit: { ...UNIT, surgeVoltage: 450 } }))[0]).toMatchObject({ limit: 450 });
  });
  test("above the rating it warns: a fault must come first", () =>
    expect(oneShorted(findingsInput({ brief: briefOf({ voltage: "2.1 kV" }) }))[0]?.verdict).toBe("warn"));
  test("one in series has no sound neighbours", () =>
    expect(
      oneShorted(
        findingsInput({ result: bankOf({ layout: { part: UNIT.part, series: 1, parallel: 2, ties: "strings" } }) }),
      ),
    ).toEqual([]));
});

describe("limits(input)", () => {
  test("none asked: none found", () => expect(limits(findingsInput())).toEqual([]));
  test("joules into a shorted unit: its neighbour's half C V^2 at the worst volts against the limit", () => {
    const [found] = limits(findingsInput({ brief: briefOf({ maxFaultEnergy: "10 J" }) }));
    const volts = (bankOf().stress ?? 0) * 400;
    expect(found?.value).toBeCloseTo((1e-3 * volts * volts) / 2, 6);
    expect(found).toMatchObject({ verdict: "fail", limit: 10 });
  });
});
