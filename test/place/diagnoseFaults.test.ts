import { describe, expect, test } from "vitest";
import { FAULT_KINDS, faulty, faultyCourse, type Hypothesis, hypotheses } from "../../src/place/diagnoseFaults.ts";
import { chargerOn, type StageModel } from "../../src/place/diagnoseModel.ts";

const stages: StageModel[] = [1, 2, 3].map(() => ({ capacitance: 1e-2, conductance: 1e-6, resistance: 50e3 }));
const of = (kind: Hypothesis["kind"], position = 1): Hypothesis => ({
  kind,
  position,
  odds: 1,
  sizes: { kind: "none" },
});

describe("hypotheses(stages, polarised)", () => {
  test("every kind at every place; no resistor, no resistor fault; unpolarised units are never reversed", () => {
    const all = hypotheses(stages, true);
    for (const kind of FAULT_KINDS) {
      expect(new Set(all.filter((h) => h.kind === kind).map((h) => h.position))).toEqual(new Set([0, 1, 2]));
    }
    const bare = hypotheses([{ ...stages[0]!, resistance: Number.POSITIVE_INFINITY }], false);
    expect(new Set(bare.map((h) => h.kind))).toEqual(
      new Set(["low capacitance", "high capacitance", "leaky", "meter lead swapped"]),
    );
  });
  test("the parts of one kind at one place add up to its odds", () => {
    const sum = hypotheses(stages, true)
      .filter((h) => h.kind === "resistor wrong value")
      .reduce((s, h) => s + h.odds, 0);
    expect(sum).toBeCloseTo(1, 12);
  });
});

describe("faulty and faultyCourse", () => {
  test("a low capacitance raises its own stage at once; an open resistor shows only later", () => {
    const low = faultyCourse(chargerOn, of("low capacitance"), 0.5)(stages, 300, [0])[0]!;
    expect(low.volts[1]).toBeCloseTo(150, 9);
    const open = faultyCourse(chargerOn, of("resistor open"), 1)(stages, 300, [0, 500]);
    expect(open[0]!.volts[1]).toBeCloseTo(100, 9);
    expect(open[1]!.volts[1]!).toBeGreaterThan(150);
  });
  test("leakage is counted over what flows already; a swapped lead only turns the sign", () => {
    expect(faulty(stages, of("leaky"), 2)[1]!.conductance).toBeCloseTo(1e-6 + 2 * 21e-6, 12);
    const swapped = faultyCourse(chargerOn, of("meter lead swapped"), 1)(stages, 300, [0])[0]!;
    expect(swapped.volts.map((v) => Math.round(v))).toEqual([100, -100, 100]);
  });
  test("a reversed unit holds its stage down and the others share the rest", () => {
    const { volts } = faultyCourse(chargerOn, of("reversed unit"), 0.03)(stages, 300, [0])[0]!;
    expect(volts[1]).toBeCloseTo(3, 9);
    expect(volts[0]).toBeCloseTo(148.5, 9);
  });
});
