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

  test("pure RC: RC ln 2 at half, from the first instant", () => {
    const mesh = { ...ringing, load: { resistance: 0.03, inductance: 0 } };
    near(widthOf(got(linearShot(mesh)), 0.5), 0.04 * 500e-6 * Math.LN2, 1e-9);
  });
});
