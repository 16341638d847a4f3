import { describe, expect, test } from "vitest";
import { readBrief } from "../../src/search/index.ts";
import { lampReport } from "../../src/search/lampReport.ts";

const lamp = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
const brief = (() => {
  const read = readBrief({ energy: "200 J", load: { lamp, width: "500 us" } });
  if (!read.ok) throw new Error("the brief must read");
  return read.value;
})();

describe("lampReport(brief, { capacitance, own })", () => {
  test("a bank that is the ideal one lands on it", () => {
    const read = lampReport(brief, { capacitance: 4.11035346e-4, own: 0 });
    const report = read.ok ? read.value : null;
    expect(report?.fit.capacitanceRatio).toBeCloseTo(1, 8);
    expect(report?.fit.energyRatio).toBeCloseTo(1, 8);
    expect(report?.coil).toBeCloseTo(6.75800222e-5, 12);
    expect(report?.voltageForEnergy).toBeCloseTo(986.48483, 4);
  });

  test("twice the capacitance: twice the energy, sqrt 2 the width; the bank's own inductance shortens the coil", () => {
    const read = lampReport(brief, { capacitance: 2 * 4.11035346e-4, own: 7.58e-6 });
    const report = read.ok ? read.value : null;
    expect(report?.fit.energyRatio).toBeCloseTo(2, 7);
    expect(report?.coil).toBeCloseTo(6e-5, 9);
    expect(report?.built.inductance).toBeCloseTo(6.75800222e-5 + 7.58e-6, 12);
    expect(report?.fit.widthRatio).toBeCloseTo(Math.sqrt(2 * (1 + 7.58e-6 / 6.75800222e-5)), 7);
  });

  test("an unknown inductance of the bank leaves the coil unknown; a brief without a sized lamp has no report", () => {
    const read = lampReport(brief, { capacitance: 4e-4, own: null });
    expect(read.ok && read.value?.coil).toBeNull();
    expect(lampReport({ ...brief, load: undefined }, { capacitance: 4e-4, own: 0 })).toEqual({ ok: true, value: null });
  });
});
