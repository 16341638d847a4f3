// Source: [Cona] closed forms where all branches are alike; energy balance by [textbook-charging].
import { describe, expect, test } from "vitest";
import { ladderCourse } from "../../src/pulse/ladderCourse.ts";
import { near } from "./near.ts";

const NONE = { resistance: 0, inductance: 0 };
const LOAD = { resistance: 0.03, inductance: 1.9e-6 };
const BRANCH = { segment: NONE, capacitance: 1.25e-4, resistance: 0.04, inductance: 4e-7 };
const ALIKE = { ladder: [[BRANCH, BRANCH, BRANCH, BRANCH]], voltage: 3000, seconds: 2e-3 };

describe("ladderCourse(case)", () => {
  test("Source: methods A7: four branches without a bus: peak 31280.4767 A, action 56250 A^2 s, a quarter each", () => {
    const { peaks, actions, totalPeak, totalAction, seconds } = ladderCourse({
      ...ALIKE,
      drive: { kind: "load", load: LOAD },
    });
    near(totalPeak, 31280.4767, 1e-6);
    near(totalAction, 56250, 1e-6);
    for (const peak of peaks) near(peak, totalPeak / 4, 1e-9);
    for (const action of actions) near(action, totalAction / 16, 1e-9);
    expect(seconds).toBe(2e-3);
  });

  test("Source: methods A7: toZero: ends about the first current zero, action 49323.11 A^2 s up to the last step", () => {
    const { seconds, totalAction } = ladderCourse({ ...ALIKE, drive: { kind: "load", load: LOAD }, toZero: true });
    expect(seconds).toBeGreaterThan(1.0471e-4);
    expect(seconds).toBeLessThan(1.15e-4);
    near(totalAction, 49323.11, 1e-3);
  });

  test("energy: what every resistance takes is what was stored, on a bus that divides badly", () => {
    const segment = { resistance: 0.002, inductance: 1e-7 };
    const arm = [BRANCH, { ...BRANCH, segment }, { ...BRANCH, segment }];
    const { actions, totalAction } = ladderCourse({
      ladder: arm.map((place) => [place]),
      voltage: 3000,
      drive: { kind: "load", load: LOAD },
      seconds: 6e-3,
    });
    const heat = actions.reduce(
      (sum, action, k) => sum + action * (BRANCH.resistance + (k > 0 ? segment.resistance : 0)),
      0,
    );
    near(heat + totalAction * LOAD.resistance, (3 * BRANCH.capacitance * 9e6) / 2, 1e-6);
  });

  test("without any inductance the current starts at its peak, and with a given one the figures are its own", () => {
    const bare = { ...BRANCH, inductance: 0 };
    const load = { resistance: 0.09, inductance: 0 };
    near(
      ladderCourse({ ...ALIKE, ladder: [[bare, bare, bare, bare]], drive: { kind: "load", load } }).totalPeak,
      30000,
      1e-4,
    );
    const current = (time: number): number => 100 * Math.sin(2000 * Math.PI * time);
    const given = ladderCourse({ ...ALIKE, seconds: 1e-3, drive: { kind: "given", current } });
    near(given.totalPeak, 100, 1e-6);
    near(given.totalAction, 5, 5e-6);
    near(given.peaks[2] as number, 25, 1e-5);
  });

  test("many branches end where the work does, and `seconds` says how far", () => {
    const segment = { resistance: 1e-6, inductance: 1e-11 };
    const arm = Array.from({ length: 1000 }, () => ({ ...BRANCH, segment }));
    const { seconds, totalPeak } = ladderCourse({ ...ALIKE, ladder: [arm], drive: { kind: "load", load: LOAD } });
    expect(seconds).toBeGreaterThan(0);
    expect(totalPeak).toBeGreaterThan(0);
  });
});
