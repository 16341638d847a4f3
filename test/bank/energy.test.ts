// Stored and pulse energy and the capacitance a pulse needs, against the worked numbers, integration and ml-matrix.
import { Matrix, solve } from "ml-matrix";
import { describe, expect, test } from "vitest";
import {
  bankCapacitance,
  FIT,
  leastParallel,
  pulseEnergy,
  requiredCapacitance,
  storedEnergy,
} from "../../src/bank/energy.ts";
import { chance } from "../support/random.ts";

const near = (a: number, b: number, relative = 1e-9): void =>
  expect(Math.abs(a - b), `${a} for ${b}`).toBeLessThanOrEqual(relative * Math.abs(b));

describe("storedEnergy(C, V), pulseEnergy(C, V, r)", () => {
  test("a full dump is all that is stored", () =>
    expect(pulseEnergy(0.004125, 1600, 1)).toBe(storedEnergy(0.004125, 1600)));
  test("worked number A1: 4.125 mF at 1600 V holds 5280 J", () => near(storedEnergy(0.004125, 1600), 5280));
  test("worked number A5: 825 uF at 1600 V holds 1056 J, at 60 V 1.485 J", () => {
    near(storedEnergy(825e-6, 1600), 1056);
    near(storedEnergy(825e-6, 60), 1.485);
  });
  test("the charge drawn times the falling voltage, summed in 20000 steps, is the pulse energy: 1e-8 (midpoint rule)", () => {
    const [c, v, r] = [3.3e-3, 900, 0.35];
    const steps = 20000;
    let sum = 0;
    for (let i = 0; i < steps; i++) sum += (v - ((i + 0.5) / steps) * v * r) * ((c * v * r) / steps);
    near(pulseEnergy(c, v, r), sum, 1e-8);
  });
});

describe("requiredCapacitance(need)", () => {
  test("C_req = 2E/(V^2 r (2 - r)): the demo's 991.735537 uF", () =>
    near(requiredCapacitance({ energy: 2400, voltage: 2200, ripple: 1 }), 991.735537e-6, 1e-8));
  test("gives back exactly its energy, 200 random needs", () => {
    const c = chance(41);
    for (let i = 0; i < 200; i++) {
      const need = { energy: c.between(1e-3, 1e6), voltage: c.between(1, 1e5), ripple: c.between(1e-4, 1) };
      near(pulseEnergy(requiredCapacitance(need), need.voltage, need.ripple), need.energy);
    }
  });
  test("the larger of pulse and steady current: I/(f r V) = 0.625 F against 0.131578947 F, and the other way round", () => {
    near(requiredCapacitance({ energy: 20, voltage: 40, ripple: 0.1, steady: { current: 5, frequency: 2 } }), 0.625);
    const weak = { energy: 20, voltage: 40, ripple: 0.1, steady: { current: 0.5, frequency: 2 } };
    near(requiredCapacitance(weak), 0.131578947, 1e-8);
  });
});

describe("bankCapacitance(C, n, p)", () => {
  test("worked number A1: four in series of five 3300 uF is 4.125 mF", () =>
    near(bankCapacitance(3300e-6, 4, 5), 0.004125));

  test("charge on the ends by solving the circuit of n by p units with ml-matrix, cross-tied and strings: the same", () => {
    for (const [n, p] of [
      [1, 1],
      [2, 3],
      [4, 5],
      [7, 2],
    ] as const) {
      // Cross-tied: stage nodes; charge balance C (V_{k-1} - V_k) p = C (V_k - V_{k+1}) p.
      const a = Matrix.zeros(n + 1, n + 1);
      const b = Matrix.zeros(n + 1, 1);
      a.set(0, 0, 1);
      b.set(0, 0, 1);
      a.set(n, n, 1);
      for (let k = 1; k < n; k++) {
        a.set(k, k - 1, -1);
        a.set(k, k, 2);
        a.set(k, k + 1, -1);
      }
      const volts = solve(a, b).to1DArray();
      near(bankCapacitance(3300e-6, n, p), 3300e-6 * p * (volts[0]! - volts[1]!));
    }
  });
});

describe("leastParallel(required, n, C)", () => {
  test("never none", () => expect(leastParallel(1e-12, 1, 1)).toBe(1));
  test("an exact fit is a fit, and so is one short by less than 1e-9", () => {
    expect(leastParallel(3e-3, 2, 1e-3)).toBe(6);
    expect(leastParallel(3e-3 * (1 + 0.5 * FIT), 2, 1e-3)).toBe(6);
    expect(leastParallel(3e-3 * (1 + 3 * FIT), 2, 1e-3)).toBe(7);
    expect(leastParallel(0.3, 1, 0.1)).toBe(3);
  });
  test("counting up gives the same, 500 random cases", () => {
    const c = chance(42);
    for (let i = 0; i < 500; i++) {
      const [required, n, unit] = [c.between(1e-5, 1e-2), c.whole(1, 20), c.between(1e-5, 1e-2)];
      let p = 1;
      while (bankCapacitance(unit, n, p) < required * (1 - 1e-9)) p++;
      expect(leastParallel(required, n, unit)).toBe(p);
    }
  });
});
