// The tiers of stored energy at and beside their edges, against NFPA 70E Article 360 and the LBNL pages as the methods page gives them.
import { describe, expect, test } from "vitest";
import { ARTICLE_360, energyClass, tierAt } from "../../src/hazard/energyClass.ts";

describe("energyClass({ energy, voltage })", () => {
  test.each([
    // energy, voltage, threshold, hazardous, arc blast, by 10 J
    [0, 0, 100, false, false, false],
    [99.999, 99.999, 100, false, false, false],
    [100, 99.999, 100, true, false, false],
    [0.999, 100, 1, false, false, false],
    [1, 100, 1, true, false, false],
    [1, 399.999, 1, true, false, false],
    [0.2499, 400, 0.25, false, false, false],
    [0.25, 400, 0.25, true, false, false],
    [9.999, 100, 1, true, false, false],
    [10, 100, 1, true, false, true],
    [9999, 2200, 0.25, true, false, true],
    [10000, 2200, 0.25, true, true, true],
    [50000, 48, 100, true, false, false],
  ])("%d J at %d V: threshold %d J, hazardous %s, blast %s, by ten joules %s", (energy, voltage, ...want) => {
    const found = energyClass({ energy, voltage });
    expect([found.threshold, found.hazardous, found.arcBlast, found.shockByTenJoule]).toEqual(want);
  });

  test("says which rule fired and how the limit was read", () =>
    expect(energyClass({ energy: 5280, voltage: 1600 })).toMatchObject({
      ruleId: "nfpa-70e-360",
      reading: "at or over",
    }));

  test("A5 of the methods page: 0.25 J at 1600 V, 100 J at 60 V", () => {
    expect(energyClass({ energy: 1056, voltage: 1600 })).toMatchObject({ threshold: 0.25, hazardous: true });
    expect(energyClass({ energy: 1.485, voltage: 60 })).toMatchObject({ threshold: 100, hazardous: false });
  });
});

describe("tierAt(voltage, tiers)", () => {
  test("where two tiers hold the stricter does, in whatever order they stand", () => {
    expect(tierAt(5000, [...ARTICLE_360].reverse())).toEqual({ fromVoltage: 400, energy: 0.25 });
    expect(
      tierAt(500, [
        { fromVoltage: 0, energy: 1 },
        { fromVoltage: 400, energy: 50 },
      ]).energy,
    ).toBe(1);
  });
});
