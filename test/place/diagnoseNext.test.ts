import { describe, expect, test } from "vitest";
import type { Hypothesis } from "../../src/place/diagnoseFaults.ts";
import { chargerOn, type StageModel } from "../../src/place/diagnoseModel.ts";
import { nextMeasurement, slowestTime } from "../../src/place/diagnoseNext.ts";

const stages: StageModel[] = [1, 2, 3].map(() => ({ capacitance: 1e-2, conductance: 1e-6, resistance: 50e3 }));
const question = {
  stages,
  course: chargerOn,
  meter: { relative: 0.001, absolute: 0.1, common: 0, current: 0.05 },
  bank: 300,
  latest: 0,
};
const of = (kind: Hypothesis["kind"], position = 1): Hypothesis => ({
  kind,
  position,
  odds: 1,
  sizes: { kind: "none" },
});

describe("nextMeasurement(likely, question)", () => {
  test("low capacitance against an open resistor: read that stage at once, and what each would have it read", () => {
    const next = nextMeasurement(
      [
        { hypothesis: of("low capacitance"), size: 0.2 },
        { hypothesis: of("resistor open"), size: 1 },
      ],
      question,
    );
    expect(next).toMatchObject({ action: "read stage", position: 1, seconds: 0 });
    if (next?.action === "read stage") expect(next.expect[0]).toBeGreaterThan(next.expect[1]);
  });
  test("a sound bank against a leak that has not shown: read after a hold", () => {
    const next = nextMeasurement(
      [
        { hypothesis: null, size: 1 },
        { hypothesis: of("leaky"), size: 1 },
      ],
      question,
    );
    expect(next?.action).toBe("read stage");
    if (next?.action === "read stage") expect(next.seconds).toBeGreaterThan(0);
    expect(nextMeasurement([{ hypothesis: null, size: 1 }], question)).toMatchObject({ action: "read after a hold" });
    expect(nextMeasurement([{ hypothesis: null, size: 1 }], { ...question, latest: 5000 })).toBeNull();
  });
  test("a leak and a wrong resistor of the same conductance cannot be parted by voltages: measure with the bank dead", () => {
    const leaky = { hypothesis: of("leaky"), size: 9 / 50e3 / 21e-6 };
    const wrong = { hypothesis: of("resistor wrong value"), size: 0.1 };
    expect(nextMeasurement([wrong, leaky], question)).toEqual({
      action: "with the bank dead",
      position: 1,
      measure: "resistor",
    });
  });
  test("a swapped lead is swapped back", () => {
    expect(nextMeasurement([{ hypothesis: of("meter lead swapped"), size: 1 }], question)?.action).toMatch(/leads/);
  });
});

test("slowestTime(stages): 1e-2 F against 21 uS is 476 s; endless when a stage conducts nothing", () => {
  expect(slowestTime(stages)).toBeCloseTo(476.19, 2);
  expect(slowestTime([{ capacitance: 1, conductance: 0, resistance: Number.POSITIVE_INFINITY }])).toBe(
    Number.POSITIVE_INFINITY,
  );
});
