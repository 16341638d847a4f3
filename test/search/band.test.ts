// Source: [Cona] the closed form at random places within the spreads, which the band must hold.
import { describe, expect, test } from "vitest";
import { shotBand } from "../../src/search/band.ts";
import { circuitOf, pulseBankFor } from "../../src/search/circuit.ts";
import { dischargeWith, spreadOf } from "../../src/search/envelope.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const SHAPE = { series: 1, parallel: 2, ties: "strings" } as const;
function inputOf(more: Record<string, unknown>, unit = FILM) {
  const brief = shotBrief(more);
  const bank = pulseBankFor(unit, SHAPE);
  const found = circuitOf(brief, bank);
  if (!found.ok) throw new Error(JSON.stringify(found.refusals));
  return { brief, unit, shape: SHAPE, circuit: found.value.circuit, bank };
}
const bandOf = (input: ReturnType<typeof inputOf>) => {
  const read = shotBand(input);
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
};

describe("shotBand({ brief, unit, shape, circuit, bank })", () => {
  test("nothing spreads: no band", () => {
    expect(bandOf(inputOf({}, { ...FILM, tolerance: { low: 0, high: 0 } }))).toBeNull();
  });

  test("a ring with capacitance spread: every course within the tolerance lies in the band, to 1 % of peak over two turns", () => {
    const input = inputOf({ load: { resistance: "60 mohm", inductance: "25 uH" } });
    const band = bandOf(input);
    const { capacitance } = spreadOf(input);
    for (const share of [0.03, 0.21, 0.5, 0.62, 0.97]) {
      const shot = dischargeWith(input, {
        capacitance: capacitance.low + share * (capacitance.high - capacitance.low),
        esr: 1,
        inductance: 1,
        resistance: 1,
      });
      if (!shot.ok) throw new Error("the shot must be");
      const slack = 0.01 * shot.value.peakCurrent;
      for (let k = 0; k <= 200; k++) {
        const time = (9e-4 * k) / 200;
        const { current } = shot.value.at(time);
        const row = band?.at(time);
        expect(current).toBeGreaterThanOrEqual((row?.current.low as number) - slack);
        expect(current).toBeLessThanOrEqual((row?.current.high as number) + slack);
      }
    }
  });

  test("between the corners: where nominal peaks, both corners are lower, and the band is not", () => {
    const input = inputOf({ load: { resistance: "5 mohm", inductance: "25 uH" } }, { ...FILM, esr: 0.001 });
    const band = bandOf(input);
    const { capacitance } = spreadOf(input);
    const at = (c: number, time: number): number => {
      const shot = dischargeWith(input, { capacitance: c, esr: 1, inductance: 1, resistance: 1 });
      return shot.ok ? shot.value.at(time).current : Number.NaN;
    };
    // the third positive peak of the nominal course
    const turn = 2 * Math.PI * Math.sqrt(25e-6 * capacitance.nominal);
    const time = 2.25 * turn;
    expect(at(capacitance.low, time)).toBeLessThan(0.9 * at(capacitance.nominal, time));
    expect(at(capacitance.high, time)).toBeLessThan(0.9 * at(capacitance.nominal, time));
    expect(band?.at(time).current.high).toBeGreaterThanOrEqual(at(capacitance.nominal, time));
  });

  test("four spreads take 81 courses and the nominal one; a clamp fewer", () => {
    const spread = { esr: "20 %", resistance: "5 %", inductance: "10 %" };
    expect(bandOf(inputOf({ spread }))?.courses).toBe(82);
    expect(bandOf(inputOf({ spread }))?.kind).toBe("sample");
    expect(bandOf(inputOf({ spread, clamp: { drop: 1 } }))?.courses).toBe(17);
  });
});
