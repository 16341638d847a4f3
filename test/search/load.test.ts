import { describe, expect, test } from "vitest";
import { readBrief } from "../../src/search/index.ts";
import {
  busSchema,
  chargerSchema,
  clampSchema,
  loadSchema,
  spreadSchema,
  switchSchema,
} from "../../src/search/load.ts";

describe("the schemas of load and circuit", () => {
  test("text with units to SI, defaults filled in", () => {
    const lamp = { bore: "8 mm", arc: "100 mm", gas: "Xenon", pressure: "450 torr" };
    expect(loadSchema.parse({ lamp })).toEqual({
      lamp: { bore: 0.008, arc: 0.1, gas: "xenon", pressure: (450 * 101325) / 760, count: 1 },
    });
    expect(loadSchema.parse({ lamp: { ...lamp, pressure: "60 kPa" } }).lamp?.pressure).toBe(6e4);
    expect(switchSchema.parse({})).toEqual({ drop: 0, resistance: 0, oneWay: false });
    expect(busSchema.parse({ shape: "coax" }).metal).toBe("copper");
    expect(clampSchema.parse({ drop: "0.8 V" })).toEqual({ drop: 0.8, resistance: 0 });
    expect(chargerSchema.parse({ current: "50 mA" })).toEqual({ current: 0.05 });
    expect(spreadSchema.parse({ esr: "20 %" })).toEqual({ esr: 0.2, resistance: 0, inductance: 0 });
  });

  test("an unknown key is refused with the nearest of its own object", () => {
    const near = (more: Record<string, unknown>) => {
      const read = readBrief({ energy: 1, voltage: 1, ripple: 1, ...more });
      return read.ok ? [] : read.refusals.map(({ place, want }) => `${place.field}: ${want}`);
    };
    expect(near({ load: { resistence: 1 } })).toEqual(['load.resistence: perhaps "resistance"']);
    expect(near({ bus: { lenght: 1 } })[0]).toBe('bus.lenght: perhaps "length"');
    expect(near({ load: { lamp: { bore: 1, arc: 1, gas: "xenon", presure: 1, pressure: 1 } } })).toEqual([
      'load.lamp.presure: perhaps "pressure"',
    ]);
    expect(near({ maxPeekCurrent: 1 })).toEqual(['maxPeekCurrent: perhaps "maxPeakCurrent"']);
  });

  test("wrong values are told with what would be accepted", () => {
    const read = readBrief({ energy: 1, voltage: 1, ripple: 1, load: { resistance: "1 uH", inductance: -1 } });
    expect(read.ok ? [] : read.refusals.map(({ place }) => place.field)).toEqual([
      "load.resistance",
      "load.inductance",
    ]);
  });
});
