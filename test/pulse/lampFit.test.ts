// lampFit: the ideal circuit fits itself, and a buildable one is told how far it lands.
import { describe, expect, test } from "vitest";
import { lampCircuit } from "../../src/pulse/lampDrive.ts";
import { lampFit } from "../../src/pulse/lampFit.ts";
import { got, near } from "./near.ts";

const ideal = got(lampCircuit({ constant: 16, energy: 200, width: 500e-6, alpha: 0.8, rule: "exact" }));

describe("lampFit(constant, ideal, built)", () => {
  test("the ideal circuit against itself is one all over", () => {
    const fit = got(lampFit(16, ideal, ideal));
    near(fit.energyRatio, 1, 1e-15);
    expect(fit.alpha).toBe(fit.idealAlpha);
    expect(fit.peakCurrent).toBe(fit.idealPeakCurrent);
  });

  test("470 uF in place of 411 at the same volts: more energy, longer, lighter damping, more reversal", () => {
    const fit = got(lampFit(16, ideal, { ...ideal, capacitance: 470e-6 }));
    near(fit.energyRatio, 470e-6 / 4.11035346e-4);
    near(fit.widthRatio, Math.sqrt(470e-6 / 4.11035346e-4));
    // alpha goes as Z0^-1/2, so as C^1/4
    near(fit.alpha, 0.8 * (470e-6 / 4.11035346e-4) ** 0.25);
    expect(fit.peakCurrent).toBeGreaterThan(fit.idealPeakCurrent);
    expect(fit.halfWidth ?? 0).toBeGreaterThan(fit.idealHalfWidth ?? 0);
  });

  test("a circuit of nothing is refused", () => {
    expect(lampFit(16, ideal, { ...ideal, inductance: 0 }).ok).toBe(false);
  });
});
