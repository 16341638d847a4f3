// Chains at rest: charging shares, the end of an endless hold, what a dump leaves.
import { Matrix, solve } from "ml-matrix";
import { describe, expect, test, vi } from "vitest";
import {
  type Chain,
  chainCapacitance,
  chargingShares,
  crossTiedChain,
  endOfHold,
  leftAfterDump,
  type Stage,
  total,
} from "../../src/bank/chain.ts";
import { courseOf } from "../../src/bank/course.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const NONE = Number.POSITIVE_INFINITY;
const stage = (capacitance: number, leakageCurrent = 0, conductance = 0, resistance = NONE): Stage => ({
  capacitance,
  leakageCurrent,
  conductance,
  resistance,
});

const draw = uniformFrom(streamState(7, 0));

describe("crossTiedChain(stages, resistances)", () => {
  test("units of a stage in parallel: C, leakage and conductance add, the resistor is its own; without one Infinity", () => {
    const unit = (k: number) => ({ capacitance: k, leakageCurrent: 10 * k, conductance: 100 * k });
    expect(crossTiedChain([[unit(1), unit(2)], [unit(4)]], [47])).toEqual([stage(3, 30, 300, 47), stage(4, 40, 400)]);
  });
});

describe("chargingShares(chain)", () => {
  test("one stage has all of it", () => {
    expect(chargingShares([stage(1e-3)])).toEqual([1]);
  });

  test("methods A1: four stages of 5 x 3300 uF at +-20 %, 1600 V: 533.333 V and 290.909 V [methods-derived A1]", () => {
    const units = (factor: number) =>
      Array.from({ length: 5 }, () => ({ capacitance: 3300e-6 * factor, leakageCurrent: 0, conductance: 0 }));
    const none = [NONE, NONE, NONE, NONE];
    const nominal = crossTiedChain([1, 1, 1, 1].map(units), none);
    expect(chainCapacitance(nominal)).toBeCloseTo(0.004125, 15);
    expect((chainCapacitance(nominal) * 1600 ** 2) / 2).toBeCloseTo(5280, 8);
    const low = crossTiedChain([0.8, 1.2, 1.2, 1.2].map(units), none);
    expect(1600 * chargingShares(low)[0]!).toBeCloseTo(533.333333333, 8);
    const high = crossTiedChain([1.2, 0.8, 0.8, 0.8].map(units), none);
    expect(1600 * chargingShares(high)[0]!).toBeCloseTo(290.909090909, 8);
  });

  test("agrees with the same charge through every stage, solved as linear equations by ml-matrix", () => {
    for (let k = 0; k < 50; k++) {
      const n = 2 + (k % 6);
      const chain = Array.from({ length: n }, () => stage(0.1 + draw()));
      // C_i v_i - C_(i+1) v_(i+1) = 0, and the v_i sum to 1.
      const rows = Array.from({ length: n }, (_, r) =>
        Array.from({ length: n }, (_, c) =>
          r === n - 1 ? 1 : c === r ? chain[r]!.capacitance : c === r + 1 ? -chain[c]!.capacitance : 0,
        ),
      );
      const right = Matrix.columnVector(Array.from({ length: n }, (_, r) => (r === n - 1 ? 1 : 0)));
      const solved = solve(new Matrix(rows), right).to1DArray();
      for (const [i, share] of chargingShares(chain).entries()) expect(share).toBeCloseTo(solved[i]!, 13);
    }
  });
});

describe("endOfHold(chain, V)", () => {
  test("methods A4: the worst corner of 24 kohm +-5 % and 1 mA at 1600 V stands at 449.184615 V [methods-derived A4]", () => {
    const loose = stage(1, 1e-3, 0, 24e3 * 0.95);
    const found = endOfHold([stage(1, 0, 0, 24e3 * 1.05), loose, loose, loose], 1600)!;
    expect(found[0]).toBeCloseTo(449.184615, 6);
    expect(total(found)).toBeCloseTo(1600, 9);
  });

  test("methods A4: 57.6 kohm +-1 % stands at 449.442894 V [methods-derived A4]", () => {
    const loose = stage(1, 1e-3, 0, 57600 * 0.99);
    expect(endOfHold([stage(1, 0, 0, 57600 * 1.01), loose, loose, loose], 1600)![0]).toBeCloseTo(449.442894, 6);
  });

  test("a stage that would be driven below zero stops at zero and the rest carry its volts", () => {
    const chain = [stage(1, 0, 0, 100), stage(1, 0, 0, 100), stage(1, 0.9, 0, 100)];
    expect(endOfHold(chain, 100)).toEqual([50, 50, 0]);
  });

  test("with nothing but leakage currents the tightest stage ends with all of it", () => {
    expect(endOfHold([stage(1, 2e-3), stage(1, 1e-3), stage(1, 3e-3)], 900)).toEqual([0, 900, 0]);
  });

  test("equal leakages and no resistors: not decided by the end alone, so null", () => {
    expect(endOfHold([stage(1, 1e-3), stage(2, 1e-3)], 900)).toBeNull();
  });

  test("is where the time course goes, on random chains of every kind", () => {
    for (let k = 0; k < 200; k++) {
      const chain: Chain = Array.from({ length: 2 + (k % 5) }, () =>
        stage(
          0.5 + draw(),
          draw() < 0.3 ? 0 : draw(),
          draw() < 0.5 ? 0 : 0.01 * draw(),
          draw() < 0.3 ? NONE : 10 + 200 * draw(),
        ),
      );
      const end = endOfHold(chain, 100);
      if (end === null) continue;
      const course = courseOf(chain, { charge: { kind: "instant" }, voltage: 100, hold: NONE, dump: null, rest: 0 });
      for (const [i, v] of course.phases.at(-1)!.end.entries()) expect(v).toBeCloseTo(end[i]!, 7);
    }
  });
});

describe("leftAfterDump(chain, voltages)", () => {
  test("methods A3: -133.333 V on the low stage, +109.091 V on the high one [methods-derived A3]", () => {
    const even = [400, 400, 400, 400];
    const low = leftAfterDump([stage(0.8), stage(1.2), stage(1.2), stage(1.2)], even);
    expect(low[0]).toBeCloseTo(-133.333333333, 8);
    const high = leftAfterDump([stage(1.2), stage(0.8), stage(0.8), stage(0.8)], even);
    expect(high[0]).toBeCloseTo(109.090909091, 8);
    expect(total(low)).toBeCloseTo(0, 10);
  });

  test("straight after charging nothing is left", () => {
    const chain = [stage(1), stage(2), stage(3)];
    const charged = chargingShares(chain).map((share) => 600 * share);
    for (const v of leftAfterDump(chain, charged)) expect(v).toBeCloseTo(0, 10);
  });
});
