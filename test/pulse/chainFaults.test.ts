// chainFaults: a unit shorted, a unit open, a row shorted, on the worked bank.
import { describe, expect, test } from "vitest";
import { rowShort, unitOpen, unitShort } from "../../src/pulse/chainFaults.ts";
import type { FaultBank } from "../../src/pulse/faultBank.ts";
import { strings, tied } from "./faultBanks.ts";
import { near } from "./near.ts";

describe("unitShort(bank)", () => {
  test("worked, cross-tied: 533.333 V with the charger on, 1056 J from the neighbours, no amperes known", () => {
    const fault = unitShort(tied);
    near(fault.worstVoltage, 533.333333);
    near(fault.energyIntoUnit, 1056, 1e-12);
    expect(fault.peakCurrent).toBeNull();
    expect(fault.verdict).toBe("fail");
    expect(fault.stops).toContain("Nothing given stops it");
  });

  test("the neighbours' joules are at the worst stage voltage", () => {
    near(unitShort({ ...tied, worstHolding: 440 }).energyIntoUnit, 4 * 0.5 * 3300e-6 * 440 ** 2, 1e-12);
  });

  test("worked, strings: 66 J and 533.333 V held; the note tells 500 V alone", () => {
    const fault = unitShort(strings);
    near(fault.energyIntoUnit, 66, 1e-12);
    near(fault.worstVoltage, 533.333333);
    expect(fault.note).toContain("500 V");
  });

  test("tolerance raises what is judged: three stages of +-20 %", () => {
    const wide = { ...tied, unit: { ...tied.unit, toleranceLow: 0.2, toleranceHigh: 0.2 } };
    near(unitShort(wide).worstVoltageSpread, (1600 * 1.2) / (1.2 + 2 * 0.8));
  });

  test("a fuse brings its own three findings, an isolating resistor its amperes", () => {
    // through a sound unit goes a sixteenth of the action, in strings the rest of the faulted string takes it all
    const rated = { ...tied.unit, esr: 0.02, esl: 0, action: 1000 };
    const beside = unitShort({ ...tied, unit: rated });
    const [sound] = beside.findings;
    near(sound?.value, (beside.energyIntoUnit as number) / (0.02 / 4) / 16, 1e-12);
    expect(sound).toMatchObject({ id: "pulse.fault.action", limit: 1000 });
    expect(unitShort({ ...tied, unit: { ...rated, action: null } }).findings).toEqual([]);
    const apart = unitShort({ ...strings, unit: rated });
    near(apart.findings[0]?.value, (apart.energyIntoUnit as number) / (0.02 * (4 / 4 + 3)), 1e-12);
    const fuse = { meltingAction: 10000, clearingAction: 15000, dcVoltage: 450 };
    const unit = { ...tied.unit, esr: 0, esl: 0 };
    const shot = { peakCurrent: 1e4, unitAction: 2250, unitHeat: null };
    const fault = unitShort({ ...tied, unit, fuse, isolatingResistance: 0.05, shot });
    near(fault.peakCurrent, 6400, 1e-12);
    expect(fault.findings.map(({ verdict }) => verdict)).toEqual(["pass", "pass", "pass"]);
    expect(fault.stops).toContain("fuse");
  });

  const fuse = { meltingAction: null, clearingAction: null, dcVoltage: null };
  test.each([
    ["a fuse", { fuse }, /fuse of the shorted unit/],
    ["a fuse before an isolating resistor", { fuse, isolatingResistance: 0.05 }, /fuse of the shorted unit/],
    ["an isolating resistor", { isolatingResistance: 0.05 }, /isolating resistors take part of the heat/],
    [
      "an isolating resistor, and a short whose ohms are stated",
      { isolatingResistance: 0.05, shortResistance: 0.01 },
      /take their part of the heat/,
    ],
    ["an inductance between sections", { sectionInductance: 1e-6 }, /section inductance holds the current down/],
    ["an inductance of nothing", { sectionInductance: 0 }, /Nothing given stops it/],
    ["a resistor of nothing", { isolatingResistance: 0 }, /Nothing given stops it/],
    ["nothing", {}, /Nothing given stops it/],
    ["no neighbour, fuse or not", { parallel: 1, fuse }, /charger's trip must open/],
  ] as const)("what stops it: %s", (_, over, words) => expect(unitShort({ ...tied, ...over }).stops).toMatch(words));

  test("the note: what the rest stands at, held and alone", () => {
    expect(unitShort(tied).note).toMatch(/other stages stand at V\/3; alone, they keep/);
    expect(unitShort(strings).note).toMatch(/rest of its string stands at V\/3; alone, at 500 V/);
    expect(unitShort({ ...tied, series: 1 }).note).toMatch(/whole bank empties/);
  });

  test("two stages: the other takes the whole voltage, whatever the tolerance", () => {
    const wide = { ...tied, series: 2, unit: { ...tied.unit, toleranceLow: 0.2, toleranceHigh: 0.2 } };
    expect(unitShort(wide)).toMatchObject({ id: "unit-short", worstVoltage: 1600, worstVoltageSpread: 1600 });
  });

  test("the joules come from outside: a case that is known to hold them passes, one that does not fails", () => {
    const held = (ruptureEnergy: number) => ({ ...tied, unit: { ...tied.unit, ratedVoltage: 600, ruptureEnergy } });
    expect(unitShort(held(1056.1)).verdict).toBe("pass");
    expect(unitShort(held(1055.9)).verdict).toBe("fail");
  });

  test("a sound unit's action against its own rating: shared by four neighbours if tied, whole in the rest of a string", () => {
    const unit = { ...tied.unit, esr: 0, esl: 0, action: 1000 };
    const found = (over: Partial<FaultBank>) =>
      unitShort({ ...tied, unit, isolatingResistance: 0.05, ...over }).findings.filter(
        ({ id }) => id === "pulse.fault.action",
      );
    expect(found({})[0]).toMatchObject({ verdict: "fail", limit: 1000, unit: "A2s", state: "faulted" });
    near(found({})[0]?.value, 16896 / 16, 1e-12);
    expect(found({})[0]?.note).toMatch(/sound unit against its rating/);
    const whole = found({ ties: "strings" })[0]?.value ?? 0;
    near(whole, 66 / (0.05 * (4 / 4 + 3) + 0.05), 1e-12);
    expect(found({ ties: "strings", series: 1 })[0]?.value).toBe(found({ series: 1 })[0]?.value);
    expect(found({ unit: { ...unit, action: null } })).toEqual([]);
    expect(found({ unit: { ...tied.unit, action: 1000 } })).toEqual([]);
  });

  test("no shot known: a fuse's life is not assessed, its clearing is", () => {
    const unit = { ...tied.unit, esr: 0, esl: 0 };
    const known = { meltingAction: 10000, clearingAction: 15000, dcVoltage: 399 };
    const { findings } = unitShort({ ...tied, unit, fuse: known, isolatingResistance: 0.05 });
    expect(findings.map(({ verdict }) => verdict)).toEqual(["not assessed", "pass", "fail"]);
    expect(unitShort(tied).findings).toEqual([]);
  });

  test("one stage: the whole bank empties into it and nothing stands; one chain: nothing feeds it", () => {
    expect(unitShort({ ...tied, series: 1 })).toMatchObject({ worstVoltage: 0, worstVoltageSpread: 0 });
    expect(unitShort({ ...tied, parallel: 1 })).toMatchObject({ energyIntoUnit: 0, peakCurrent: null });
  });
});

describe("unitOpen(bank)", () => {
  test("cross-tied: a stage of four among fives takes V 5/(5 + 3 x 4)", () =>
    near(unitOpen(tied).worstVoltage, (1600 * 5) / 17, 1e-12));

  test("a single chain broken: the gap stands off the whole voltage", () => {
    expect(unitOpen({ ...tied, parallel: 1 }).worstVoltage).toBe(1600);
  });

  test("strings: the sound units keep what they had", () =>
    expect(unitOpen(strings)).toMatchObject({
      worstVoltage: 400,
      worstVoltageSpread: 400,
      verdict: "pass",
      note: expect.stringMatching(/string is out and keeps its charge/),
    }));

  test("tolerance raises it: four low units of the stage against high ones of the rest", () => {
    const wide = { ...tied, unit: { ...tied.unit, toleranceLow: 0.2, toleranceHigh: 0.2 } };
    near(unitOpen(wide).worstVoltageSpread, (1600 * 5 * 1.2) / (5 * 1.2 + 3 * 4 * 0.8), 1e-12);
  });

  test("no amperes and no joules, known; a chain of its own is told as a stage that lost its unit", () => {
    expect(unitOpen({ ...strings, parallel: 1 })).toMatchObject({
      id: "unit-open",
      worstVoltage: 1600,
      peakCurrent: 0,
      peakIs: "value",
      energyIntoUnit: 0,
      stops: expect.stringMatching(/Nothing opens/),
      note: expect.stringMatching(/takes more than its share/),
    });
  });
});

describe("rowShort(bank)", () => {
  test("cross-tied: the rest at V/3, each unit of the row spends its own 264 J", () => {
    const fault = rowShort(tied);
    near(fault.worstVoltage, 533.333333);
    near(fault.energyIntoUnit, 264, 1e-12);
    expect(fault).toMatchObject({ id: "row-short", note: expect.stringMatching(/spends its own energy/) });
    expect(fault.stops).toMatch(/charger's trip/);
  });

  test("its own joules are at the worst voltage and come from nowhere else: volts alone judge it", () => {
    const high = { ...tied, worstHolding: 440, unit: { ...tied.unit, ratedVoltage: 600 } };
    near(rowShort(high).energyIntoUnit, (3300e-6 * 440 ** 2) / 2, 1e-12);
    expect(rowShort(high).verdict).toBe("pass");
  });

  test("tolerance raises what the rest stand at; one stage alone leaves nothing", () => {
    const wide = { ...tied, unit: { ...tied.unit, toleranceLow: 0.2, toleranceHigh: 0.2 } };
    near(rowShort(wide).worstVoltageSpread, (1600 * 1.2) / (1.2 + 2 * 0.8), 1e-12);
    expect(rowShort({ ...wide, series: 1, worstCharging: 1600 })).toMatchObject({
      worstVoltage: 0,
      worstVoltageSpread: 0,
    });
    near(rowShort({ ...strings, series: 1, worstCharging: 1600 }).energyIntoUnit, (3300e-6 * 1600 ** 2) / 2, 1e-12);
  });

  test("strings: one string end to end takes what the four others hold, a quarter of it in each unit", () => {
    const fault = rowShort(strings);
    expect(fault.worstVoltage).toBe(0);
    near(fault.energyIntoUnit, (4 * 0.5 * (3300e-6 / 4) * 1600 ** 2) / 4, 1e-12);
    expect(fault).toMatchObject({
      worstVoltageSpread: 0,
      note: expect.stringMatching(/one string shorted end to end/),
    });
    expect(fault.verdict).toBe("not assessed");
  });
});
