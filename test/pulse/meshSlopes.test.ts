// meshSlopes: the equations by hand at single states, and the slow tail's own law.
import { describe, expect, test } from "vitest";
import * as eq from "../../src/pulse/meshSlopes.ts";
import { near } from "./near.ts";

const mesh: eq.NormalMesh = {
  bankR: 0.2,
  bankL: 0.25,
  outerR: 0.3,
  outerL: 0.75,
  lamp: 0.8,
  drop: 0.1,
  clampDrop: 0.01,
  clampR: 0.05,
};

/** State with a root, a voltage and a bank current. */
function state(root: number, voltage: number, bank = 0): Float64Array {
  const y = new Float64Array(eq.STATES);
  y[eq.ROOT] = root;
  y[eq.VOLTAGE] = voltage;
  y[eq.BANK_CURRENT] = bank;
  return y;
}

describe("seriesSlope(mesh, side)", () => {
  test("at rest only the voltage less the drop drives, and nothing else moves", () => {
    const out = new Float64Array(eq.STATES);
    eq.seriesSlope(mesh, 1)(0, state(0, 1), out);
    near(out[eq.ROOT], 0.9, 1e-15);
    expect([...out.slice(1)].every((value) => value === 0)).toBe(true);
  });

  test("u = -0.5: current -0.25, time 2|u|, every integral of a size positive", () => {
    const out = new Float64Array(eq.STATES);
    eq.seriesSlope(mesh, -1)(0, state(-0.5, -0.4), out);
    near(out[eq.ROOT], -0.4 + 0.4 + 0.5 * 0.25 + 0.1, 1e-14);
    near(out[eq.VOLTAGE], 0.25 * 2 * 0.5, 1e-15);
    expect(out[eq.TIME]).toBe(1);
    near(out[eq.ACTION], 0.25 ** 2, 1e-15);
    near(out[eq.CHARGE], 0.25, 1e-15);
    near(out[eq.LAMP], 0.125, 1e-15);
  });
});

describe("clampedSlope(mesh, side), bankCurrent(mesh, y), terminalVoltage(mesh, side, y)", () => {
  test("the clamp carries what the bank does not", () => {
    const out = new Float64Array(eq.STATES);
    const y = state(0.5, 0.02, 0.1);
    eq.clampedSlope(mesh, 1)(0, y, out);
    const terminal = -0.01 - 0.05 * 0.15;
    near(out[eq.ROOT], (terminal - 0.4 - 0.3 * 0.25 - 0.1) / 0.75, 1e-14);
    near(out[eq.BANK_CURRENT], (0.02 - 0.02 - terminal) / 0.25, 1e-14);
    near(out[eq.CLAMP_CHARGE], 0.15, 1e-14);
  });

  test("a bank without inductance follows at once; without resistance either it carries nothing", () => {
    near(eq.bankCurrent({ ...mesh, bankL: 0 }, state(0.5, 0.02)), (0.02 + 0.01 + 0.05 * 0.25) / 0.25, 1e-14);
    expect(eq.bankCurrent({ ...mesh, bankL: 0, bankR: 0, clampR: 0 }, state(0.5, 0.02))).toBe(0);
  });

  test("terminals see the capacitor less the bank's own drops", () => {
    const y = state(0.5, 0.6);
    const rise = 0.6 - 0.4 - 0.125 - 0.1;
    near(eq.terminalVoltage(mesh, 1, y), 0.6 - 0.2 * 0.25 - 0.25 * rise, 1e-14);
  });
});

describe("tailVoltage(mesh, a), tailSlope(mesh, side)", () => {
  test("the slope is the derivative of the value", () => {
    const h = 1e-6;
    const [below, above] = [eq.tailVoltage(mesh, 0.1 - h).value, eq.tailVoltage(mesh, 0.1 + h).value];
    near(eq.tailVoltage(mesh, 0.1).slope, (above - below) / (2 * h), 1e-8);
  });

  test("charge leaves the capacitor as the current takes it: dv/dt = -i", () => {
    const out = new Float64Array(eq.STATES);
    eq.tailSlope(mesh, 1)(0, state(0.1, eq.tailVoltage(mesh, 0.1).value), out);
    near(out[eq.VOLTAGE]! / out[eq.TIME]!, -0.01, 1e-13);
  });

  test("coilShare is 2 a^2/(k + 2 r a)^2", () => near(eq.coilShare(mesh, 0.1), 0.02 / 0.81, 1e-13));
});
