// crowbar: when there is nothing to clamp, then the worked case, then against the integrator.
import { describe, expect, test } from "vitest";
import { crowbarOf } from "../../src/pulse/crowbar.ts";
import { meshShot } from "../../src/pulse/meshShot.ts";
import { got, near } from "./near.ts";

const loop = { capacitance: 500e-6, inductance: 2e-6, resistance: 0.04 };

describe("crowbarOf(loop, voltage, bankResistance)", () => {
  test("null from critical damping up and for a pure RC loop: the voltage never crosses zero", () => {
    expect(crowbarOf({ ...loop, resistance: 2 * Math.sqrt(2e-6 / 500e-6) * 1.001 }, 1, 0)).toBeNull();
    expect(crowbarOf({ ...loop, inductance: 0 }, 1, 0)).toBeNull();
  });

  test("lossless: a quarter turn, all energy in the coil, no bound on what follows", () => {
    const crowbar = crowbarOf({ ...loop, resistance: 0 }, 3000, 0);
    near(crowbar?.energyInLoop, 2250, 1e-12);
    near(crowbar?.actionBefore, ((Math.PI / 2) * 2250) / Math.sqrt(2e-6 / 500e-6), 1e-12);
    expect(crowbar?.actionAfter).toBeNull();
  });

  test("worked: 500 uF, 2 uH, 40 mohm of which 10 in the bank, 3 kV", () => {
    const crowbar = crowbarOf(loop, 3000, 0.01);
    near(crowbar?.time, 6.3084896e-5);
    near(crowbar?.current, 25241.6091);
    near(crowbar?.energyInLoop, 637.138829);
    near(crowbar?.actionBefore, 40321.5293);
    near((crowbar?.actionBefore ?? 0) * 0.03 + (crowbar?.energyInLoop ?? 0), 1846.78471);
    near((crowbar?.actionBefore ?? 0) * 0.01, 403.215293);
  });

  // All resistance outside and no drop: the diode turns on just when the internal voltage crosses zero, as here.
  test("agrees with the integrator's ideal clamp when the bank has no resistance of its own", () => {
    const none = { resistance: 0, inductance: 0 };
    const shot = got(
      meshShot({
        capacitance: 500e-6,
        voltage: 3000,
        bank: none,
        bus: none,
        load: { resistance: 0.04, inductance: 2e-6 },
        switch: { drop: 0, resistance: 0, oneWay: false },
        lampConstant: 0,
        clamp: { drop: 0, resistance: 0 },
      }),
    );
    const crowbar = crowbarOf(loop, 3000, 0);
    near(shot.bankAction, crowbar?.actionBefore ?? 0, 1e-9);
    near(shot.action, (crowbar?.actionBefore ?? 0) + (crowbar?.actionAfter ?? 0), 1e-9);
    expect(shot.reversal).toBeLessThan(1e-9);
  });
});
