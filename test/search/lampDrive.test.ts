// Source: [methods-derived] A11; [lamp-faq] the six-lamp example, recomputed.
import { describe, expect, test } from "vitest";
import { readBrief } from "../../src/search/index.ts";
import { idealLampCircuit, lampOf, USUAL_DAMPING, withLampDrive } from "../../src/search/lampDrive.ts";

const LAMP = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
const INPUT = { energy: "200 J", load: { lamp: LAMP, width: "500 us" } };

describe("withLampDrive(input)", () => {
  test("Source: methods A11: voltage 986.48483 V, coil 67.5800222 uH, a full dump", () => {
    const filled = withLampDrive(INPUT);
    expect(filled.voltage).toBeCloseTo(986.48483, 5);
    expect(filled.ripple).toBe(1);
    expect((filled.load as Record<string, unknown>).inductance).toBeCloseTo(6.75800222e-5, 12);
    expect(readBrief(INPUT).ok).toBe(true);
  });

  test("what was given stays; what cannot be read is left to the reader of the brief", () => {
    const given = withLampDrive({
      ...INPUT,
      voltage: "1 kV",
      ripple: "90 %",
      load: { ...INPUT.load, inductance: "50 uH" },
    });
    expect(given).toMatchObject({ voltage: "1 kV", ripple: "90 %", load: { inductance: 5e-5 } });
    const bad = { ...INPUT, energy: "200 V" };
    expect(withLampDrive(bad)).toBe(bad);
    const unsized = { ...INPUT, load: { lamp: LAMP } };
    expect(withLampDrive(unsized)).toBe(unsized);
  });
});

describe("idealLampCircuit(brief)", () => {
  test("Source: lamp-faq example: 3 kJ, six 90 mm x 4 mm lamps, T = 0.53 ms: 91.8253647 uF, 3.05906762 mH, 8083.40418 V", () => {
    const lamp = { bore: "4 mm", arc: "90 mm", gas: "xenon", pressure: "450 torr", count: 6 };
    const read = readBrief({ energy: "3 kJ", load: { lamp, width: 3 * 0.53e-3, damping: USUAL_DAMPING } });
    const ideal = read.ok ? idealLampCircuit(read.value) : null;
    expect(ideal?.capacitance).toBeCloseTo(91.8253647e-6, 12);
    expect(ideal?.inductance).toBeCloseTo(3.05906762e-3, 10);
    expect(ideal?.voltage).toBeCloseTo(8083.40418, 4);
  });

  test("null without lamp or width; lampOf renames", () => {
    expect(idealLampCircuit({ energy: 1, load: undefined })).toBeNull();
    expect(lampOf({ bore: 1, arc: 2, gas: "xenon", pressure: 3, count: 4 })).toEqual({
      bore: 1,
      arcLength: 2,
      gas: "xenon",
      pressure: 3,
      count: 4,
    });
  });
});
