// The whole course: charge, hold, dump, rest; known peaks, energy, leakage that stops at zero, and a small-step reference.
import { describe, expect, test, vi } from "vitest";
import { type Chain, type Stage, total } from "../../src/bank/chain.ts";
import { courseOf, type Program } from "../../src/bank/course.ts";
import { phaseFrom } from "../../src/bank/coursePhase.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const NONE = Number.POSITIVE_INFINITY;
const stage = (capacitance: number, leakageCurrent = 0, conductance = 0, resistance = NONE): Stage => ({
  capacitance,
  leakageCurrent,
  conductance,
  resistance,
});
const program = (over: Partial<Program>): Program => ({
  charge: { kind: "instant" },
  voltage: 1000,
  hold: 0,
  dump: null,
  rest: 0,
  ...over,
});

describe("courseOf(chain, program)", () => {
  test("C = (1, 1, 3), G = (50, 2, 1): the second stage goes 0.429, peaks at 0.693, and the highest ends at 0.658 [placing notes 6]", () => {
    const chain = [stage(1, 0, 50), stage(1, 0, 2), stage(3, 0, 1)];
    const hold = courseOf(chain, program({ voltage: 1, hold: NONE })).phases[1]!;
    expect(hold.start[1]).toBeCloseTo(0.428571429, 8);
    const peak = hold.peaks()[1]!;
    expect(Math.round(peak.voltage * 1e3)).toBe(693);
    expect(peak.seconds).toBeGreaterThan(0.01);
    expect(hold.end[2]).toBeCloseTo(0.658, 3);
    let sampled = 0;
    for (let k = 0; k <= 20000; k++) sampled = Math.max(sampled, hold.voltagesAt(k * 1e-4)[1]!);
    expect(peak.voltage).toBeGreaterThanOrEqual(sampled);
    expect(peak.voltage).toBeCloseTo(sampled, 8);
  });

  test("methods A12 (a), (c): 825 uF to 1600 V by 0.05 A in 26.4 s, through 2 kohm from 1700 V in 4.67480202 s [methods-derived A12]", () => {
    const chain = [1, 1, 1, 1].map(() => stage(4 * 825e-6));
    const steady = courseOf(chain, program({ voltage: 1600, charge: { kind: "current", current: 0.05 } }));
    expect(steady.phases[0]!.seconds).toBeCloseTo(26.4, 9);
    const through = courseOf(
      chain,
      program({ voltage: 1600, charge: { kind: "source", voltage: 1700, resistance: 2000 } }),
    );
    expect(through.phases[0]!.seconds).toBeCloseTo(4.67480202, 8);
    expect(total(through.phases[0]!.end)).toBeCloseTo(1600, 9);
  });

  test("methods A5: 825 uF through 82 kohm falls from 1600 V to 60 V in 222.122981 s [methods-derived A5]", () => {
    const chain = [1, 1, 1, 1].map(() => stage(4 * 825e-6));
    const course = courseOf(chain, program({ voltage: 1600, dump: { resistance: 82000, seconds: 222.122981 } }));
    expect(total(course.phases[1]!.end)).toBeCloseTo(60, 6);
    expect(course.phases[1]!.currentAt(0)).toBeCloseTo(-1600 / 82000, 15);
  });

  test("methods A5: the same bank on its own balancing resistors of 82 kohm in all, ends open [methods-derived A5]", () => {
    const chain = [1, 1, 1, 1].map(() => stage(4 * 825e-6, 0, 0, 82000 / 4));
    const rest = courseOf(chain, program({ voltage: 1600, rest: 222.122981 })).phases[1]!;
    expect(total(rest.end)).toBeCloseTo(60, 6);
  });

  test("a charge that leakage eats up never arrives, and nothing follows it", () => {
    const course = courseOf(
      [stage(1e-3, 0, 0, 1e4), stage(1e-3, 0, 0, 1e4)],
      program({ charge: { kind: "current", current: 0.01 }, hold: 10 }),
    );
    expect(course.reached).toBe(false);
    expect(course.phases).toHaveLength(1);
    expect(total(course.phases[0]!.end)).toBeCloseTo(200, 9);
  });

  test("leakage stops at zero volts: the drained stage stays there, the others take over, the sum holds", () => {
    const hold = courseOf([stage(1e-3, 5e-3), stage(1e-3, 1e-3), stage(1e-3)], program({ voltage: 900, hold: NONE }))
      .phases[1]!;
    expect(hold.end).toEqual([0, 0, 900]);
    for (const seconds of [0, 50, 100, 150, 300, 1e4]) {
      const v = hold.voltagesAt(seconds);
      expect(Math.min(...v)).toBeGreaterThanOrEqual(-1e-9);
      expect(total([...v])).toBeCloseTo(900, 8);
    }
    // Before anything is empty: I = 2 mA, so the first falls by 3 mA / 1 mF = 3 V/s and is empty after 100 s.
    expect(hold.voltagesAt(50)[0]).toBeCloseTo(150, 8);
    expect(hold.voltagesAt(100)[0]).toBeCloseTo(0, 8);
    // From then the second loses 0.5 mA net, each of the two left moving 0.5 V/s.
    expect(hold.voltagesAt(150)[1]! - hold.voltagesAt(100)[1]!).toBeCloseTo(-25, 8);
  });

  test("agrees with 2e5 small midpoint steps of the equations with leakage switched at zero", () => {
    const chain: Chain = [stage(1, 3, 0.01), stage(1.4, 0.1, 0, 40), stage(0.8, 0, 0.02, 90)];
    const hold = courseOf(chain, program({ voltage: 60, hold: 120, rest: 60 })).phases[1]!;
    const v = [...hold.start];
    const step = 120 / 2e5;
    const rates = (u: readonly number[]): number[] => {
      const drains = chain.map((s, i) => u[i]! * (s.conductance + 1 / s.resistance));
      // A drained stage takes what the chain brings, up to its leakage.
      const balance = (stuck: boolean): { feed: number; out: number[] } => {
        const live = chain.map((_, i) => !(stuck && i === 0));
        const out = chain.map((s, i) => drains[i]! + (u[i]! > 0 ? s.leakageCurrent : 0));
        let top = 0;
        let bottom = 0;
        for (const [i, s] of chain.entries()) {
          if (!live[i]) continue;
          top += out[i]! / s.capacitance;
          bottom += 1 / s.capacitance;
        }
        const feed = top / bottom;
        return { feed, out: out.map((o, i) => (live[i] ? o : feed)) };
      };
      const { feed, out } = balance(u[0]! <= 1e-9);
      return chain.map((s, i) => (feed - out[i]!) / s.capacitance);
    };
    let emptied = false;
    for (let k = 0; k < 2e5; k++) {
      const first = rates(v);
      const second = rates(v.map((x, i) => x + (first[i]! * step) / 2));
      for (const i of v.keys()) v[i]! += second[i]! * step;
      if (v[0]! < 0) {
        v[0] = 0;
        emptied = true;
      }
    }
    expect(emptied).toBe(true);
    // One step of 0.6 ms at some V/s is what the reference may miss when the leak stops.
    for (const [i, end] of hold.end.entries()) expect(Math.abs(end - v[i]!)).toBeLessThan(5e-3);
  });

  test("an instant dump with the ends left joined: stages in reverse relax, their sum stays zero", () => {
    const chain = [stage(0.8, 0, 0, 10), stage(1.2, 0, 0, 10)];
    const course = courseOf(chain, program({ voltage: 100, hold: NONE, dump: { resistance: 0, seconds: 5 } }));
    const [, , at, after] = course.phases;
    expect(at!.end[0]).toBeCloseTo(-10, 9);
    expect(total([...after!.voltagesAt(2)])).toBeCloseTo(0, 9);
    expect(after!.end[0]).toBeGreaterThan(-10);
  });

  test("only what lasts is a phase of its own; an instant dump begins where the hold ended", () => {
    const chain = [stage(0.8, 0, 0, 10), stage(1.2, 0, 0, 10)];
    const names = (over: Partial<Program>) => courseOf(chain, program(over)).phases.map(({ name }) => name);
    expect(names({})).toEqual(["charge"]);
    expect(names({ hold: 1, rest: 1 })).toEqual(["charge", "hold", "rest"]);
    expect(names({ dump: { resistance: 0, seconds: 0 } })).toEqual(["charge", "dump"]);
    expect(names({ dump: { resistance: 0, seconds: 5 } })).toEqual(["charge", "dump", "dump"]);
    const course = courseOf(chain, program({ voltage: 100, hold: 3, dump: { resistance: 0, seconds: 0 } }));
    const [, hold, dump] = course.phases;
    expect(dump!.start).toEqual(hold!.end);
    expect(total(dump!.end)).toBeCloseTo(0, 12);
    // At the very moment of the dump it has happened.
    expect([...course.voltagesAt(3)]).toEqual([...dump!.end]);
    expect(total([...course.voltagesAt(2.999)])).toBeCloseTo(100, 9);
  });

  test("charged from what was left in it: every stage takes the same charge, and the sum is the voltage", () => {
    const chain = [stage(1e-3), stage(2e-3)];
    const { phases } = courseOf(chain, program({ start: [70, -40] }));
    expect(phases[0]!.start).toEqual([70, -40]);
    const [first, second] = phases[0]!.end;
    expect(first! + second!).toBeCloseTo(1000, 9);
    expect(1e-3 * (first! - 70)).toBeCloseTo(2e-3 * (second! + 40), 12);
  });

  test("energy: what a dump resistor takes is what the stages lose", () => {
    const chain = [stage(1), stage(2), stage(0.5)];
    const dump = phaseFrom({
      name: "dump",
      chain,
      drive: { kind: "source", voltage: 0, resistance: 3 },
      start: [30, 20, 50],
      seconds: 10,
    });
    let heat = 0;
    const steps = 40000;
    for (let k = 0; k <= steps; k++)
      heat += 3 * dump.currentAt((10 * k) / steps) ** 2 * (10 / steps) * (k % steps === 0 ? 0.5 : 1);
    const stored = (v: readonly number[]) => total(chain.map((s, i) => (s.capacitance * v[i]! ** 2) / 2));
    expect(heat).toBeCloseTo(stored(dump.start) - stored(dump.end), 3);
  });

  test("voltagesAt(t) walks through the phases and stays at the end afterwards", () => {
    const chain = [stage(1e-3, 0, 0, 1e4), stage(1e-3, 0, 0, 2e4)];
    const course = courseOf(
      chain,
      program({ charge: { kind: "current", current: 1 }, hold: 5, dump: { resistance: 10, seconds: 1 }, rest: 3 }),
    );
    const [charge, hold] = course.phases;
    expect([...course.voltagesAt(charge!.seconds + 2)]).toEqual([...hold!.voltagesAt(2)]);
    expect([...course.voltagesAt(1e9)]).toEqual([...course.phases.at(-1)!.end]);
    expect(course.phases.map((phase) => phase.name)).toEqual(["charge", "hold", "dump", "rest"]);
  });

  test("voltagesOver(grid) is voltagesAt one by one, across stretches and beyond the end", () => {
    const chain = [
      stage(1e-3, 5e-3),
      stage(1e-3, 1e-3, 1e-7),
      stage(1e-3),
      stage(2e-3, 0, 1e-6),
      stage(1e-3, 0, 0, 1e6),
    ];
    const hold = courseOf(chain, program({ hold: 400 })).phases[1]!;
    const rows = hold.voltagesOver({ from: 3, step: 7, count: 80 });
    for (let k = 0; k < 80; k++)
      for (const [i, v] of hold.voltagesAt(3 + 7 * k).entries()) expect(rows[k * 5 + i]).toBeCloseTo(v, 8);
  });
});
