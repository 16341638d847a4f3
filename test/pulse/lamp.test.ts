// lamp: faults, then the constant against the published example and the resistivity law.
import { describe, expect, test } from "vitest";
import { checkLamp, lampConstant, TORR } from "../../src/pulse/lamp.ts";
import { codesOf, near } from "./near.ts";

const lamp = { bore: 8e-3, arcLength: 0.1, gas: "xenon", pressure: 450 * TORR, count: 1 } as const;

describe("checkLamp(lamp)", () => {
  test("every bad field, the gas among them", () => {
    const bad = { bore: 0, arcLength: -1, gas: "neon" as "xenon", pressure: Number.NaN, count: 1.5 };
    expect(codesOf(checkLamp(bad))).toEqual([
      "pulse.lamp.bore",
      "pulse.lamp.arcLength",
      "pulse.lamp.pressure",
      "pulse.lamp.count",
      "pulse.lamp.gas",
    ]);
    expect(checkLamp(lamp).ok).toBe(true);
  });
});

describe("lampConstant(lamp)", () => {
  test("worked: 100 mm by 8 mm of xenon at 450 torr is 16 ohm A^0.5", () => near(lampConstant(lamp), 16));

  // Published example: 90 mm by 4 mm at 450 torr is 28.8, and six in series 172.8 (flash-lamp page after a laser FAQ).
  test("six lamps of 90 mm by 4 mm in series are 172.8", () => {
    near(lampConstant({ ...lamp, bore: 4e-3, arcLength: 0.09, count: 6 }), 172.8);
  });

  test("krypton stands at 805 torr where xenon stands at 450, and both rise as the fifth root of pressure", () => {
    near(lampConstant({ ...lamp, gas: "krypton", pressure: 805 * TORR }), 16);
    near(lampConstant({ ...lamp, pressure: 32 * 450 * TORR }), 32);
  });

  test("is within 0.4 % of the resistivity law 1.13/sqrt(j) ohm cm", () =>
    near(lampConstant(lamp), 1.13 * Math.sqrt(4 / Math.PI) * 12.5, 4e-3));
});
