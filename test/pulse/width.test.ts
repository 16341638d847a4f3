// width: of pulses with known widths.
import { describe, expect, test } from "vitest";
import { linearShot } from "../../src/pulse/linearShot.ts";
import { widthOf } from "../../src/pulse/width.ts";
import { ringing } from "./meshes.ts";
import { got, near } from "./near.ts";

const bare = { resistance: 0, inductance: 0 };

describe("widthOf(shot, part)", () => {
  test("null when the current has not fallen so far by the end", () => {
    const shot = got(linearShot(ringing));
    expect(widthOf({ ...shot, duration: shot.peakTime * 1.01 }, 0.5)).toBeNull();
  });

  test("half a sine of a lossless ring: 2 sqrt(LC) acos(1/2) at half", () => {
    const mesh = { ...ringing, bank: bare, load: { resistance: 0, inductance: 2e-6 } };
    near(widthOf(got(linearShot(mesh)), 0.5), 2 * Math.acos(0.5) * Math.sqrt(1e-9), 1e-9);
  });

  test("a ring: between the two passages of its first half-cycle, as 100 000 samples see them, at many parts of the peak", () => {
    const shot = got(linearShot(ringing));
    for (const part of [0.05, 0.3, 0.7, 0.95]) {
      const level = part * shot.peakCurrent;
      // The first half-cycle ends at pi/omega, some two and a half peak times on.
      const step = (3 * shot.peakTime) / 100000;
      let above = 0;
      for (let k = 0; k < 100000 && (k * step < shot.peakTime || shot.at(k * step).current >= level); k++)
        if (shot.at(k * step).current >= level) above++;
      near(widthOf(shot, part), above * step, 1e-4);
    }
  });

  test("pure RC: RC ln 2 at half, from the first instant", () => {
    const mesh = { ...ringing, load: { resistance: 0.03, inductance: 0 } };
    near(widthOf(got(linearShot(mesh)), 0.5), 0.04 * 500e-6 * Math.LN2, 1e-9);
  });
});
