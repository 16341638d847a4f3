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
    expect([...phase.voltagesAt(0)]).toEqual([-2, 2]);
    expect(phase.currentAt(0)).toBe(0);
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

  const forEver = Number.POSITIVE_INFINITY;
  const charge = (chain: readonly Stage[], start: readonly number[], until: number) =>
    phaseFrom({ name: "charge", chain, drive: { kind: "current", current: 1 }, start, seconds: forEver, until });

  test("until a voltage: 1 A into 1 F reaches 5 V in 5 s, the highest at its end; what a leak eats never arrives", () => {
    const phase = charge([stage(1)], [0], 5);
    expect(phase.seconds).toBeCloseTo(5, 12);
    expect(phase.end[0]).toBeCloseTo(5, 12);
    expect(phase.voltagesAt(2.5)[0]).toBeCloseTo(2.5, 12);
    expect(phase.currentAt(2)).toBe(1);
    expect(phase.peaks()[0]).toEqual({ voltage: expect.closeTo(5, 12), seconds: expect.closeTo(5, 12) });
    expect(charge([{ ...stage(1), conductance: 1 }], [0], 5).seconds).toBe(forEver);
    // Twice 1.2 A leave of 1 A nothing: the stages stay empty.
    const eaten = charge([stage(1, 1.2), stage(1, 1.2)], [0, 0], 5);
    expect(eaten.seconds).toBe(forEver);
    expect(eaten.end).toEqual([0, 0]);
  });

  // -2 V rises by 1 V/s to zero, where its leak of half an ampere begins; then 0.5 V/s and 1 V/s to 10 V in all.
  test("until a voltage over two stretches, at an instant, at many, current and peaks", () => {
    const phase = charge([stage(1, 0.5), stage(1)], [-2, 0], 10);
    const length = 2 + 16 / 3;
    expect(phase.seconds).toBeCloseTo(length, 10);
    expect(phase.end).toEqual([expect.closeTo(8 / 3, 10), expect.closeTo(length, 10)]);
    const at = (t: number) => (t < 2 ? [t - 2, t] : [(t - 2) / 2, t]);
    for (const t of [0, 1, 1.9, 2, 2.1, 4, 7]) {
      expect([...phase.voltagesAt(t)]).toEqual(at(t).map((v) => expect.closeTo(v, 10)));
      expect(phase.currentAt(t)).toBe(1);
    }
    const rows = phase.voltagesOver({ from: 0.25, step: 0.5, count: 14 });
    expect(rows).toHaveLength(28);
    for (let k = 0; k < 14; k++)
      expect([...rows.subarray(2 * k, 2 * k + 2)]).toEqual(at(0.25 + 0.5 * k).map((v) => expect.closeTo(v, 10)));
    expect(phase.peaks()).toEqual([
      { voltage: expect.closeTo(8 / 3, 10), seconds: expect.closeTo(length, 10) },
      { voltage: expect.closeTo(length, 10), seconds: expect.closeTo(length, 10) },
    ]);
  });

  test("eight leaks at rest each empty their own stage to zero itself, one after the other", () => {
    const leaks = [1, 0.5, 0.4, 0.3, 0.25, 0.2, 0.15, 0.125];
    const phase = phaseFrom({
      name: "rest",
      chain: leaks.map((leak) => stage(1, leak)),
      drive: { kind: "current", current: 0 },
      start: leaks.map(() => 10),
      seconds: 60,
    });
    for (const t of [0, 5, 10, 15, 23, 33, 39, 49, 59])
      expect([...phase.voltagesAt(t)]).toEqual(leaks.map((leak) => expect.closeTo(Math.max(0, 10 - leak * t), 9)));
    expect(phase.end.slice(0, 6)).toEqual([0, 0, 0, 0, 0, 0]);
    const rows = phase.voltagesOver({ from: 0, step: 0.75, count: 80 });
    for (let k = 0; k < 80; k++)
      for (const [i, v] of phase.voltagesAt(0.75 * k).entries()) expect(rows[8 * k + i]).toBeCloseTo(v, 9);
    for (const peak of phase.peaks()) expect(peak).toEqual({ voltage: 10, seconds: 0 });
  });

  test("leaks of odd numbers, one of them after a pull through a resistor, end at zero itself and not a rounding beside it", () => {
    for (let k = 1; k <= 40; k++) {
      // Through insulation as well the fall is no straight line, and where it meets zero is found to rounding only.
      const conductance = k % 2 === 0 ? 0 : k / 90;
      const chain = [stage(1.3 + k / 7, 0.71), stage(0.9, 0.37 + k / 11), stage(2.1, 0.13 * k)].map((one) => ({
        ...one,
        conductance,
      }));
      const rest = phaseFrom({
        name: "rest",
        chain,
        drive: { kind: "current", current: 0 },
        start: [10.1, 7.3, 3.7 + k / 3],
        seconds: 1e4,
      });
      expect(
        rest.end.every((v) => v === 0),
        `rest ${k}: ${rest.end}`,
      ).toBe(true);
      const held = phaseFrom({
        name: "hold",
        chain: [...chain, stage(1.7)],
        drive: { kind: "source", voltage: 30, resistance: 0 },
        start: [7.1, 8.3, 5.9, 30 - 7.1 - 8.3 - 5.9],
        seconds: Number.POSITIVE_INFINITY,
      });
      expect(
        held.end.slice(0, 3).every((v) => v === 0),
        `hold ${k}: ${held.end}`,
      ).toBe(true);
      expect(held.end[3]).toBeCloseTo(30, 9);
    }
  });

  test("cut off on its way: at many instants as at one, and beyond its end it stays there", () => {
    const dump = phaseFrom({
      name: "dump",
      chain: [stage(1), stage(1)],
      drive: { kind: "source", voltage: 0, resistance: 2 },
      start: [10, 5],
      seconds: 0.5,
    });
    const fallen = (t: number) => 7.5 * Math.exp(-Math.min(t, 0.5));
    const rows = dump.voltagesOver({ from: 0.3, step: 0.1, count: 6 });
    for (let k = 0; k < 6; k++) {
      const wanted = [fallen(0.3 + 0.1 * k) + 2.5, fallen(0.3 + 0.1 * k) - 2.5].map((v) => expect.closeTo(v, 9));
      // The sixth figure of time at the very end may fall on either side of it.
      expect([...rows.subarray(2 * k, 2 * k + 2)], `row ${k}`).toEqual(wanted);
      expect([...dump.voltagesAt(0.3 + 0.1 * k)]).toEqual(wanted);
    }
    expect([...dump.voltagesOver({ from: 3, step: 1, count: 2 })]).toEqual(
      [...dump.end, ...dump.end].map((v) => expect.closeTo(v, 9)),
    );
    const later = charge([stage(1, 0.5), stage(1)], [-2, 0], 10);
    expect([...later.voltagesOver({ from: 7, step: 2, count: 3 })].slice(2)).toEqual(
      [...later.end, ...later.end].map((v) => expect.closeTo(v, 9)),
    );
  });

  test("through a resistor, before and after a leak stops, the current is the volts of the ends over the ohms", () => {
    const phase = phaseFrom({
      name: "dump",
      chain: [stage(1, 0.1), stage(4)],
      drive: { kind: "source", voltage: 0, resistance: 1 },
      start: [10, 10],
      seconds: 200,
    });
    for (const t of [0, 0.2, 0.5, 1, 2, 5, 150]) {
      const [a, b] = phase.voltagesAt(t);
      expect(phase.currentAt(t)).toBeCloseTo(-(a! + b!), 9);
    }
    expect(phase.seconds).toBe(200);
    // Asked beyond its length a phase stays at its end.
    expect([...phase.voltagesAt(1e4)]).toEqual(phase.end.map((v) => expect.closeTo(v, 9)));
    expect([...phase.voltagesOver({ from: 199, step: 1, count: 4 })].slice(4)).toEqual(
      [...phase.end, ...phase.end].map((v) => expect.closeTo(v, 9)),
    );
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
