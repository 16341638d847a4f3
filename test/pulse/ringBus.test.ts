// ringBus: the worked ring frequency, and that the settled bus stands at its own frequency.
import { describe, expect, test } from "vitest";
import { busOf } from "../../src/pulse/bus.ts";
import { peaksOf } from "../../src/pulse/peaks.ts";
import { ringBus } from "../../src/pulse/ringBus.ts";
import { codesOf, got, near } from "./near.ts";

const bars = { kind: "flat bars", width: 0.1, gap: 0.003, thickness: 0.003, length: 0.4 } as const;
const rest = { capacitance: 4.125e-3, inductance: 60e-9, resistance: 1e-4 };

describe("ringBus(geometry, rest, resistivity)", () => {
  test("refuses as the bus and the loop refuse", () => {
    expect(codesOf(ringBus({ ...bars, gap: 0 }, rest, 1.7241e-8))).toEqual(["pulse.bus.gap"]);
    expect(codesOf(ringBus(bars, { ...rest, capacitance: 0 }, 1.7241e-8))).toEqual(["pulse.loop.capacitance"]);
  });

  test("the bus it gives is the bus at the frequency of the loop it makes", () => {
    const { bus, frequency } = got(ringBus(bars, rest, 1.7241e-8));
    const again = got(busOf(bars, { resistivity: 1.7241e-8, frequency }));
    near(bus.inductance, again.inductance, 1e-10);
    near(bus.resistance, again.resistance, 1e-10);
    const loop = { capacitance: 4.125e-3, inductance: 60e-9 + bus.inductance, resistance: 1e-4 + bus.resistance };
    near(got(peaksOf(loop, 1)).ringFrequency, frequency, 1e-10);
  });

  // Worked bank: 80 nH with 4.125 mF rings at 8761.19 Hz when nothing damps it.
  test("worked: 1/(2 pi sqrt(80 nH x 4.125 mF)) is 8761.19127 Hz", () => {
    near(got(peaksOf({ capacitance: 4.125e-3, inductance: 80e-9, resistance: 0 }, 1)).ringFrequency, 8761.19127);
  });

  test("overdamped it takes a quarter over the peak time; without inductance elsewhere it still settles", () => {
    const { frequency } = got(ringBus(bars, { capacitance: 4.125e-3, inductance: 0, resistance: 0.5 }, 1.7241e-8));
    expect(frequency).toBeGreaterThan(0);
  });
});
