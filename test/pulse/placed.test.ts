// Source: [methods-derived] the same ladder driven by its load and by its own current must divide alike.
import { describe, expect, test } from "vitest";
import { type Circuit, dischargeOf, IDEAL_SWITCH, pulseBankOf, taperOf } from "../../src/pulse/index.ts";
import { near } from "./near.ts";

const UNIT = {
  capacitance: 1e-4,
  toleranceLow: 0.1,
  toleranceHigh: 0.1,
  esr: 0.02,
  esl: 4e-8,
  polarised: false,
  ratings: { peakCurrent: 4000, slew: null, reversal: null, action: 500 },
};
const bank = pulseBankOf({ unit: UNIT, series: 1, parallel: 6, ties: "strings" });
const place = { feed: "end", segment: { resistance: 5e-4, inductance: 4e-8 } } as const;
const taper = taperOf(6, place);
const circuit: Circuit = {
  load: { kind: "coil", resistance: 0.03, inductance: 1e-6 },
  bus: taper,
  switch: IDEAL_SWITCH,
  clamp: null,
  place,
};
function shot(of: Partial<Circuit>, on = bank) {
  const read = dischargeOf(on, { ...circuit, ...of }, 2000);
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}

describe("placedOf(bank, circuit, shot, mesh), through dischargeOf", () => {
  test("no place told: shares by capacitance alone, and no word of the bus", () => {
    const { unit } = shot({ place: null });
    expect(unit.place).toBeNull();
    near(unit.share, 1.1 / (1.1 + 5 * 0.9), 1e-12);
  });

  test("a place told: the worst unit's peak and action are the ladder's, and the reason names both causes", () => {
    const { unit, unitPeakCurrent, peakCurrent, findings } = shot({});
    expect(unit.place?.position).toBeGreaterThan(0);
    expect(unit.share).toBeGreaterThan(1.1 / (1.1 + 5 * 0.9));
    near(unitPeakCurrent, peakCurrent * unit.share, 1e-12);
    expect(unit.why).toMatch(
      /^Position \d of 6 on a bus fed at one end: x 1\.\d+ by its place, x 1\.\d+ by the highest/,
    );
    expect(findings.find(({ id }) => id === "pulse.unit.action")?.limit).toBe(500);
  });

  test("a ring: the unit that the bus reverses most is judged, the bank's own figure stays; with a clamp or an unknown ESL none passes", () => {
    const rated = (on: Partial<typeof UNIT> = {}) =>
      pulseBankOf({
        ...bank,
        unit: { ...UNIT, ...on, ratings: { ...UNIT.ratings, reversal: 0.5 } as unknown as typeof UNIT.ratings },
      });
    const ring = { load: { kind: "coil", resistance: 0.005, inductance: 2e-7 } } as const;
    const reversalOf = (one: ReturnType<typeof shot>) => one.findings.find(({ id }) => id === "pulse.unit.reversal");
    const [plain, told] = [shot({ ...ring, place: null }, rated()), shot(ring, rated())];
    expect(plain.unit.reversal).toBe(plain.reversal);
    expect(told.reversal).toBe(plain.reversal);
    expect(told.unit.reversal).toBeGreaterThan(told.reversal * 1.05);
    expect(reversalOf(told)?.value).toBe(told.unit.reversal);
    expect(reversalOf(told)?.note).toMatch(/position \d on the bus is reversed more/);
    const quiet = { load: { kind: "coil", resistance: 0.5, inductance: 2e-7 } } as const;
    expect(reversalOf(shot(quiet, rated()))?.verdict).toBe("pass");
    expect(reversalOf(shot({ ...quiet, clamp: { drop: 1, resistance: 1e-3 } }, rated()))?.verdict).toBe("not assessed");
    expect(reversalOf(shot(quiet, rated({ esl: null as unknown as number })))?.verdict).toBe("not assessed");
  });

  test("solved with the load or driven by the load's current, alike units share within 1.5 %, what the lumped loop leaves out", () => {
    const given = shot({ switch: { ...IDEAL_SWITCH, drop: 1e-6 } }).unit.place?.alike ?? [];
    const solved = shot({}).unit.place?.alike ?? [];
    expect(solved).toHaveLength(6);
    for (const [k, share] of solved.entries()) near(given[k] as number, share, 0.015);
  });

  test("a clamp: shares until it takes over, and said so; unknown ESR or ESL: not assessed, and said so", () => {
    const clamped = shot({ clamp: { drop: 1, resistance: 1e-3 } });
    expect(clamped.unit.place).not.toBeNull();
    expect(clamped.notes.join()).toMatch(/until the clamp takes over/);
    const bare = shot({}, pulseBankOf({ ...bank, unit: { ...UNIT, esl: null } }));
    expect(bare.unit.place).toBeNull();
    expect(bare.notes.join()).toMatch(/place on the bus not assessed: the units' ESL is unknown/);
  });
});
