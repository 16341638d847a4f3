// linearShot: refusals and limits, energies, and the closed form with a switch drop against the integrator.

import { describe, expect, test } from "vitest";
import { linearShot } from "../../src/pulse/linearShot.ts";
import { meshShot } from "../../src/pulse/meshShot.ts";
import fc from "../support/property.ts";
import { anyMesh, imbalance, ringing } from "./meshes.ts";
import { codesOf, got, near } from "./near.ts";

describe("linearShot(mesh)", () => {
  test("refuses a charge voltage that the switch drop eats whole", () => {
    const mesh = { ...ringing, switch: { drop: 3000, resistance: 0, oneWay: false } };
    expect(codesOf(linearShot(mesh))).toEqual(["pulse.drop"]);
  });

  test("refuses a loop of nothing", () => {
    const none = { resistance: 0, inductance: 0 };
    expect(codesOf(linearShot({ ...ringing, bank: none, load: none }))).toEqual(["pulse.loop.none"]);
  });

  test("lossless: no action has a bound, and all the energy is left", () => {
    const shot = got(
      linearShot({ ...ringing, bank: { resistance: 0, inductance: 0 }, load: { resistance: 0, inductance: 2e-6 } }),
    );
    expect(shot.action).toBeNull();
    expect(shot.energy.left).toBe(shot.energy.stored);
    expect(shot.reversal).toBe(1);
  });

  test("worked: 1687.5 J of 2250 J into 30 of 40 mohm; a one-way switch stops at 49 323.11 A^2 s", () => {
    const shot = got(linearShot(ringing));
    near(shot.energy.load, 1687.5);
    near(shot.energy.bank, 562.5);
    const stopped = got(linearShot({ ...ringing, switch: { drop: 0, resistance: 0, oneWay: true } }));
    near(stopped.action, 49323.11);
    near(stopped.energy.left, 2250 * 0.350919807 ** 2);
    expect(stopped.at(1).voltage).toBeCloseTo(-3000 * 0.350919807, 4);
    expect(stopped.at(1).current).toBe(0);
  });

  test("a pure RC loop with a drop leaves C d^2/2", () => {
    const mesh = {
      ...ringing,
      load: { resistance: 0.03, inductance: 0 },
      switch: { drop: 30, resistance: 0, oneWay: false },
    };
    const shot = got(linearShot(mesh));
    near(shot.energy.left, 500e-6 * 450, 1e-12);
    near(shot.peakCurrent, 2970 / 0.04, 1e-12);
    expect(Math.abs(imbalance(shot.energy))).toBeLessThan(1e-12);
  });

  test("energies add up to the stored energy within 1e-9, for any mesh", () => {
    fc.assert(
      fc.property(anyMesh(false, false), (mesh) => {
        expect(Math.abs(imbalance(got(linearShot(mesh)).energy))).toBeLessThan(1e-9);
      }),
    );
  });

  // Two ways to the same shot: half-cycles in closed form, and the differential equation step by step.
  test("peak, action, reversal, energies and the sampled course agree with the integrator, for any mesh", () => {
    fc.assert(
      fc.property(anyMesh(false, false), fc.double({ min: 0, max: 1, noNaN: true }), (mesh, part) => {
        const [closed, stepped] = [got(linearShot(mesh)), got(meshShot(mesh))];
        near(stepped.peakCurrent, closed.peakCurrent, 1e-8);
        near(stepped.peakTime, closed.peakTime, 1e-6);
        near(stepped.action, closed.action ?? 0, 2e-8);
        // the integrator lets go at a millionth of the peak current: a reversal or an energy smaller than that it never sees
        expect(Math.abs(stepped.reversal - closed.reversal)).toBeLessThan(closed.reversal > 1e-6 ? 1e-8 : 1e-6);
        for (const name of ["load", "bank", "bus", "switch"] as const) {
          expect(Math.abs(stepped.energy[name] - closed.energy[name]) / closed.energy.stored).toBeLessThan(1e-6);
        }
        const time = part * Math.min(closed.duration, stepped.duration);
        const [a, b] = [closed.at(time), stepped.at(time)];
        expect(Math.abs(a.current - b.current) / closed.peakCurrent).toBeLessThan(1e-5);
        expect(Math.abs(a.voltage - b.voltage) / mesh.voltage).toBeLessThan(1e-5);
      }),
      { numRuns: 60 },
    );
  });
});
