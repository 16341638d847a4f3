import { describe, expect, test } from "vitest";
import { crossFaults, loadKinds } from "../../src/search/briefFaults.ts";
import { readBrief } from "../../src/search/index.ts";

const LAMP = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
function faults(more: Record<string, unknown>): readonly string[] {
  const read = readBrief({ energy: 1, voltage: 1, ripple: 1, ...more });
  return read.ok ? [] : read.refusals.map(({ code, place }) => `${code} ${place.field}`);
}

describe("crossFaults(brief)", () => {
  test.each([
    [{ load: { resistance: 1, short: true } }, "contradiction load.resistance"],
    [{ load: { lamp: LAMP, current: 1, time: 1 } }, "contradiction load.current"],
    [{ load: {} }, "missing-value load"],
    [{ load: { current: 1 } }, "missing-value load.time"],
    [{ load: { time: 1 } }, "missing-value load.current"],
    [{ load: { resistance: 1, width: 1e-3 } }, "contradiction load.width"],
    [{ bus: { inductance: 1e-7 } }, "missing-value bus.resistance"],
    [{ bus: { shape: "coax", length: 1, inner: 0.001, outer: 0.002 } }, "missing-value bus.wall"],
    [
      { bus: { shape: "wire pair", length: 1, radius: 0.001, spacing: 0.01, inductance: 1e-7 } },
      "contradiction bus.shape",
    ],
    [{ bus: { resistance: 0, inductance: 0, feed: "end", stepInductance: 1e-8 } }, "missing-value bus.stepResistance"],
    [{ bus: { resistance: 0, inductance: 0, stepInductance: 1e-8 } }, "missing-value bus.feed"],
    [
      { bus: { shape: "wire pair", length: 1, radius: 0.001, spacing: 0.01, feed: "centre" } },
      "missing-value bus.pitch",
    ],
    [
      {
        bus: {
          shape: "wire pair",
          length: 1,
          radius: 0.001,
          spacing: 0.01,
          feed: "end",
          pitch: 0.1,
          stepResistance: 0,
        },
      },
      "contradiction bus.stepInductance",
    ],
    [{ isolatingPrice: 2 }, "missing-value isolating"],
    [{ charger: { current: 1, power: 5, currentLimit: 1 } }, "contradiction charger.power"],
    [{ charger: { power: 5 } }, "missing-value charger.currentLimit"],
    [{ charger: { supply: 5 } }, "missing-value charger.resistance"],
    [{ charger: {} }, "missing-value charger"],
    [{ life: { halving: 10 } }, "missing-value life.reference"],
    [{ maxPeakCurrent: "400 A" }, "missing-value load"],
    [{ maxRms: "4 A", load: { resistance: 1 }, charger: { current: 1 } }, "missing-value rate"],
    [{ maxTemperatureRise: 4, load: { resistance: 1 }, rate: 1 }, "missing-value charger"],
  ])("%j: %s", (more, want) => {
    expect(faults(more)).toEqual([want]);
  });

  test("what holds together has none; a fault energy needs no load", () => {
    expect(faults({ load: { lamp: LAMP, resistance: 0.01, inductance: 1e-4 }, maxFaultEnergy: "50 J" })).toEqual([]);
    expect(crossFaults({})).toEqual([]);
  });
});

test("loadKinds(load): a lamp's own coil is no second load", () => {
  const read = readBrief({ energy: 1, voltage: 1, ripple: 1, load: { lamp: LAMP, inductance: 1e-4 } });
  expect(read.ok && read.value.load && loadKinds(read.value.load)).toEqual(["lamp"]);
});
