import { describe, expect, test } from "vitest";
import { busForce } from "../../src/sheet/busForce.ts";
import { briefOf } from "../support/bank.ts";

const bus = (keys: object) => briefOf({ bus: keys }).bus;
const BARS = { shape: "flat bars", length: "1 m", width: "50 mm", gap: "2 mm", thickness: "3 mm" };

describe("busForce(bus, current)", () => {
  // SI Brochure, 8th edition: two thin wires 1 m apart that carry 1 A each push with 2e-7 N a metre (the ampere as it was defined until 2019).
  test("a wire pair 1 m apart at 1 A: 2e-7 N/m", () => {
    const pair = bus({ shape: "wire pair", length: "1 m", radius: "1 mm", spacing: "1 m" });
    expect(busForce(pair, 1)).toBeCloseTo(2e-7, 15);
  });

  test("flat bars: half the pressure B^2/mu0 times the width, four times at twice the current", () => {
    const at = (amperes: number) => busForce(bus(BARS), amperes) ?? Number.NaN;
    const field = (1.25663706127e-6 * 20e3) / 0.05;
    expect(at(20e3)).toBeCloseTo((field ** 2 / (2 * 1.25663706127e-6)) * 0.05, 6);
    expect(at(40e3) / at(20e3)).toBeCloseTo(4, 12);
  });

  test("a coax balances; a bus without its shape has no force that is known", () => {
    const coax = bus({ shape: "coax", length: "1 m", inner: "5 mm", outer: "8 mm", wall: "1 mm" });
    expect(busForce(coax, 1e5)).toBe(0);
    expect(busForce(undefined, 1e5)).toBeNull();
    expect(busForce(bus({ resistance: "1 mohm", inductance: "50 nH" }), 1e5)).toBeNull();
  });
});
