// lampLimits: the two explosion forms, and what is warned of.
import { describe, expect, test } from "vitest";
import { TORR } from "../../src/pulse/lamp.ts";
import { explosionOf, lampFindings } from "../../src/pulse/lampLimits.ts";
import { near } from "./near.ts";

const lamp = { bore: 8e-3, arcLength: 0.1, gas: "xenon", pressure: 450 * TORR, count: 1 } as const;
const verdicts = (energy: number, width: number, peakCurrent: number, count = 1) =>
  Object.fromEntries(
    lampFindings({ ...lamp, count }, { energy, width, peakCurrent }).map(({ id, verdict }) => [id, verdict]),
  );

describe("explosionOf(lamp, width)", () => {
  test("worked: 100 mm by 8 mm at 500 us by both forms, the lower one used and named", () => {
    const explosion = explosionOf(lamp, 500e-6);
    near(explosion.form90, 2004.39718);
    near(explosion.form12000, 2146.62526);
    expect(explosion.used).toBe(explosion.form90);
    expect(explosion.usedForm).toBe("90 d l");
    near(200 / explosion.used, 0.0997806236);
  });
});

describe("lampFindings(lamp, shot)", () => {
  test("a third of the explosion energy fails, a tenth passes, and lamps in series share it", () => {
    expect(verdicts(650, 500e-6, 1200)["lamp.explosion"]).toBe("fail");
    expect(verdicts(200, 500e-6, 1200)["lamp.explosion"]).toBe("pass");
    expect(verdicts(650, 500e-6, 1200, 2)["lamp.explosion"]).toBe("pass");
  });

  test("pulses and current densities outside the law are warned of, never failed", () => {
    expect(verdicts(1, 5e-6, 1200)["lamp.width.least"]).toBe("warn");
    expect(verdicts(1, 20e-3, 1200)["lamp.width.most"]).toBe("warn");
    expect(verdicts(1, 1e-3, 10)["lamp.density.least"]).toBe("warn");
    expect(verdicts(1, 1e-3, 1e5)["lamp.density.most"]).toBe("warn");
    expect(Object.values(verdicts(200, 500e-6, 1205))).toEqual(["pass", "pass", "pass", "pass", "pass"]);
  });
});
