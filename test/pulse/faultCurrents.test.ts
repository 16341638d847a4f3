// faultCurrents: nothing known gives nothing, then the worked loop, then bounds.
import { describe, expect, test } from "vitest";
import {
  faultAction,
  faultPeak,
  leastFaultAction,
  loadShortLoop,
  rowShortLoop,
  unitShortLoop,
} from "../../src/pulse/faultCurrents.ts";
import { strings, tied } from "./faultBanks.ts";
import { near } from "./near.ts";

const known = { ...tied.unit, esr: 0.02, esl: 25e-9 };

describe("faultPeak(loop), faultAction(loop)", () => {
  test("no loop, or a loop of which nothing is known, has no peak and no action", () => {
    expect(faultPeak(null)).toBeNull();
    expect(faultPeak(unitShortLoop(tied))).toBeNull();
    expect(faultAction(unitShortLoop(tied))).toBeNull();
    expect(unitShortLoop({ ...tied, parallel: 1 })).toBeNull();
  });

  test("worked: 50 mohm of isolation gives 6400 A, an upper bound while ESR is unknown", () => {
    const peak = faultPeak(unitShortLoop({ ...tied, isolatingResistance: 0.05 }));
    near(peak?.amperes, 6400, 1e-12);
    expect(peak?.bound).toBe("upper bound");
  });

  test("worked: with no ESR at all the action through the faulted leg is 16 896 A^2 s", () => {
    const bank = { ...tied, isolatingResistance: 0.05, unit: { ...tied.unit, esr: 0, esl: 0 } };
    near(faultAction(unitShortLoop(bank)), 16896, 1e-12);
    expect(faultPeak(unitShortLoop(bank))?.bound).toBe("value");
  });

  test("ESR alone bounds it by V/R; with ESL too it is a value, and lower", () => {
    const half = faultPeak(unitShortLoop({ ...tied, unit: { ...known, esl: null } }));
    const whole = faultPeak(unitShortLoop({ ...tied, unit: known }));
    near(half?.amperes, 400 / (0.02 / 4), 1e-12);
    expect(half?.bound).toBe("upper bound");
    expect(whole?.bound).toBe("value");
    expect(whole?.amperes ?? 0).toBeLessThan(half?.amperes ?? 0);
  });

  test("a section inductance holds the peak down, the more the larger, and leaves the action as it is", () => {
    const peak = (sectionInductance: number) => faultPeak(unitShortLoop({ ...tied, unit: known, sectionInductance }));
    const loop = unitShortLoop({ ...tied, unit: known, sectionInductance: 1e-6 });
    near(loop?.inductance, 25e-9 / 4 + 1e-6 * (1 + 1 / 4), 1e-12);
    expect(peak(1e-6)?.amperes).toBeLessThan(peak(0)?.amperes as number);
    expect(peak(1e-5)?.amperes).toBeLessThan(peak(1e-6)?.amperes as number);
    near(faultAction(loop), faultAction(unitShortLoop({ ...tied, unit: known })) as number, 1e-12);
    near(loadShortLoop({ ...tied, unit: known, sectionInductance: 1e-6 }).inductance, (4 * (25e-9 + 1e-6)) / 5, 1e-12);
    near(loadShortLoop({ ...strings, unit: known, sectionInductance: 1e-6 }).inductance, (4 * 25e-9 + 1e-6) / 5, 1e-12);
    near(rowShortLoop({ ...tied, unit: known, sectionInductance: 1e-6 })?.inductance, (25e-9 + 1e-6) / 5, 1e-12);
  });

  test("action needs the whole resistance: with the bus unknown there is none, with nothing known none either", () => {
    expect(faultAction(null)).toBeNull();
    expect(faultAction(loadShortLoop({ ...tied, unit: known }))).toBeNull();
    expect(faultAction(unitShortLoop({ ...tied, unit: { ...known, esr: 0 } }))).toBeNull();
    near(faultAction(unitShortLoop({ ...tied, unit: known })), (4 * 3300e-6 * 400 ** 2) / 2 / 0.005, 1e-12);
  });

  test("two units side by side have a loop, of one neighbour", () => {
    near(unitShortLoop({ ...tied, parallel: 2, unit: known })?.resistance, 0.02, 1e-12);
    expect(rowShortLoop({ ...strings, parallel: 2, unit: known })?.resistance).toBeCloseTo(0.08, 12);
  });

  test("one in series: strings are the same as tied; the loop has its own capacitance, voltage and inductance", () => {
    const one = { ...tied, series: 1, worstHolding: 440, unit: known };
    const loop = unitShortLoop({ ...one, ties: "strings" })!;
    expect(loop).toEqual(unitShortLoop(one));
    expect(rowShortLoop({ ...one, ties: "strings" })).toEqual(rowShortLoop(one));
    expect(loop).toMatchObject({ voltage: 440, resistanceKnown: true, inductanceKnown: true });
    near(loop.capacitance, 4 * 3300e-6, 1e-12);
    near(loop.inductance, 25e-9 / 4, 1e-12);
    near(rowShortLoop(one)?.capacitance, 5 * 3300e-6, 1e-12);
    expect(rowShortLoop(one)?.voltage).toBe(440);
  });

  test("an inductance alone bounds it, by V sqrt(C/L); what is unknown is told apart", () => {
    const coil = unitShortLoop({ ...tied, unit: { ...tied.unit, esl: 25e-9 } })!;
    expect(coil).toMatchObject({ resistance: 0, resistanceKnown: false, inductanceKnown: true });
    near(faultPeak(coil)?.amperes, 400 * Math.sqrt((4 * 3300e-6) / (25e-9 / 4)), 1e-9);
    expect(faultPeak(coil)?.bound).toBe("upper bound");
  });

  test("strings: the fault current passes other strings and its own survivors", () => {
    near(unitShortLoop({ ...strings, unit: known })?.resistance, 0.02 * (4 / 4 + 3), 1e-12);
  });
});

describe("rowShortLoop(bank), loadShortLoop(bank)", () => {
  test("a tied row shorts through all its units at once; a string through the other strings", () => {
    near(rowShortLoop({ ...tied, unit: known })?.resistance, 0.004, 1e-12);
    near(rowShortLoop({ ...strings, unit: known })?.resistance, 0.02, 1e-12);
    near(rowShortLoop({ ...strings, unit: known })?.capacitance, (4 * 3300e-6) / 4, 1e-12);
    expect(rowShortLoop({ ...strings, unit: known })?.voltage).toBe(1600);
    expect(rowShortLoop({ ...strings, parallel: 1, unit: known })).toBeNull();
  });

  test("a load short is the whole bank and the bus; an unknown bus leaves a bound", () => {
    const loop = loadShortLoop({ ...tied, unit: known, bus: { resistance: 1e-3, inductance: 60e-9 } });
    near(loop.resistance, 0.017, 1e-12);
    near(loop.inductance, 80e-9, 1e-12);
    near(loop.capacitance, (5 * 3300e-6) / 4, 1e-12);
    expect(loop.voltage).toBe(1600);
    expect(faultPeak(loop)?.bound).toBe("value");
    expect(faultPeak(loadShortLoop({ ...tied, unit: known }))?.bound).toBe("upper bound");
  });
});

describe("leastFaultAction(bank)", () => {
  test("an unknown tolerance or resistance proves nothing", () => {
    expect(leastFaultAction({ ...tied, unit: { capacitance: 3300e-6, ratedVoltage: 450, esr: 0.04 } })).toBeNull();
    expect(leastFaultAction({ ...tied, unit: { ...tied.unit, toleranceLow: 0, toleranceHigh: 0 } })).toBeNull();
  });

  // 9s10p of 3300 uF -10/+50 % at 2000 V, 40 mohm, 50 mohm isolating: one high stage among low ones stands at 139.5 V, where
  // nine low neighbours bring 260 J over 60 mohm: an eighth of the 35 540 A^2 s that the worst stage after a hold would give.
  test("the least share with every unit low, without the overshoot", () => {
    const unit = { capacitance: 3300e-6, ratedVoltage: 450, toleranceLow: 0.1, toleranceHigh: 0.5, esr: 0.04 };
    const bank = { ...tied, unit, series: 9, parallel: 10, voltage: 2000, isolatingResistance: 0.05 };
    const least = (2000 * 0.9) / (0.9 + 8 * 1.5);
    const expected = (9 * 0.9 * 3300e-6 * least ** 2) / 2 / 0.06;
    expect(Math.round(expected)).toBe(4337);
    near(leastFaultAction({ ...bank, worstCharging: 379 }), expected, 1e-12);
    near(leastFaultAction({ ...bank, voltage: 2200, leastVoltage: 2000 }), expected, 1e-12);
    expect(faultAction(unitShortLoop({ ...bank, worstCharging: 378.9 }))).toBeGreaterThan(35000);
  });
});
