// Source: [methods-derived] limits of the ladder: no segments, segments alone, late sharing; the simulator is in ladderSimulator.test.ts.
import { describe, expect, test } from "vitest";
import { type Branches, placeShares, taperOf } from "../../src/pulse/busPlace.ts";
import { near } from "./near.ts";

const UNIT = { capacitance: 1e-4, toleranceLow: 0, toleranceHigh: 0 };
const BANK: Branches = { unit: UNIT, esr: 0.02, esl: 4e-8, series: 1, parallel: 6 };
const SEGMENT = { resistance: 5e-4, inductance: 4e-8 };
const COURSE = {
  voltage: 2000,
  drive: { kind: "load", load: { resistance: 0.03, inductance: 1e-6 } },
  seconds: 1e-3,
  toZero: false,
} as const;

describe("taperOf(parallel, place)", () => {
  test("fed at one end: (25 + 16 + 9 + 4 + 1)/36 of a segment; at the centre: two half segments and (4 + 1)/36 twice", () => {
    near(taperOf(6, { feed: "end", segment: SEGMENT }).inductance, (55 / 36) * 4e-8, 1e-12);
    const centre = taperOf(6, { feed: "centre", segment: SEGMENT });
    near(centre.inductance, (2 * (4.5 + 4 + 1) * 4e-8) / 36, 1e-12);
    near(centre.resistance, (2 * (4.5 + 4 + 1) * 5e-4) / 36, 1e-12);
    near(taperOf(5, { feed: "centre", segment: SEGMENT }).inductance, (2 * (4 + 1) * 4e-8) / 25, 1e-12);
    expect(taperOf(1, { feed: "end", segment: SEGMENT })).toEqual({ resistance: 0, inductance: 0 });
  });
});

describe("placeShares(branches, place, course)", () => {
  test("without segments all carry alike, and the tolerance alone decides, as by capacitance", () => {
    const unit = { ...UNIT, toleranceLow: 0.1, toleranceHigh: 0.2 };
    const none = { resistance: 0, inductance: 0 };
    const slow = { ...COURSE, drive: { kind: "load", load: { resistance: 1, inductance: 1e-6 } } } as const;
    const found = placeShares({ ...BANK, unit, esr: 1e-5, esl: 1e-12 }, { feed: "end", segment: none }, slow);
    for (const share of found.alike) near(share, 1 / 6, 1e-9);
    near(found.share, 1.2 / (1.2 + 5 * 0.9), 1e-4);
    near(found.byPlace, 1, 1e-9);
  });

  test("a slow shot through little bus divides evenly; a fast one does not, and the centre feed mends it", () => {
    const slow = placeShares(
      BANK,
      { feed: "end", segment: { resistance: 1e-5, inductance: 1e-9 } },
      { ...COURSE, drive: { kind: "load", load: { resistance: 0.5, inductance: 5e-5 } } },
    );
    for (const share of slow.alike) near(share, 1 / 6, 0.01);
    const fast = placeShares(BANK, { feed: "end", segment: SEGMENT }, COURSE);
    expect(fast.share * 6).toBeGreaterThan(1.05);
    expect(fast.alike[0]).not.toBeCloseTo(1 / 6, 3);
    expect(fast.otherFeed).toBeLessThan(Math.max(...fast.alike));
  });

  test("fed at the centre the arms are mirror images; the actions add up to no less than an even division", () => {
    const { alike, action } = placeShares(BANK, { feed: "centre", segment: SEGMENT }, COURSE);
    for (let k = 0; k < 3; k++) near(alike[k] as number, alike[5 - k] as number, 1e-6);
    expect(action).toBeGreaterThanOrEqual(1 / 36);
  });

  test("columns of n units are n ESR, n ESL and C/n", () => {
    const column = placeShares({ ...BANK, series: 2, parallel: 4 }, { feed: "end", segment: SEGMENT }, COURSE);
    const units = { ...UNIT, capacitance: 5e-5 };
    const single = placeShares(
      { ...BANK, unit: units, esr: 0.04, esl: 8e-8, parallel: 4 },
      { feed: "end", segment: SEGMENT },
      COURSE,
    );
    near(column.share, single.share, 1e-12);
  });
});

describe("the lowest voltage of placeShares(branches, place, course)", () => {
  // The same ladders integrated by scipy's DOP853 at 1e-10, all units alike and over every corner of their capacitances.
  const cases = [
    {
      unit: { capacitance: 1e-4, toleranceLow: 0.05, toleranceHigh: 0.05 },
      branch: { esr: 0.01, esl: 1e-7, parallel: 3 },
      place: { feed: "end", segment: { resistance: 5e-4, inductance: 50e-9 } },
      load: { resistance: 0.02, inductance: 200e-9 },
      seconds: 4e-4,
      alike: -0.29274478,
      worst: -0.30567356,
    },
    {
      unit: { capacitance: 5e-5, toleranceLow: 0.1, toleranceHigh: 0.5 },
      branch: { esr: 0.008, esl: 6e-8, parallel: 3 },
      place: { feed: "end", segment: { resistance: 5e-4, inductance: 50e-9 } },
      load: { resistance: 0.02, inductance: 200e-9 },
      seconds: 4e-4,
      alike: -0.42179833,
      worst: -0.4453398,
    },
    {
      unit: { capacitance: 25e-6, toleranceLow: 0.1, toleranceHigh: 0.5 },
      branch: { esr: 0.016, esl: 1.2e-7, parallel: 4 },
      place: { feed: "centre", segment: { resistance: 2e-3, inductance: 150e-9 } },
      load: { resistance: 0.01, inductance: 200e-9 },
      seconds: 2e-4,
      alike: -0.70317402,
      worst: -0.789098,
    },
  ] as const;
  for (const { unit, branch, place, load, seconds, alike, worst } of cases)
    test(`${branch.parallel} on a bus fed at ${place.feed}: alike ${alike}, worst of all corners ${worst}`, () => {
      const course = { voltage: 15000, drive: { kind: "load", load }, seconds, toZero: false } as const;
      const same = { ...unit, toleranceLow: 0, toleranceHigh: 0 };
      near(placeShares({ unit: same, series: 1, ...branch }, place, course).lowest, alike, 1e-4);
      near(placeShares({ unit, series: 1, ...branch }, place, course).lowest, worst, 1e-4);
    });

  test("a current that is given is followed with alike units alone: another capacitance would be emptied by a charge not its own", () => {
    const drive = { kind: "given", current: () => 1000 } as const;
    const unit = { ...UNIT, toleranceLow: 0.2, toleranceHigh: 0.2 };
    const place = { feed: "end", segment: { resistance: 0, inductance: 0 } } as const;
    const found = placeShares({ ...BANK, unit }, place, { ...COURSE, drive, seconds: 1e-3 });
    // 1 C out of 600 uF at 2 kV leaves 333 V.
    near(found.lowest, 1 - 1 / (6e-4 * 2000), 1e-3);
  });
});
