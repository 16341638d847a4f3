import { describe, expect, test } from "vitest";
import { diagnose } from "../../src/place/diagnose.ts";
import { FAULT_KINDS } from "../../src/place/diagnoseFaults.ts";
import { seeded } from "../../src/place/random.ts";
import { startSimulator } from "../bank/simulate.ts";
import { simulatedTrial, simulatedVolts } from "./faultCircuit.ts";
import { draw, exactVolts } from "./faults.ts";

describe("faulty banks in a circuit simulator (eecircuit-engine)", () => {
  test("charged from nothing, its voltages are those of the exact course within 2e-4", {
    timeout: 60_000,
  }, async () => {
    const simulator = await startSimulator();
    const random = seeded(31);
    for (const kind of [null, "leaky", "resistor open"] as const) {
      const drawn = draw(kind, random);
      const exact = exactVolts(drawn);
      const simulated = await simulatedVolts(simulator, drawn);
      for (const [k, row] of simulated.entries())
        for (const [i, volts] of row.entries()) expect(Math.abs(volts / exact[k]![i]! - 1)).toBeLessThan(2e-4);
    }
  });

  // A leak may be just as large as a slip of the resistor would make it: then no voltage tells the two apart.
  test("7 faults, one of each kind: 6 or more named right and first, no false agreement", {
    timeout: 60_000,
  }, async () => {
    const simulator = await startSimulator();
    const random = seeded(33);
    let right = 0;
    for (const kind of FAULT_KINDS) {
      const { request, position } = await simulatedTrial(simulator, kind, random);
      const read = diagnose(request);
      if (!read.ok) throw new Error(read.refusals[0]!.code);
      const [first] = read.value.suspects;
      expect(read.value.verdict).not.toBe("agrees");
      expect(first?.position).toBe(position);
      if (first?.kind === kind) right++;
    }
    expect(right).toBeGreaterThanOrEqual(6);
  });
});
