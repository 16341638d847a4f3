// givenShot: what the bank does under a current that is given.
import { describe, expect, test } from "vitest";
import { recordedShot, steadyShot } from "../../src/pulse/givenShot.ts";
import { dischargeAt } from "../../src/pulse/rlc.ts";
import { imbalance, ringing } from "./meshes.ts";
import { codesOf, got, near } from "./near.ts";

describe("steadyShot(mesh, load)", () => {
  test("refuses a current that the bank cannot hold up for so long, and tells how long it can", () => {
    const read = steadyShot(ringing, { current: 1000, seconds: 1 });
    expect(codesOf(read)).toEqual(["pulse.steady.droop"]);
    expect(read.ok ? "" : read.refusals[0]?.want).toContain("at most 0.00149");
  });

  test("worked: 100 A for 1 ms on 825 uF falls by 121.212121 V", () => {
    const mesh = { ...ringing, capacitance: 825e-6, voltage: 1600 };
    const shot = got(steadyShot(mesh, { current: 100, seconds: 1e-3 }));
    near(1600 - shot.at(1e-3).voltage, 121.212121);
    near(shot.energy.bank, 0.01 * 100 * 100 * 1e-3, 1e-12);
    expect(Math.abs(imbalance(shot.energy))).toBeLessThan(1e-12);
    expect(shot.at(2e-3).current).toBe(0);
  });
});

describe("recordedShot(mesh, samples)", () => {
  test("refuses as the samples are refused", () => {
    expect(codesOf(recordedShot(ringing, [{ time: 0, current: 0 }]))).toEqual(["pulse.samples.few"]);
  });

  // The worked discharge played back as its own record: straight lines between 20 001 samples miss by the square of the step.
  test("the worked discharge recorded finely gives back its action and reversal", () => {
    const loop = { capacitance: 500e-6, inductance: 2e-6, resistance: 0.04 };
    const samples = Array.from({ length: 20001 }, (_, k) => {
      const time = k * 5e-8;
      return { time, current: dischargeAt(loop, 3000, time).current };
    });
    const shot = got(recordedShot(ringing, samples));
    near(shot.action, 56250, 1e-6);
    near(shot.reversal, 0.350919807, 1e-6);
    near(shot.energy.bank, 562.5, 1e-6);
    near(shot.energy.load, 1687.5, 1e-6);
    near(shot.peakCurrent, 31280.4767, 1e-6);
  });
});
