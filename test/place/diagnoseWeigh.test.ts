import { describe, expect, test } from "vitest";
import { chargerOn, type StageModel } from "../../src/place/diagnoseModel.ts";
import { weigh } from "../../src/place/diagnoseWeigh.ts";

const stages: StageModel[] = [1, 2, 3, 4].map(() => ({ capacitance: 1e-2, conductance: 1e-6, resistance: 50e3 }));
const meter = { relative: 0.001, absolute: 0.1, common: 0.003, current: 0.05 };
const doubt = { capacitance: 0.003, leakage: 0.3, resistance: 0.05, bank: 0.02 };
const times = [0, 400];
const rowsOf = (made: readonly StageModel[]) =>
  chargerOn(made, 400, times).map(({ volts }, k) => ({ seconds: times[k]!, bank: 400, volts }));

describe("weigh(question, course, polarised)", () => {
  test("exact readings of a sound bank: sound outweighs every fault", () => {
    const { sound, faults } = weigh({ stages, rows: rowsOf(stages), meter, doubt }, chargerOn, true);
    expect(sound.excess).toBeLessThan(0);
    for (const fault of faults) expect(fault.weight).toBeLessThan(sound.weight);
  });
  test("exact readings of a stage that lost a fifth: found, with its size", () => {
    const rows = rowsOf(stages.with(2, { ...stages[2]!, capacitance: 8e-3 }));
    const { sound, faults } = weigh({ stages, rows, meter, doubt }, chargerOn, true);
    const best = faults.reduce((a, b) => (b.weight > a.weight ? b : a));
    expect(best.hypothesis).toMatchObject({ position: 2, kind: "low capacitance" });
    expect(best.size).toBeCloseTo(0.2, 2);
    expect(best.weight - sound.weight).toBeGreaterThan(20);
    expect(best.excess).toBeLessThan(2);
  });
});
