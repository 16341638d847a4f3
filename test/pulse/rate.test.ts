// rate: the worked rms current, unknowns that stay unknown, and a charger that cannot keep up.
import { describe, expect, test } from "vitest";
import { type Duty, heatingOf, highestRate, rateFindings } from "../../src/pulse/rate.ts";
import { near } from "./near.ts";

const duty: Duty = {
  rate: 0.1,
  chargeAction: 0.2 ** 2 * 7.5,
  shotAction: 56250,
  esr: 0.005,
  unitShare: 0.2,
  unitEsr: 0.025,
  thermalResistance: 4,
};

describe("heatingOf(duty)", () => {
  test("worked: 75.0002 A and 28.12515 W in the bank", () => {
    const heating = heatingOf(duty);
    near(heating.rms, 75.0002, 1e-8);
    near(heating.power, 28.12515, 1e-9);
    near(heating.unitPower, 28.12515 / 5, 1e-9);
    near(heating.unitRise, (28.12515 / 5) * 4, 1e-9);
  });

  test("unknown ESR or thermal resistance leaves heat and rise unknown", () => {
    expect(heatingOf({ ...duty, esr: null, unitEsr: null })).toMatchObject({
      power: null,
      unitPower: null,
      unitRise: null,
    });
    expect(heatingOf({ ...duty, thermalResistance: null }).unitRise).toBeNull();
  });
});

describe("highestRate(cycle), rateFindings(heating, wanted, limits)", () => {
  test("500 uF to 3 kV at 0.2 A takes 7.5 s: at most 0.1 Hz with 2.5 s of waiting", () => {
    near(highestRate({ charge: 7.5, wait: 2.5, pulse: 0 }), 0.1, 1e-12);
  });

  test("each finding compares its own value with its own limit, in its unit", () => {
    const heating = heatingOf(duty);
    near(heating.unitRms, 75.0002 / 5, 1e-8);
    const found = rateFindings(heating, { rate: 0.2, highest: 0.1 }, { rippleCurrent: 8, temperatureRise: 20 });
    expect(found.map(({ id, state, value, limit, unit, source }) => [id, state, value, limit, unit, source])).toEqual([
      ["pulse.rate", "pulse", 0.2, 0.1, "Hz", "textbook-charging"],
      ["pulse.unit.rms", "pulse", heating.unitRms, 8, "A", "textbook-charging"],
      ["pulse.unit.rise", "pulse", heating.unitRise, 20, "K", "textbook-charging"],
    ]);
    expect(found.map(({ note }) => note)).toEqual([
      expect.stringMatching(/stronger charger or fire less often/),
      expect.stringMatching(/ripple ratings hold at their own frequency/),
      expect.stringMatching(/temperature rise/i),
    ]);
  });

  test("faster than the charger fails; unknown limits are not assessed", () => {
    const heating = heatingOf(duty);
    const verdicts = (rate: number, highest: number | null) =>
      rateFindings(heating, { rate, highest }, { rippleCurrent: null, temperatureRise: 20 }).map(
        ({ verdict }) => verdict,
      );
    expect(verdicts(0.2, 0.1)).toEqual(["fail", "not assessed", "fail"]);
    expect(verdicts(0.1, 0.1)[0]).toBe("pass");
    expect(verdicts(0.1, null)[0]).toBe("not assessed");
  });
});
