// trace: the rows of a drawing.
import { describe, expect, test } from "vitest";
import { linearShot } from "../../src/pulse/linearShot.ts";
import { traceOf } from "../../src/pulse/trace.ts";
import { ringing } from "./meshes.ts";
import { got } from "./near.ts";

const shot = got(linearShot(ringing));

describe("traceOf(shot, count, until)", () => {
  test("never fewer than two rows, the first at nothing", () => {
    const rows = traceOf(shot, 0);
    expect(rows[0]).toEqual({ time: 0, current: 0, voltage: 3000 });
    expect(rows).toHaveLength(3);
  });

  test("the peak is among the rows, in order of time", () => {
    const rows = traceOf(shot, 50);
    expect(Math.max(...rows.map(({ current }) => current))).toBeCloseTo(shot.peakCurrent, 6);
    expect(rows.every((row, index) => index === 0 || row.time > rows[index - 1]!.time)).toBe(true);
  });

  test("stops where it is told, without a peak that lies beyond", () => {
    const rows = traceOf(shot, 10, shot.peakTime / 2);
    expect(rows).toHaveLength(10);
    expect(rows.at(-1)?.time).toBe(shot.peakTime / 2);
  });
});
