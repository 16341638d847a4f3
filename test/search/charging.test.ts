import { describe, expect, test } from "vitest";
import { chargeFor, chargerOf, driftFor, firingOf, rippleFor } from "../../src/search/charging.ts";
import { pulseBankFor } from "../../src/search/circuit.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

const bank = pulseBankFor(FILM, { series: 1, parallel: 1, ties: "strings" });

describe("chargeFor(brief, bank)", () => {
  test("Source: methods A12: 825 uF to 1600 V by 0.05 A, by 200 W after 0.25 A, and through 2000 ohm", () => {
    const of = (charger: Record<string, unknown>) => {
      const read = chargeFor(shotBrief({ voltage: "1600 V", charger }), { capacitance: 825e-6, left: 0 });
      return read.ok ? read.value : null;
    };
    expect(of({ current: "50 mA" })?.seconds).toBeCloseTo(26.4, 9);
    expect(of({ power: "200 W", currentLimit: "0.25 A" })).toMatchObject({ crossover: 800 });
    expect(of({ power: "200 W", currentLimit: "0.25 A" })?.seconds).toBeCloseTo(6.6, 9);
    expect(of({ supply: "1700 V", resistance: "2 kohm" })?.seconds).toBeCloseTo(4.67480202, 7);
    expect(of({ supply: "1700 V", resistance: "2 kohm" })?.resistorHeat).toBeCloseTo(1188, 9);
  });

  test("null without a charger that says how it charges; a supply too low is refused", () => {
    expect(chargerOf(shotBrief())).toBeNull();
    expect(chargerOf(shotBrief({ charger: { highest: "3 kV" } }))).toBeNull();
    const low = shotBrief({ charger: { supply: "1 kV", resistance: "1 kohm" } });
    expect(chargeFor(low, { capacitance: 1e-3, left: 0 }).ok).toBe(false);
  });
});

describe("firingOf(brief, bank, unit, { charge, shot })", () => {
  test("no rate, no heat; no charger, no highest rate; a boundless action has no heat", () => {
    const shot = { action: 200, seconds: 1e-3, share: 1 };
    expect(firingOf(shotBrief(), bank, FILM, { charge: null, shot })).toEqual({ highest: null, heating: null });
    const rate = shotBrief({ rate: "2 Hz" });
    expect(firingOf(rate, bank, FILM, { charge: null, shot }).heating?.rms).toBeCloseTo(20, 12);
    expect(firingOf(rate, bank, FILM, { charge: null, shot: { ...shot, action: null } }).heating).toBeNull();
  });
});

describe("driftFor, rippleFor", () => {
  test("leakage drains n-p alike; insulation is a path; the balancing chain drains too; for ever is no wait", () => {
    const { balance } = shotLayout(shotBrief());
    expect(driftFor(shotBrief(), bank, FILM, balance)).toBeNull();
    expect(driftFor(shotBrief({ hold: "10 s" }), bank, FILM, null)?.voltage).toBeCloseTo(2000 - 0.1, 9);
    const { leakage: _, ...film } = FILM;
    expect(driftFor(shotBrief({ hold: "10 s" }), bank, film, null)).toBeNull();
    const path = driftFor(shotBrief({ hold: "100 s" }), bank, { ...film, insulation: 1e6 }, null);
    expect(path?.voltage).toBeCloseTo(2000 * Math.exp(-1), 9);
    expect(rippleFor(shotBrief(), bank)).toBeNull();
  });
});
