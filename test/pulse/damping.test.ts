// damping: the functions of zeta at their edges, through critical, and against the textbook's separate cases.

import { describe, expect, test } from "vitest";
import { angleRatio, normalDischarge, peakFactor, reversalFactor } from "../../src/pulse/damping.ts";
import fc from "../support/property.ts";
import { near } from "./near.ts";

describe("angleRatio(damping)", () => {
  test("pi/2 lossless, 1 at critical, acosh(2)/sqrt 3 at two", () => {
    near(angleRatio(0), Math.PI / 2, 1e-15);
    expect(angleRatio(1)).toBe(1);
    near(angleRatio(2), Math.acosh(2) / Math.sqrt(3), 1e-15);
  });

  // The series about critical, A = 1 + e/3 + 2e^2/15 + ..., e = 1 - zeta, holds the smoothness to the last digits.
  test("follows its series on both sides of critical, where the textbook form has lost its digits", () => {
    for (const e of [1e-3, 1e-6, 1e-9, 1e-12, 2 ** -52, -1e-12, -1e-9, -1e-6, -1e-3]) {
      near(angleRatio(1 - e), 1 + e / 3 + (2 * e * e) / 15 + (2 * e ** 3) / 35, 1e-12);
    }
  });
});

describe("peakFactor(damping)", () => {
  test("1 lossless, 1/e at critical, 1/(2 zeta) far above", () => {
    expect(peakFactor(0)).toBe(1);
    near(peakFactor(1), 1 / Math.E, 1e-15);
    near(peakFactor(1e8) * 2e8, 1, 1e-12);
  });

  test("never rises with damping", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 50, noNaN: true }), fc.double({ min: 0, max: 50, noNaN: true }), (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        // neighbours among doubles differ by less than the last digits of the exponential
        expect(peakFactor(high)).toBeLessThanOrEqual(peakFactor(low) * (1 + 4e-15));
      }),
    );
  });
});

describe("reversalFactor(damping)", () => {
  test("1 lossless, 0 at critical and above, and nothing but 0 just below", () => {
    expect(reversalFactor(0)).toBe(1);
    expect(reversalFactor(1)).toBe(0);
    expect(reversalFactor(7)).toBe(0);
    expect(reversalFactor(1 - 1e-9)).toBe(0);
  });

  test("in Q: exp(-pi/sqrt(4 Q^2 - 1)), the other form of the same law", () => {
    for (const q of [0.6, 1, 5, 40])
      near(reversalFactor(1 / (2 * q)), Math.exp(-Math.PI / Math.sqrt(4 * q * q - 1)), 1e-12);
  });
});

describe("normalDischarge(damping, time)", () => {
  test("starts at no current and full voltage at any damping", () => {
    for (const zeta of [0, 0.3, 1, 4, 1e6]) expect(normalDischarge(zeta, 0)).toEqual({ current: 0, voltage: 1 });
  });

  test("critical: tau e^-tau and (1 + tau) e^-tau", () => {
    for (const tau of [0.1, 1, 7]) {
      const { current, voltage } = normalDischarge(1, tau);
      near(current, tau * Math.exp(-tau), 1e-14);
      near(voltage, (1 + tau) * Math.exp(-tau), 1e-14);
    }
  });

  // Near critical, ln i changes with zeta as tau^2/3 - tau (the sine's series); second order is 1e-16 here.
  test("passes critical along its slope: no step and no noise above 2e-13", () => {
    for (const tau of [0.1, 1, 3, 10]) {
      const at = normalDischarge(1, tau).current;
      for (const off of [-1e-8, -1e-10, 1e-10, 1e-8]) {
        near(normalDischarge(1 + off, tau).current, at * (1 + off * (tau * tau * (1 / 3) - tau)), 2e-13);
      }
    }
  });

  test("far overdamped it neither overflows nor goes negative: e^(-tau/(2 zeta))", () => {
    const { current, voltage } = normalDischarge(1e6, 1e6);
    near(voltage, Math.exp(-0.5), 1e-9);
    near(current, Math.exp(-0.5) / 2e6, 1e-9);
  });

  test("keeps the law of the loop: v + 2 zeta i + di/dtau is nothing, by differences", () => {
    const h = 1e-4;
    for (const zeta of [0.1, 0.9999, 1.0001, 3]) {
      for (const tau of [0.3, 1.1, 4]) {
        const slope = (normalDischarge(zeta, tau + h).current - normalDischarge(zeta, tau - h).current) / (2 * h);
        const { current, voltage } = normalDischarge(zeta, tau);
        expect(Math.abs(voltage - 2 * zeta * current - slope)).toBeLessThan(1e-7);
      }
    }
  });
});
