// Parallel branches into one load, against step-by-step integration and against the closed form of one loop.
import { expect, test } from "vitest";
import { branchShot } from "../../src/pulse/branchShot.ts";
import { peaksOf } from "../../src/pulse/peaks.ts";
import { chance } from "../support/blendInstances.ts";

interface Plain {
  readonly c: number;
  readonly r: number;
  readonly l: number;
}

/** Peak current of each branch and of the load, and the first opposite voltage of each branch over V, by classical Runge-Kutta. */
function shot(branches: readonly Plain[], load: { readonly r: number; readonly l: number }, volts: number) {
  const m = branches.length;
  const each = 1 / load.l + branches.reduce((sum, { l }) => sum + 1 / l, 0);
  const slope = (y: readonly number[]): number[] => {
    const total = y.slice(m).reduce((sum, i) => sum + i, 0);
    let pull = (load.r * total) / load.l;
    branches.forEach(({ r, l }, k) => {
      pull += (y[k]! - r * y[m + k]!) / l;
    });
    const bus = pull / each;
    return [
      ...branches.map(({ c }, k) => -y[m + k]! / c),
      ...branches.map(({ r, l }, k) => (y[k]! - r * y[m + k]! - bus) / l),
    ];
  };
  const l = Math.min(load.l, ...branches.map((one) => one.l));
  const c = Math.min(...branches.map((one) => one.c));
  const r = load.r + branches.reduce((sum, one) => sum + one.r, 0);
  const step = 0.03 * Math.min(Math.sqrt(l * c), l / r);
  const whole = branches.reduce((sum, one) => sum + one.c, 0);
  const end = Math.max(25 * Math.sqrt((load.l + l) * whole), 8 * r * whole);
  let y = [...branches.map(() => volts), ...branches.map(() => 0)];
  const peaks = branches.map(() => 0);
  const lowest = branches.map(() => 0);
  const actions = branches.map(() => 0);
  for (let t = 0; t < end; t += step) {
    const add = (k: readonly number[], h: number): number[] => y.map((value, at) => value + h * k[at]!);
    const k1 = slope(y);
    const k2 = slope(add(k1, step / 2));
    const k3 = slope(add(k2, step / 2));
    const k4 = slope(add(k3, step));
    y = y.map((value, at) => value + (step / 6) * (k1[at]! + 2 * k2[at]! + 2 * k3[at]! + k4[at]!));
    for (let k = 0; k < m; k += 1) {
      peaks[k] = Math.max(peaks[k]!, Math.abs(y[m + k]!));
      actions[k] = actions[k]! + step * y[m + k]! ** 2;
      lowest[k] = Math.min(lowest[k]!, y[k]!);
    }
  }
  return { peaks, actions, reversal: lowest.map((one) => -one / volts) };
}

test("branchShot: 10 random sets of two and three branches, each against classical Runge-Kutta", () => {
  for (let seed = 1; seed <= 10; seed += 1) {
    const random = chance(seed);
    const between = (low: number, high: number): number => low * (high / low) ** random();
    const branches = Array.from({ length: 2 + (seed % 2) }, () => ({
      c: between(5e-5, 5e-4),
      r: between(0.05, 0.3),
      l: between(3e-7, 3e-6),
    }));
    const load = { r: between(0.1, 0.5), l: between(5e-7, 5e-6) };
    const hand = shot(branches, load, 800);
    const found = branchShot(
      branches.map(({ c, r, l }) => ({ capacitance: c, resistance: r, inductance: l })),
      { resistance: load.r, inductance: load.l },
      800,
    );
    found.forEach(({ peakCurrent, action, reversal }, k) => {
      expect(peakCurrent / hand.peaks[k]!, `seed ${seed}`).toBeCloseTo(1, 3);
      expect(action / hand.actions[k]!, `seed ${seed}`).toBeCloseTo(1, 2);
      expect(reversal, `seed ${seed}`).toBeCloseTo(Math.max(0, hand.reversal[k]!), 3);
    });
  }
}, 20_000);

test("branchShot: equal branches are one loop, by its closed form; also into a dead short and a load without inductance", () => {
  for (const [outerR, outerL] of [
    [0.1, 2e-6],
    [0.5, 0],
    [0, 0],
    [0, 3e-6],
  ] as const) {
    for (const count of [1, 2, 4]) {
      const branch = { capacitance: 1e-4, resistance: 0.08, inductance: 4e-7 };
      const loop = peaksOf(
        {
          capacitance: count * 1e-4,
          resistance: 0.08 / count + outerR,
          inductance: 4e-7 / count + outerL,
        },
        500,
      );
      if (!loop.ok) throw new Error(JSON.stringify(loop.refusals));
      const found = branchShot(Array(count).fill(branch), { resistance: outerR, inductance: outerL }, 500);
      for (const { peakCurrent, action, reversal } of found) {
        expect((peakCurrent * count) / loop.value.peakCurrent).toBeCloseTo(1, 4);
        expect((action * count * count) / loop.value.action!).toBeCloseTo(1, 4);
        expect(reversal).toBeCloseTo(loop.value.reversal, 4);
      }
    }
  }
});

test("branchShot: the heat in all resistances is the energy that was stored", () => {
  const branches = [
    { capacitance: 4.7e-4, resistance: 0.2, inductance: 2e-8 },
    { capacitance: 1e-4, resistance: 0.004, inductance: 1e-8 },
  ];
  // With all resistance inside the branches, each action times its resistance is its heat.
  const found = branchShot(branches, { resistance: 0, inductance: 1e-6 }, 900);
  const heat = found.reduce((sum, { action }, k) => sum + action * branches[k]!.resistance, 0);
  expect(heat / ((5.7e-4 * 900 ** 2) / 2)).toBeCloseTo(1, 5);
});
