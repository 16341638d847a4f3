import { describe, expect, test } from "vitest";
import { dischargeOf } from "../../src/pulse/index.ts";
import { circuitOf, pulseBankFor } from "../../src/search/circuit.ts";
import { shotEnvelope } from "../../src/search/envelope.ts";
import fc from "../support/property.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const shape = { series: 2, parallel: 3, ties: "cross-tied" } as const;
const bank = pulseBankFor(FILM, shape);
function envelope(more: Record<string, unknown> = {}) {
  const brief = shotBrief(more);
  const found = circuitOf(brief, bank);
  if (!found.ok) throw new Error("the circuit must read");
  const read = shotEnvelope({ brief, unit: FILM, shape, circuit: found.value.circuit, bank });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return { envelope: read.value, circuit: found.value.circuit, voltage: brief.voltage };
}

describe("shotEnvelope({ brief, unit, shape, circuit, bank })", () => {
  test("holds the nominal shot and any shot within the tolerance", () => {
    const { envelope: ends, circuit, voltage } = envelope();
    expect(ends.proven).toBe(true);
    fc.assert(
      fc.property(fc.double({ min: 0.9, max: 1.1, noNaN: true }), (factor) => {
        const shot = dischargeOf({ ...bank, capacitance: bank.capacitance * factor }, circuit, voltage);
        if (!shot.ok) throw new Error("the shot must be");
        for (const figure of ["peakCurrent", "peakTime", "reversal"] as const) {
          expect(shot.value[figure]).toBeGreaterThanOrEqual((ends[figure].low as number) * (1 - 1e-12));
          expect(shot.value[figure]).toBeLessThanOrEqual((ends[figure].high as number) * (1 + 1e-12));
        }
      }),
      { numRuns: 60, seed: 4 },
    );
  });

  test("what the brief says may spread widens it; a clamp makes the corners no proof", () => {
    const plain = envelope().envelope.peakCurrent;
    const wide = envelope({ spread: { esr: "20 %", resistance: "10 %", inductance: "10 %" } }).envelope.peakCurrent;
    expect(wide.low).toBeLessThan(plain.low as number);
    expect(wide.high).toBeGreaterThan(plain.high as number);
    expect(envelope({ clamp: { drop: 1 } }).envelope.proven).toBe(false);
  });
});
