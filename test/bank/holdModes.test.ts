// Two modes of a hold against the exact time course of the whole chain.
import { expect, test } from "vitest";
import { chargingShares, type Stage } from "../../src/bank/chain.ts";
import { phaseFrom } from "../../src/bank/coursePhase.ts";
import { holdModes } from "../../src/bank/holdModes.ts";

const stage = (capacitance: number, leakageCurrent: number, conductance: number): Stage => ({
  capacitance,
  leakageCurrent,
  conductance,
  resistance: Number.POSITIVE_INFINITY,
});

test("holdModes(mix): every kind of stage runs as in the exact course, whichever leaks", () => {
  for (const [own, others] of [
    [
      { conductance: 5e-5, leakage: 1e-3 },
      { conductance: 4e-5, leakage: 0 },
    ],
    [
      { conductance: 0, leakage: 0 },
      { conductance: 3e-5, leakage: 5e-4 },
    ],
  ] as const) {
    const modes = holdModes({ voltage: 1600, low: 2e-3, high: 5e-3, own, others, highOthers: 2, lowOthers: 1 });
    const chain = [
      stage(2e-3, own.leakage, own.conductance),
      ...[5e-3, 5e-3, 2e-3].map((c) => stage(c, others.leakage, others.conductance)),
    ];
    const start = chargingShares(chain).map((share) => share * 1600);
    const drive = { kind: "source", voltage: 1600, resistance: 0 } as const;
    const phase = phaseFrom({ name: "hold", chain, drive, start, seconds: 100 });
    expect(modes.start).toBeCloseTo(start[0]!, 9);
    for (const t of [0, 1, 10, 40, 100]) {
      const exact = phase.voltagesAt(t);
      expect(modes.oneAt(t)).toBeCloseTo(exact[0]!, 6);
      expect(modes.highAt(t)).toBeCloseTo(exact[1]!, 6);
      expect(modes.lowAt(t)).toBeCloseTo(exact[3]!, 6);
    }
  }
});
