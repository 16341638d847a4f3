// Source: [methods-derived] stepping by the inverse transform; the single branch against the closed form of [Cona].
import { describe, expect, test } from "vitest";
import { type Ladder, type LadderState, ladderStep } from "../../src/pulse/ladder.ts";
import { dischargeAt } from "../../src/pulse/rlc.ts";
import { near } from "./near.ts";

const NONE = { resistance: 0, inductance: 0 };
const BRANCH = { segment: NONE, capacitance: 5e-4, resistance: 0.01, inductance: 0 };
const start = (count: number): LadderState => ({
  voltages: new Float64Array(count).fill(3000),
  currents: new Float64Array(count),
  total: 0,
});
const END = { kind: "load", load: { resistance: 0.03, inductance: 2e-6 } } as const;

/** Steps of equal length up to a time. */
function stateAt(ladder: Ladder, time: number, steps: number): LadderState {
  let state = start(ladder.flat().length);
  for (let k = 0; k < steps; k++) state = ladderStep(ladder, state, time / steps, END);
  return state;
}

describe("ladderStep(ladder, start, step, end)", () => {
  test("Source: methods A7: one branch at its peak time carries 31280.4767 A", () => {
    const { total, currents } = stateAt([[BRANCH]], 4.16348591e-5, 40);
    near(total, 31280.4767, 1e-8);
    expect(currents[0]).toBe(total);
  });

  test("order five: halving the step divides the error by about 32", () => {
    const loop = { capacitance: 5e-4, inductance: 2e-6, resistance: 0.04 };
    const exact = dischargeAt(loop, 3000, 6e-5).current;
    const off = (steps: number): number => Math.abs(stateAt([[BRANCH]], 6e-5, steps).total - exact);
    expect(off(4) / off(8)).toBeGreaterThan(24);
    expect(off(4) / off(8)).toBeLessThan(44);
  });

  test("a bus of no resistance and no inductance makes branches one: the same total, divided by capacitance", () => {
    const two = [
      { ...BRANCH, capacitance: 2e-4, resistance: 0.025 },
      { ...BRANCH, capacitance: 3e-4, resistance: 0.05 / 3 },
    ];
    const state = stateAt([two], 4e-5, 40);
    near(state.total, stateAt([[BRANCH]], 4e-5, 40).total, 1e-9);
    near((state.currents[1] as number) / (state.currents[0] as number), 1.5, 1e-9);
  });

  test("one arm or two make no difference where no segment lies between", () => {
    const one = stateAt([[BRANCH, BRANCH]], 4e-5, 20);
    const two = stateAt([[BRANCH], [BRANCH]], 4e-5, 20);
    near(one.total, two.total, 1e-12);
  });

  test("a given current is shared out whole, and takes its charge from the capacitors", () => {
    const end = { kind: "given", powers: () => [100, 5e6] } as const;
    const { total, voltages } = ladderStep([[{ ...BRANCH, inductance: 1e-8 }]], start(1), 1e-5, end);
    near(total, 150, 1e-9);
    near(3000 - (voltages[0] as number), (100 * 1e-5 + 2.5e6 * 1e-10) / 5e-4, 1e-9);
  });
});
