import { describe, expect, test } from "vitest";
import { dischargeOf } from "../../src/pulse/index.ts";
import { circuitOf } from "../../src/search/circuit.ts";
import { bankAt, shotCorner } from "../../src/search/shotCorner.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const shape = { series: 2, parallel: 3, ties: "cross-tied" } as const;

describe("shotCorner(brief, unit, shape, corner)", () => {
  test.each([
    ["rings", { load: { resistance: "50 mohm", inductance: "25 uH" } }],
    ["does not ring", {}],
    ["no inductance known", { load: { resistance: 1 } }],
    ["one-way switch", { load: { resistance: "50 mohm", inductance: "25 uH" }, switch: { oneWay: true } }],
    ["switch with a drop", { load: { resistance: "50 mohm", inductance: "25 uH" }, switch: { drop: 20 } }],
    ["short on a known bus", { load: { short: true }, bus: { resistance: 0.001, inductance: 1e-7 } }],
  ])("the quick way has the figures of the whole discharge: %s", (_, more) => {
    const brief = shotBrief(more);
    for (const corner of ["low", "nominal", "high"] as const) {
      const bank = bankAt(FILM, shape, corner);
      const quick = shotCorner(brief, FILM, shape, corner);
      const found = circuitOf(brief, bank);
      if (!quick.ok || !found.ok) throw new Error("both must read");
      const whole = dischargeOf(bank, found.value.circuit, brief.voltage);
      if (!whole.ok) throw new Error("the shot must be");
      const { reversal, action, unit, bounds, energy } = whole.value;
      expect(quick.value.reversal).toBeCloseTo(reversal, 12);
      expect((quick.value.action ?? 0) / (action ?? 1)).toBeCloseTo(1, 10);
      expect(quick.value.unit.peakCurrent / unit.peakCurrent).toBeCloseTo(1, 12);
      expect(quick.value.bounds).toEqual(bounds);
      expect(quick.value.left).toBeCloseTo(Math.sqrt((2 * energy.left) / bank.capacitance), 6);
    }
  });

  test("bankAt: every unit at one end of its tolerance", () => {
    expect(bankAt(FILM, shape, "low").capacitance).toBeCloseTo(0.9 * 1.5e-4, 12);
    expect(bankAt(FILM, shape, "high").capacitance).toBeCloseTo(1.1 * 1.5e-4, 12);
  });
});
