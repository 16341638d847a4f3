// meshWatches: what each stage watches, and when the bank's branch may sleep.
import { describe, expect, test } from "vitest";
import * as eq from "../../src/pulse/meshSlopes.ts";
import { awake, hasFaded, watchesOf } from "../../src/pulse/meshWatches.ts";

const mesh: eq.NormalMesh = {
  bankR: 5e-4,
  bankL: 0,
  outerR: 0.3,
  outerL: 1,
  lamp: 0,
  drop: 0,
  clampDrop: 0.01,
  clampR: 0,
};

function state(root: number, voltage: number): Float64Array {
  const y = new Float64Array(eq.STATES);
  y[eq.ROOT] = root;
  y[eq.VOLTAGE] = voltage;
  return y;
}

describe("awake(mesh, side, y)", () => {
  test("a branch with inductance, with much resistance or with none never sleeps", () => {
    const y = state(0.5, -0.01);
    expect(awake({ ...mesh, bankL: 0.1 }, 1, y)).toBe(1);
    expect(awake({ ...mesh, bankR: 0.1 }, 1, y)).toBe(1);
    expect(awake({ ...mesh, bankR: 0 }, 1, y)).toBe(1);
  });

  test("awake while the capacitor is off the diode's drop, asleep once it stands there", () => {
    expect(awake(mesh, 1, state(0.5, -0.009))).toBeGreaterThan(0);
    expect(awake(mesh, 1, state(0.5, -0.01))).toBeLessThanOrEqual(0);
  });
});

describe("watchesOf(mode, mesh, side, peak)", () => {
  test("the first peak stops the stage, later ones are only noted", () => {
    expect(watchesOf("series", mesh, 1, 0)[0]?.stops).toBe(true);
    expect(watchesOf("series", mesh, 1, 0.5)[0]?.stops).toBe(false);
  });

  test("a series stage fades only while the capacitor still pushes the current on, never on the way to a reversal", () => {
    const fade = watchesOf("series", mesh, 1, 0.5)[2];
    expect(fade?.value(0, state(1e-5, 1e-7))).toBeGreaterThan(0);
    expect(fade?.value(0, state(1e-5, 2.9e-11))).toBeLessThan(0);
    expect(fade?.value(0, state(1e-5, -0.3))).toBeGreaterThan(0);
  });

  test("asleep and tail stop at nothing but fading", () => {
    expect(watchesOf("asleep", mesh, 1, 0.5)).toHaveLength(1);
    expect(watchesOf("tail", { ...mesh, lamp: 1 }, -1, 0.5)[0]?.value(0, state(-0.5, -0.1))).toBeGreaterThan(0);
  });
});

describe("hasFaded(mode, mesh, side, peak, y)", () => {
  test("never before the first peak, then as the stage's own watch", () => {
    expect(hasFaded("clamped", mesh, 1, 0, state(1e-9, 0))).toBe(false);
    expect(hasFaded("clamped", mesh, 1, 0.5, state(1e-9, 0))).toBe(true);
    expect(hasFaded("series", mesh, 1, 0.5, state(0.4, 0.3))).toBe(false);
  });
});
