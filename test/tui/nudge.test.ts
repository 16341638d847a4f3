// Steps of a value: preferred values of IEC 60063, even percents, whole counts; the ends hold, and texts read back.
import { describe, expect, test } from "vitest";
import { SERIES } from "../../src/quantity/index.ts";
import { FIELDS, type Field } from "../../src/tui/fields.ts";
import { nudged, numberIn } from "../../src/tui/nudge.ts";
import fc from "../support/property.ts";

const field = (key: string): Field => FIELDS.find((one) => one.key === key) as Field;
const up = { up: true, coarse: false };
const down = { up: false, coarse: false };
const leap = { up: true, coarse: true };

describe("nudged(field, value, nudge)", () => {
  test.each([
    ["voltage", 2200, up, "2.4 kV"],
    ["voltage", 2200, down, "2 kV"],
    ["voltage", 2200, leap, "3.3 kV"],
    ["voltage", 2250, down, "2.2 kV"],
    ["voltage", 9100, up, "10 kV"],
    ["energy", 2400, { up: false, coarse: true }, "2.2 kJ"],
    ["ripple", 0.2, up, "21 %"],
    ["ripple", 0.203, down, "20 %"],
    ["ripple", 0.2, leap, "25 %"],
    ["derating", 0.9, up, "91 %"],
    ["overshoot", 0, up, "1 %"],
    ["maxSeries", 40, up, "41"],
    ["maxSeries", 40, { up: false, coarse: true }, "35"],
    ["maxUnits", 2000, up, "2200"],
    ["maxUnits", 2, up, "3"],
    ["spares", 0, leap, "5"],
    ["hold", Number.POSITIVE_INFINITY, down, "24 h"],
    ["hold", 86_400, up, "for ever"],
    ["risk", 1e-4, up, "0.011 %"],
  ] as const)("%s from %f", (key, value, nudge, want) => {
    expect(nudged(field(key), value, nudge)).toBe(want);
  });
  test.each([
    ["ripple", 1, up],
    ["overshoot", 0, down],
    ["spares", 0, down],
    ["maxSeries", 1, down],
    ["maxUnits", 1, down],
    ["hold", Number.POSITIVE_INFINITY, up],
    ["title", 1, up],
    ["voltage", Number.NaN, up],
  ] as const)("%s at its end, or with nothing to step: null", (key, value, nudge) => {
    expect(nudged(field(key), value, nudge)).toBeNull();
  });
  test("every text reads back as a value of the series, one step up and one down is where one was", () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 1e6, noNaN: true }), (voltage) => {
        const above = numberIn(field("voltage"), nudged(field("voltage"), voltage, up) ?? "") ?? 0;
        const digits = Math.round(above / 10 ** (Math.floor(Math.log10(above) + 1e-9) - 1));
        expect(SERIES.E24).toContain(digits);
        expect(above).toBeGreaterThan(voltage);
        const back = numberIn(field("voltage"), nudged(field("voltage"), above, down) ?? "") ?? 0;
        expect(back).toBeLessThanOrEqual(voltage * (1 + 1e-5));
      }),
      { numRuns: 300 },
    );
  });
});

test("numberIn(field, text): blank, words and choices are no number", () => {
  expect(numberIn(field("voltage"), "")).toBeNull();
  expect(numberIn(field("voltage"), "much")).toBeNull();
  expect(numberIn(field("basis"), "nominal")).toBeNull();
  expect(numberIn(field("hold"), "for ever")).toBe(Number.POSITIVE_INFINITY);
  expect(numberIn(field("ripple"), "20 %")).toBeCloseTo(0.2, 12);
});
