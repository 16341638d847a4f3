// conductor: the two published formulas on the worked wire, and back again.
import { describe, expect, test } from "vitest";
import {
  actionDensity,
  conductorFinding,
  leastArea,
  onderdonkDensity,
  temperatureAfter,
} from "../../src/pulse/conductor.ts";
import { near } from "./near.ts";

const melt = { from: 298.15, to: 1356.15 };
const millimetre = (Math.PI / 4) * 1e-6;

describe("onderdonkDensity(rise), actionDensity(metal, rise)", () => {
  test("no rise takes no action", () => {
    expect(onderdonkDensity({ from: 300, to: 300 })).toBe(0);
    expect(actionDensity("copper", { from: 300, to: 300 })).toBe(0);
  });

  test("worked: a 1 mm copper wire from 25 to 1083 degC", () => {
    near(onderdonkDensity(melt) * 1e-12, 83358.9116);
    near(onderdonkDensity(melt) * millimetre ** 2, 51419.9675);
    near(actionDensity("copper", melt) * 1e-12, 82984.9433);
    near(actionDensity("copper", melt) * millimetre ** 2, 51189.2851);
  });

  // A forum's 16 AWG case with its sign mended: 2581 circular mil, 5 s from 25 degC melts at 168.863713 A.
  test("published case, corrected: 168.863713 A for 5 s melts 2581 circular mil", () => {
    const area = 2581 * (Math.PI / 4) * 25.4e-6 ** 2;
    near(Math.sqrt((onderdonkDensity(melt) * area ** 2) / 5), 168.863713);
  });

  test("aluminium takes less", () => {
    const rise = { from: 293.15, to: 433.15 };
    expect(actionDensity("aluminium", rise)).toBeLessThan(0.5 * actionDensity("copper", rise));
  });
});

describe("leastArea, temperatureAfter, conductorFinding", () => {
  const rise = { from: 293.15, to: 433.15 };

  test("worked: 56 250 A^2 s from 20 to 160 degC needs 1.58510494 mm2, and heats it just so far", () => {
    const area = leastArea("copper", 56250, rise);
    near(area * 1e6, 1.58510494);
    near(temperatureAfter("copper", { action: 56250, area, from: 293.15 }), 433.15, 1e-12);
  });

  test("fails when thinner, passes when thicker, not assessed without a bound on the action", () => {
    const verdict = (action: number | null, area: number) => conductorFinding("copper", { action, area, rise }).verdict;
    expect(verdict(56250, 1.58e-6)).toBe("fail");
    expect(verdict(56250, 1.59e-6)).toBe("pass");
    expect(verdict(null, 1)).toBe("not assessed");
  });
});
