// A unit short or open: methods A15, energy balances, and the chains that remain.
import { describe, expect, test } from "vitest";
import { type Chain, chargingShares, crossTiedChain, total } from "../../src/bank/chain.ts";
import {
  afterShortHeld,
  shortInStage,
  shortInStrings,
  withOpen,
  withoutUnit,
  withShort,
} from "../../src/bank/chainFaults.ts";
import { courseOf } from "../../src/bank/course.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

const NONE = Number.POSITIVE_INFINITY;
const unit = (capacitance: number) => ({ capacitance, leakageCurrent: 0, conductance: 0 });
const string = (capacitances: readonly number[], resistance = NONE): Chain =>
  capacitances.map((capacitance) => ({ ...unit(capacitance), resistance }));

describe("shortInStrings(strings, voltages, at)", () => {
  test("methods A15: 5 strings of 4 x 3300 uF at 1600 V settle at 1500 V, 66 J to heat, survivors at 500 V [methods-derived A15]", () => {
    const strings = Array.from({ length: 5 }, () => string([3300e-6, 3300e-6, 3300e-6, 3300e-6]));
    const found = shortInStrings(
      strings,
      strings.map(() => [400, 400, 400, 400]),
      { string: 2, unit: 1 },
    );
    expect(found.voltage).toBeCloseTo(1500, 9);
    expect(found.equalising).toBeCloseTo(66, 9);
    expect(found.ownEnergy).toBeCloseTo(264, 9);
    expect(found.survivors[0]).toBeCloseTo(500, 9);
    expect(found.survivors[1]).toBe(0);
  });

  test("energy before = after + heat + the shorted unit's own, for strings of any units", () => {
    const draw = uniformFrom(streamState(3, 1));
    const strings = Array.from({ length: 3 }, () => string(Array.from({ length: 4 }, () => 0.5 + draw())));
    const voltages = strings.map((chain) => chargingShares(chain).map((share) => 100 * share));
    const stored = (chain: Chain, v: readonly number[]) =>
      total(chain.map((stage, i) => (stage.capacitance * v[i]! ** 2) / 2));
    const found = shortInStrings(strings, voltages, { string: 0, unit: 3 });
    const before = total(strings.map((chain, s) => stored(chain, voltages[s]!)));
    const after =
      stored(strings[0]!, found.survivors) +
      total(
        strings.slice(1).map((chain) =>
          stored(
            chain,
            chargingShares(chain).map((share) => share * found.voltage),
          ),
        ),
      );
    expect(total(found.survivors)).toBeCloseTo(found.voltage, 10);
    expect(before).toBeCloseTo(after + found.equalising + found.ownEnergy, 8);
  });
});

describe("shortInStage({ capacitance, units, voltage, isolation })", () => {
  test("methods A15: 1056 J from the neighbours; 6400 A, 844.8 J, 52.8 J and 16896 A^2 s at 50 mohm [methods-derived A15]", () => {
    const found = shortInStage({ capacitance: 3300e-6, units: 5, voltage: 400, isolation: 0.05 });
    expect(found.ownEnergy).toBeCloseTo(264, 9);
    expect(found.neighbourEnergy).toBeCloseTo(1056, 9);
    expect(found.peakCurrent).toBeCloseTo(6400, 9);
    expect(found.faultedLegEnergy).toBeCloseTo(844.8, 9);
    expect(found.neighbourLegEnergy).toBeCloseTo(52.8, 9);
    expect(found.action).toBeCloseTo(16896, 8);
  });

  test("no isolation resistor: the current is unknown, not zero", () => {
    const found = shortInStage({ capacitance: 1, units: 2, voltage: 1, isolation: null });
    expect(found.peakCurrent).toBeNull();
    expect(found.action).toBeNull();
  });

  test.each([null, 0.05])("a unit alone in its stage has no neighbours: zero, known, isolation %s", (isolation) =>
    expect(shortInStage({ capacitance: 2, units: 1, voltage: 3, isolation })).toEqual({
      ownEnergy: 9,
      neighbourEnergy: 0,
      peakCurrent: 0,
      faultedLegEnergy: 0,
      neighbourLegEnergy: 0,
      action: 0,
    }),
  );

  test("two to six units: the legs' joules are the neighbours' energy, and the action is the decay of the peak, i^2 tau/2", () => {
    for (let units = 2; units <= 6; units++) {
      const [capacitance, voltage, isolation] = [47e-6, 900, 0.3];
      const found = shortInStage({ capacitance, units, voltage, isolation });
      const neighbours = units - 1;
      expect(found.faultedLegEnergy! + neighbours * found.neighbourLegEnergy!).toBeCloseTo(found.neighbourEnergy, 9);
      // All neighbours together see their own legs in parallel and then the faulted one.
      const tau = (isolation + isolation / neighbours) * neighbours * capacitance;
      expect(found.action).toBeCloseTo((found.peakCurrent! ** 2 * tau) / 2, 9);
    }
  });
});

describe("withShort(chain, k), afterShortHeld(chain, voltages, k)", () => {
  test("methods A15: held at 1600 V the three that remain stand at 533.333 V [methods-derived A15]", () => {
    const chain = string([1, 1, 1, 1]);
    for (const v of afterShortHeld(chain, [400, 400, 400, 400], 2)) expect(v).toBeCloseTo(533.333333333, 8);
    expect(withShort(chain, 2).chain).toEqual([chain[0], chain[1], chain[3]]);
    expect(withShort(chain, 2)).toMatchObject({ positions: [0, 1, 3], seriesResistance: 0 });
  });
});

describe("afterShortHeld(chain, voltages, k) of unlike stages", () => {
  test("every stage that remains takes the same charge, and the sum stays what the ends are held at", () => {
    const chain = string([1, 2, 4, 8]);
    const before = [100, 80, 60, 40];
    const after = afterShortHeld(chain, before, 1);
    expect(total(after)).toBeCloseTo(280, 10);
    const charges = [0, 2, 3].map((i, at) => chain[i]!.capacitance * (after[at]! - before[i]!));
    for (const charge of charges) expect(charge).toBeCloseTo(charges[0]!, 10);
    expect(charges[0]).toBeGreaterThan(0);
  });
});

describe("withOpen(chain, k), withoutUnit(stages, at)", () => {
  test("a string with an open unit ends with the same divider as before: its resistor still carries the chain", () => {
    const chain = string([1, 1, 1], 100);
    const rest = withOpen(chain, 0);
    const course = courseOf(rest.chain, {
      charge: { kind: "instant" },
      voltage: 200,
      seriesResistance: rest.seriesResistance,
      hold: NONE,
      dump: null,
      rest: 0,
    });
    // From 200 V put there at once the two settle to 2/3 of what holds them: 133.333 V, and 66.667 V stand across the gap.
    expect(total(course.phases.at(-1)!.end)).toBeCloseTo(133.333333333, 8);
  });

  test("a stage without one unit is that unit's capacitance short", () => {
    const stages = [
      [unit(1), unit(2)],
      [unit(3), unit(4)],
    ];
    const chain = crossTiedChain(withoutUnit(stages, { stage: 1, unit: 0 }), [NONE, NONE]);
    expect(chain.map((stage) => stage.capacitance)).toEqual([3, 4]);
  });
});
