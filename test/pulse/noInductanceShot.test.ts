// noInductanceShot: refusals, pure RC as its own case, and the limit that the full mesh tends to.
import { describe, expect, test } from "vitest";
import { linearShot } from "../../src/pulse/linearShot.ts";
import { meshShot } from "../../src/pulse/meshShot.ts";
import { noInductanceShot } from "../../src/pulse/noInductanceShot.ts";
import { imbalance, ringing } from "./meshes.ts";
import { codesOf, got, near } from "./near.ts";

const none = { resistance: 0, inductance: 0 };
const lamp = { ...ringing, bank: none, load: none, lampConstant: 16, voltage: 900 };

describe("noInductanceShot(mesh)", () => {
  test("refuses a mesh of nothing, and a voltage not above the drop", () => {
    expect(codesOf(noInductanceShot({ ...lamp, lampConstant: 0 }))).toEqual(["pulse.loop.none"]);
    expect(codesOf(noInductanceShot({ ...lamp, switch: { drop: 900, resistance: 0, oneWay: false } }))).toEqual([
      "pulse.drop",
    ]);
  });

  test("without a lamp it is the pure RC discharge", () => {
    const rc = {
      ...ringing,
      load: { resistance: 0.03, inductance: 0 },
      switch: { drop: 20, resistance: 0.01, oneWay: false },
    };
    const [a, b] = [got(noInductanceShot(rc)), got(linearShot(rc))];
    near(a.peakCurrent, b.peakCurrent, 1e-13);
    near(a.action, b.action ?? 0, 1e-13);
    near(a.energy.switch, b.energy.switch, 1e-13);
    near(a.at(3e-5).voltage, b.at(3e-5).voltage, 1e-10);
  });

  test("a lamp alone: i = (V/K0)^2 at once, all energy in the lamp", () => {
    const shot = got(noInductanceShot(lamp));
    near(shot.peakCurrent, (900 / 16) ** 2, 1e-13);
    near(shot.energy.load, shot.energy.stored, 1e-13);
    near(shot.at(0).voltage, 900, 1e-10);
  });

  test("lamp and resistance with a drop: energies add up", () => {
    const shot = got(
      noInductanceShot({
        ...lamp,
        load: { resistance: 0.2, inductance: 0 },
        switch: { drop: 15, resistance: 0.05, oneWay: true },
      }),
    );
    expect(Math.abs(imbalance(shot.energy))).toBeLessThan(1e-13);
  });

  test("is what the full mesh tends to as its inductance goes: halving it halves the distance", () => {
    const limit = got(noInductanceShot(lamp)).action ?? 0;
    const off = [4e-8, 2e-8].map((inductance) => {
      const shot = got(meshShot({ ...lamp, load: { resistance: 0, inductance } }));
      return Math.abs((shot.action ?? 0) / limit - 1);
    });
    expect(off[0]).toBeLessThan(0.01);
    expect(off[1]! / off[0]!).toBeLessThan(0.6);
  });
});
