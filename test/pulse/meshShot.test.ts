// meshShot: refusals, energy balance of lamp and clamp meshes as a property, and cases with known answers.

import { describe, expect, test } from "vitest";
import { FINE, meshShot, normalMesh } from "../../src/pulse/meshShot.ts";
import fc from "../support/property.ts";
import { anyMesh, imbalance, ringing } from "./meshes.ts";
import { codesOf, got, near } from "./near.ts";

describe("meshShot(mesh)", () => {
  test("refuses a mesh without inductance, and a voltage that the drop eats whole", () => {
    const bare = { ...ringing, load: { resistance: 0.03, inductance: 0 } };
    expect(codesOf(meshShot(bare))).toEqual(["pulse.loop.none"]);
    expect(codesOf(meshShot({ ...ringing, switch: { drop: 3000, resistance: 0, oneWay: false } }))).toEqual([
      "pulse.drop",
    ]);
  });

  test("refuses as stiff, never as an answer, what it cannot follow to the end", () => {
    const bank = { resistance: 0.5, inductance: 0 };
    const stiff = { ...ringing, bank, clamp: { drop: 1, resistance: 0 }, load: { resistance: 0, inductance: 1e-16 } };
    expect(codesOf(meshShot(stiff))).toEqual(["pulse.stiff"]);
  }, 20_000);

  test("next to no inductance inside the bank is the same as none", () => {
    const clamp = { drop: 1, resistance: 1e-3 };
    const shots = [0, 1e-320, 1e-14].map((inductance) =>
      got(meshShot({ ...ringing, clamp, bank: { resistance: 0.01, inductance } })),
    );
    near(shots[1]?.action, shots[0]?.action ?? 0, 1e-12);
    near(shots[2]?.action, shots[0]?.action ?? 0, 1e-7);
  });

  // A pulsed magnet: the bank's own inductance is a hundred-thousandth of the coil's, which makes the clamped stage stiff.
  test("a bank of next to no resistance settles against the diode and sleeps, and the energies still add up", () => {
    for (const resistance of [0, 1e-7, 5e-5]) {
      for (const slope of [0, 1e-6, 5e-5]) {
        const bank = { resistance, inductance: 0 };
        const shot = got(meshShot({ ...ringing, bank, clamp: { drop: 2, resistance: slope } }));
        expect(Math.abs(imbalance(shot.energy))).toBeLessThan(1e-9);
      }
    }
  });

  test("a large coil on a bank of little inductance is still followed to its end", () => {
    const shot = got(
      meshShot({
        ...ringing,
        capacitance: 10e-3,
        bank: { resistance: 0.01, inductance: 20e-9 },
        load: { resistance: 0.04, inductance: 1e-3 },
        clamp: { drop: 2, resistance: 1e-3 },
      }),
    );
    expect(Math.abs(imbalance(shot.energy))).toBeLessThan(1e-9);
  }, 20_000);

  test("worked: an ideal clamp's outer loop takes 1846.78 J, less what a bank resistance of its own changes", () => {
    const shot = got(
      meshShot({
        ...ringing,
        bank: { resistance: 0, inductance: 0 },
        load: { resistance: 0.04, inductance: 2e-6 },
        clamp: { drop: 0, resistance: 0 },
      }),
    );
    near(shot.energy.load, 2250, 1e-9);
    near(shot.bankAction, 40321.5293);
    near(shot.peakCurrent, 31280.4767);
    expect(shot.reversal).toBe(0);
  });

  test("a clamp keeps the bank within its own drop, where without it the bank would reverse by 35 %", () => {
    const shot = got(meshShot({ ...ringing, clamp: { drop: 3, resistance: 0 } }));
    expect(shot.reversal).toBeLessThanOrEqual(3 / 3000 + 1e-9);
    expect(shot.energy.clamp).toBeGreaterThan(0);
    expect(shot.at(shot.duration * 2).current).toBe(0);
  });

  test("energies add up to the stored energy within 1e-9, for any lamp mesh", () => {
    fc.assert(
      fc.property(anyMesh(true, false), (mesh) => {
        expect(Math.abs(imbalance(got(meshShot(mesh)).energy))).toBeLessThan(1e-9);
      }),
      { numRuns: 60, endOnFailure: true },
    );
  });

  test("energies add up to the stored energy within 1e-9, for any clamped mesh", () => {
    fc.assert(
      fc.property(anyMesh(false, true), (mesh) => {
        expect(Math.abs(imbalance(got(meshShot(mesh)).energy))).toBeLessThan(1e-9);
      }),
      { numRuns: 60 },
    );
    // sixty integrated shots: minutes of grace on a machine that has other work
  }, 60_000);

  test("a lamp and a clamp at once balance too", () => {
    fc.assert(
      fc.property(anyMesh(true, true), (mesh) => {
        expect(Math.abs(imbalance(got(meshShot(mesh)).energy))).toBeLessThan(1e-9);
      }),
      { numRuns: 30 },
    );
  });

  test("scales: the same normal mesh at other volts, ohms and seconds is the same shot", () => {
    fc.assert(
      fc.property(anyMesh(true, false), fc.double({ min: 0.1, max: 10, noNaN: true }), (mesh, k) => {
        const bigger = {
          ...mesh,
          capacitance: mesh.capacitance * k,
          bank: { ...mesh.bank, inductance: mesh.bank.inductance * k },
          bus: { ...mesh.bus, inductance: mesh.bus.inductance * k },
          load: { ...mesh.load, inductance: mesh.load.inductance * k },
        };
        const [a, b] = [got(meshShot(mesh)), got(meshShot(bigger))];
        near(b.peakCurrent, a.peakCurrent, 1e-9);
        near(b.peakTime, a.peakTime * k, 1e-9);
      }),
      { numRuns: 20 },
    );
  });

  test("the tolerance is the user's: at 1e-7 the peak is within 1e-6 of the fine one", () => {
    const lamp = { ...ringing, lampConstant: 0.8 * Math.sqrt(3000 * Math.sqrt(2e-6 / 500e-6)) };
    near(got(meshShot(lamp, 1e-7)).peakCurrent, got(meshShot(lamp, FINE)).peakCurrent, 1e-6);
  });
});

describe("normalMesh(mesh)", () => {
  test("zeta is half the sum of its resistances, and its inductances sum to one", () => {
    const m = normalMesh({ ...ringing, bank: { resistance: 0.01, inductance: 5e-7 } });
    near(m.bankL + m.outerL, 1, 1e-15);
    near(((m.bankR + m.outerR) / 2) * Math.sqrt(2.5 / 2), 0.316227766);
    expect(m.clampDrop).toBeNull();
  });
});
