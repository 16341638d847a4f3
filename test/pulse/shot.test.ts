// shot: totals of a mesh.
import { expect, test } from "vitest";
import { inductanceOf, resistanceOf, storedIn } from "../../src/pulse/shot.ts";
import { ringing } from "./meshes.ts";

test("resistanceOf, inductanceOf and storedIn sum the whole loop, the switch's resistance included", () => {
  const mesh = {
    ...ringing,
    switch: { drop: 5, resistance: 0.002, oneWay: true },
    bus: { resistance: 0.001, inductance: 1e-7 },
  };
  expect(resistanceOf(mesh)).toBeCloseTo(0.043, 15);
  expect(inductanceOf(mesh)).toBeCloseTo(2.1e-6, 18);
  expect(storedIn(mesh)).toBe(2250);
});
