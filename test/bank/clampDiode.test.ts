// Clamp diode duty against the dump worked out step by step with the ideal diode in it.
import { describe, expect, test, vi } from "vitest";
import { type ClampCase, clampDiode } from "../../src/bank/clampDiode.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const BASE: ClampCase = {
  ties: "cross-tied",
  n: 4,
  p: 5,
  C: 3300e-6,
  tLow: 0.2,
  tHigh: 0.2,
  victim: 400,
  others: 400,
  worstVoltage: 533.3,
  dumpResistance: 2,
  esr: null,
};

interface Duty {
  readonly surge: number;
  readonly action: number;
}

/** Euler steps of strings joined at their ends on one resistor; a unit at zero is held there by its diode. */
function stepped(
  strings: readonly (readonly number[])[],
  V: readonly number[],
  resistance: number,
  steps: number,
): Duty {
  const v = strings.map(() => [...V]);
  let surge = 0;
  let action = 0;
  const total = strings.reduce((sum, units) => sum + 1 / units.reduce((s, c) => s + 1 / c, 0), 0);
  const step = (12 * resistance * total) / steps;
  for (let k = 0; k < steps; k++) {
    // A unit at zero with current flowing on is out of its string.
    const live = strings.map((units, s) => 1 / units.reduce((sum, c, i) => sum + (v[s]![i]! > 0 ? 1 / c : 0), 0));
    const ends = v[0]!.reduce((sum, x) => sum + x, 0);
    const all = live.reduce((sum, c) => sum + c, 0);
    const current = ends / resistance;
    const own = (current * live[0]!) / all;
    if (!(v[0]![0]! > 0)) {
      surge = Math.max(surge, own);
      action += own * own * step;
    }
    for (const [s, units] of strings.entries())
      for (const [i, c] of units.entries())
        if (v[s]![i]! > 0) v[s]![i] = Math.max(0, v[s]![i]! - (((current * live[s]!) / all) * step) / c);
  }
  return { surge, action };
}

describe("clampDiode(case)", () => {
  test("units alike: nothing to carry, but still something to block", () => {
    expect(clampDiode({ ...BASE, tLow: 0, tHigh: 0 })).toEqual({
      count: 4,
      reverseVoltage: 533.3,
      surgeCurrent: 0,
      action: 0,
    });
  });

  test("units alike carry nothing, known, even where nothing limits a current", () => {
    for (const ties of ["cross-tied", "strings"] as const)
      expect(clampDiode({ ...BASE, ties, tLow: 0, tHigh: 0, dumpResistance: 0 })).toMatchObject({
        surgeCurrent: 0,
        action: 0,
      });
  });

  test("strings by hand: 400 V left, 3960 uF/3 of that and two strings of 2640 uF/4 on 2 ohm; alone through 3 x 0.1 ohm", () => {
    const [own, others] = [3960e-6 / 3, (2 * 2640e-6) / 4];
    const part = own / (own + others);
    const shared = clampDiode({ ...BASE, ties: "strings", p: 3 });
    expect(shared.surgeCurrent).toBeCloseTo((part * 400) / 2, 9);
    expect(shared.action).toBeCloseTo((part * own * 400 ** 2) / 4, 9);
    const alone = clampDiode({ ...BASE, ties: "strings", p: 3, dumpResistance: 0, esr: 0.1 });
    expect(alone.action).toBeCloseTo((own * 400 ** 2) / 0.6, 9);
  });

  test("neither resistor nor ESR known: current and action unknown, not zero", () => {
    for (const ties of ["cross-tied", "strings"] as const)
      expect(clampDiode({ ...BASE, ties, dumpResistance: 0 })).toMatchObject({ surgeCurrent: null, action: null });
  });

  test("one for each stage cross-tied, for each unit in strings", () => {
    expect(clampDiode(BASE).count).toBe(4);
    expect(clampDiode({ ...BASE, ties: "strings" }).count).toBe(20);
  });

  test("by hand: the others hold 3 x 400 x (1 - 0.8/1.2) = 400 V, so 200 A and 5 x 3960 uF / 3 x 400^2 / 4 ohm", () => {
    const found = clampDiode(BASE);
    expect(found.surgeCurrent).toBeCloseTo(200, 9);
    expect(found.action).toBeCloseTo((5 * 3960e-6 * 400 ** 2) / 3 / 4, 9);
  });

  test("agrees with 4e5 steps of a dump through the diode, cross-tied, within 1e-3", () => {
    const low = 5 * 3300e-6 * 0.8;
    const high = 5 * 3300e-6 * 1.2;
    const seen = stepped([[low, high, high, high]], [400, 400, 400, 400], 2, 4e5);
    const found = clampDiode(BASE);
    expect(seen.surge / found.surgeCurrent!).toBeCloseTo(1, 3);
    expect(seen.action / found.action!).toBeCloseTo(1, 3);
  });

  test("strings: agrees with the stepped dump when the other strings are all low, and bounds 20 others", () => {
    const low = 3300e-6 * 0.8;
    const high = 3300e-6 * 1.2;
    const given: ClampCase = { ...BASE, ties: "strings", p: 3 };
    const found = clampDiode(given);
    const start = [400, 400, 400, 400];
    const worst = [
      [low, high, high, high],
      [low, low, low, low],
      [low, low, low, low],
    ];
    const seen = stepped(worst, start, 2, 4e5);
    expect(seen.surge / found.surgeCurrent!).toBeCloseTo(1, 2);
    expect(seen.action / found.action!).toBeGreaterThan(0.9);
    expect(seen.action / found.action!).toBeLessThan(1.001);
    for (let set = 0; set < 20; set++) {
      const mixed = [1, 2].map((s) =>
        start.map((_, i) => ((set * 7 + s * 3) >> i) & 1).map((bit) => (bit ? low : high)),
      );
      const other = stepped([worst[0]!, ...mixed], start, 2, 4e4);
      expect(other.surge).toBeLessThanOrEqual(found.surgeCurrent! * (1 + 1e-3));
      expect(other.action).toBeLessThanOrEqual(found.action! * (1 + 1e-3));
    }
  });

  test("all 2^4 corners of a cross-tied bank: none loads a diode more", () => {
    const found = clampDiode(BASE);
    for (let set = 0; set < 16; set++) {
      const stages = [0, 1, 2, 3].map((i) => 5 * 3300e-6 * ((set >> i) & 1 ? 0.8 : 1.2));
      const seen = stepped([stages], [400, 400, 400, 400], 2, 4e4);
      expect(seen.surge).toBeLessThanOrEqual(found.surgeCurrent! * (1 + 1e-3));
      expect(seen.action).toBeLessThanOrEqual(found.action! * (1 + 1e-3));
    }
  });

  test("ESR adds to the dump resistor cross-tied; alone it limits both ties", () => {
    expect(clampDiode({ ...BASE, esr: 0.1 }).surgeCurrent).toBeCloseTo(400 / 2.06, 9);
    expect(clampDiode({ ...BASE, ties: "strings", dumpResistance: 0, esr: 0.1 }).surgeCurrent).toBeCloseTo(
      400 / 0.3,
      9,
    );
  });
});
