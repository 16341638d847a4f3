// bus: refusals by code, worked inductances, and the seams of resistance with skin depth.
import { describe, expect, test } from "vitest";
import { type BusGeometry, busOf } from "../../src/pulse/bus.ts";
import { codesOf, got, near } from "./near.ts";

const bars: BusGeometry = { kind: "flat bars", width: 0.1, gap: 0.003, thickness: 0.003, length: 0.4 };
const pair: BusGeometry = { kind: "wire pair", radius: 0.002, spacing: 0.02, length: 1 };
const coax: BusGeometry = { kind: "coax", inner: 0.005, outer: 0.015, wall: 0.001, length: 1 };
const copper = (frequency: number) => ({ resistivity: 1.7241e-8, frequency });

describe("busOf(geometry, use)", () => {
  test("refuses lengths of nothing, wires that overlap, a shell inside its core, a bad frequency", () => {
    expect(codesOf(busOf({ ...bars, width: 0, length: -1 }, copper(0)))).toEqual([
      "pulse.bus.width",
      "pulse.bus.length",
    ]);
    expect(codesOf(busOf({ ...pair, spacing: 0.004 }, copper(0)))).toEqual(["pulse.bus.spacing"]);
    expect(codesOf(busOf({ ...coax, outer: 0.005 }, copper(0)))).toEqual(["pulse.bus.outer"]);
    expect(codesOf(busOf(bars, copper(Number.NaN)))).toEqual(["pulse.bus.frequency"]);
    expect(codesOf(busOf(bars, { resistivity: 0, frequency: 0 }))).toEqual(["pulse.bus.resistivity"]);
  });

  test("worked: bars of 100 mm, 3 mm apart, 400 mm long", () => {
    const bus = got(busOf(bars, copper(1e4)));
    near(bus.ideal, 1.50796447e-8);
    near(bus.outside, 1.42182345e-8);
    near(bus.direct - bus.outside, (2 * 1.25663706127e-6 * 0.003 * 0.4) / 0.3, 1e-9);
  });

  test("worked: a pair of 4 mm wires 20 mm apart, 1 m", () => {
    const bus = got(busOf(pair, copper(0)));
    near(bus.outside, 9.16972668e-7);
    near(bus.direct, 1.01697267e-6);
    expect(bus.inductance).toBe(bus.direct);
  });

  test("coax: (mu0/2 pi) ln 3 per metre outside its core", () =>
    near(got(busOf(coax, copper(1e6))).outside, 2e-7 * Math.log(3), 1e-8));

  test("at high frequency only the field outside is left, and resistance grows as the root", () => {
    for (const geometry of [bars, pair, coax]) {
      const [low, high] = [got(busOf(geometry, copper(1e8))), got(busOf(geometry, copper(4e8)))];
      near(low.inductance, low.outside, 0.01);
      near(high.resistance / low.resistance, 2, 0.01);
    }
  });

  test("direct current fills the metal: 2 rho l/(w t), 2 rho l/(pi a^2)", () => {
    near(got(busOf(bars, copper(0))).resistance, (2 * 1.7241e-8 * 0.4) / (0.1 * 0.003), 1e-12);
    near(got(busOf(pair, copper(0))).resistance, (2 * 1.7241e-8) / (Math.PI * 0.002 ** 2), 1e-12);
    near(
      got(busOf(coax, copper(0))).resistance,
      (1.7241e-8 / Math.PI) * (1 / 0.005 ** 2 + 1 / (0.016 ** 2 - 0.015 ** 2)),
      1e-12,
    );
  });

  test("resistance never falls with frequency, and has no step where the skin depth meets the metal", () => {
    for (const geometry of [bars, pair, coax]) {
      let last = got(busOf(geometry, copper(0))).resistance;
      for (let f = 10; f < 1e6; f *= 1.01) {
        const { resistance } = got(busOf(geometry, copper(f)));
        expect(resistance).toBeGreaterThanOrEqual(last);
        expect(resistance / last).toBeLessThan(1.011);
        last = resistance;
      }
    }
  });

  test("bars narrower than five gaps are warned of", () => {
    const verdict = (gap: number) => got(busOf({ ...bars, gap }, copper(0))).findings[0]?.verdict;
    expect(verdict(0.02)).toBe("pass");
    expect(verdict(0.021)).toBe("warn");
  });
});
