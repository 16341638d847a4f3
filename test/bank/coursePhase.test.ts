// Phases on their own: instant ones, those that end at a voltage, and the joins between stretches.
import { describe, expect, test } from "vitest";
import type { Stage } from "../../src/bank/chain.ts";
import { instantPhase, phaseFrom } from "../../src/bank/coursePhase.ts";

const stage = (capacitance: number, leakageCurrent = 0): Stage => ({
  capacitance,
  leakageCurrent,
  conductance: 0,
  resistance: Number.POSITIVE_INFINITY,
});

describe("instantPhase(name, start, end)", () => {
  test("no length; the higher of its two ends is its peak", () => {
    const phase = instantPhase("dump", [5, -1], [-2, 2]);
    expect(phase.seconds).toBe(0);
    expect(phase.peaks().map((peak) => peak.voltage)).toEqual([5, 2]);
    expect([...phase.voltagesOver({ from: 0, step: 1, count: 2 })]).toEqual([-2, 2, -2, 2]);
  });
});

describe("phaseFrom({ name, chain, drive, start, seconds, until })", () => {
  test("until a voltage that is there already: no time at all", () => {
    const phase = phaseFrom({
      name: "charge",
      chain: [stage(1)],
      drive: { kind: "current", current: 1 },
      start: [5],
      seconds: Number.POSITIVE_INFINITY,
      until: 5,
    });
    expect(phase.seconds).toBe(0);
  });

  test("open ends: each leak empties its own stage and stops, at 10 s and at 20 s", () => {
    const phase = phaseFrom({
      name: "rest",
      chain: [stage(1, 1), stage(1, 0.5)],
      drive: { kind: "current", current: 0 },
      start: [10, 10],
      seconds: 30,
    });
    expect([...phase.voltagesAt(9)]).toEqual([expect.closeTo(1, 12), expect.closeTo(5.5, 12)]);
    expect([...phase.voltagesAt(15)]).toEqual([0, expect.closeTo(2.5, 12)]);
    expect(phase.end).toEqual([0, 0]);
    expect(phase.currentAt(15)).toBe(0);
  });

  test("a dump drives a stage through zero: its leakage is off from there", () => {
    const phase = phaseFrom({
      name: "dump",
      chain: [stage(1, 0.1), stage(4)],
      drive: { kind: "source", voltage: 0, resistance: 1 },
      start: [10, 10],
      seconds: 200,
    });
    // Long after, no current flows and nothing leaks: the two stand against each other.
    expect(phase.end[0]).toBeLessThan(-5);
    expect(phase.end[0]! + phase.end[1]!).toBeCloseTo(0, 9);
    expect(phase.peaks()[1]!.voltage).toBe(10);
  });
});
