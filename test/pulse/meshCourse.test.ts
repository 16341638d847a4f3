// meshCourse: the stages that a mesh passes through, and where it stops.
import { describe, expect, test } from "vitest";
import { courseOf } from "../../src/pulse/meshCourse.ts";
import { type NormalMesh, TIME, VOLTAGE } from "../../src/pulse/meshSlopes.ts";
import { near } from "./near.ts";

const plain: NormalMesh = {
  bankR: 0,
  bankL: 0,
  outerR: 0.2,
  outerL: 1,
  lamp: 0,
  drop: 0,
  clampDrop: null,
  clampR: 0,
};

describe("courseOf(mesh, oneWay, tolerance)", () => {
  test("a one-way switch stops at the first zero: pi/sqrt(1 - zeta^2) with zeta = 0.1", () => {
    const course = courseOf(plain, true, 1e-11);
    near(course.end[TIME], Math.PI / Math.sqrt(0.99), 1e-9);
    near(course.end[VOLTAGE], -Math.exp((-Math.PI * 0.1) / Math.sqrt(0.99)), 1e-9);
    near(course.lowest, course.end[VOLTAGE] ?? 0, 1e-12);
    expect(course.whole).toBe(true);
  });

  test("without loss it is followed for its share of half-cycles and then let go, still whole", () => {
    const course = courseOf({ ...plain, outerR: 0 }, false, 1e-8);
    expect(course.whole).toBe(true);
    near(Math.abs(course.end[VOLTAGE] ?? 0), 1, 1e-3);
  });

  test("a heavy drop ends the ring when the voltage can no longer overcome it", () => {
    const course = courseOf({ ...plain, drop: 0.3 }, false, 1e-11);
    expect(Math.abs(course.end[VOLTAGE] ?? 1)).toBeLessThanOrEqual(0.3);
  });

  test("a clamp ends the course in the clamped stage", () => {
    const course = courseOf({ ...plain, clampDrop: 0.01 }, false, 1e-11);
    expect(course.clamped).toBe(true);
    expect(course.lowest).toBeGreaterThanOrEqual(-0.01 - 1e-9);
  });

  test("a heavily damped lamp is let into its slow tail: few steps where the full mesh needs very many", () => {
    const course = courseOf({ ...plain, outerR: 0, lamp: 30 }, false, 1e-11);
    expect(course.whole).toBe(true);
    expect(course.steps).toBeLessThan(2000);
    near(course.peak.current, 1 / 900, 1e-3);
  });

  // Found by a long run: both went round and round until the steps ran out.
  test("a clamp that lets go when the current has already faded ends the course", () => {
    const mesh = { ...plain, bankR: 0.2315, outerR: 0.674, lamp: 0.3186, clampDrop: 0 };
    expect(courseOf(mesh, true, 1e-11).whole).toBe(true);
  });

  test("a clamp lower than the switch's drop never lets the drop drive the load", () => {
    const mesh = { ...plain, bankR: 0.19, bankL: 0.9, outerR: 0.26, outerL: 0.1, drop: 0.1, clampDrop: 0 };
    const course = courseOf(mesh, false, 1e-11);
    expect(course.whole).toBe(true);
    expect(course.end[TIME] ?? 0).toBeLessThan(100);
  });
});
