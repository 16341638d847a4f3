// Source: [methods-derived] A7 to A10, A12, A13, A15 through the assessed layout.
import { describe, expect, test } from "vitest";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

function shot(
  more: Readonly<Record<string, unknown>> = {},
  { unit = FILM, shape = { series: 1, parallel: 1, ties: "strings" as "strings" | "cross-tied" } } = {},
) {
  const brief = shotBrief(more);
  const read = shotOf({ layout: shotLayout(brief, shape, unit), unit, brief });
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value;
}
const finding = (report: ReturnType<typeof shot>, id: string) => report.findings.find((one) => one.id === id);

describe("shotOf({ layout, unit, brief })", () => {
  test("Source: methods A8: critical, peak 1471.51776 A at 50 us, 180 J of 200 J into the load", () => {
    const { discharge } = shot({}, { unit: { ...FILM, esl: 1e-15 } });
    expect(discharge.damping).toBeCloseTo(1, 9);
    expect(discharge.peakCurrent).toBeCloseTo(1471.51776, 4);
    expect(discharge.peakTime).toBeCloseTo(5e-5, 11);
    expect(discharge.energy.load).toBeCloseTo(180, 9);
    expect(discharge.energy.bank).toBeCloseTo(20, 9);
    expect(discharge.energy.left).toBe(0);
  });

  test("Source: methods A7: 500 uF, 2 uH, 40 mohm from 3 kV rings: 31280.4767 A, reversal 0.350919807", () => {
    const unit = { ...FILM, capacitance: 5e-4, voltage: 4000, esr: 0.01, esl: 1e-15 };
    const more = { voltage: "3 kV", load: { resistance: "30 mohm", inductance: "2 uH" } };
    const { discharge } = shot(more, { unit });
    expect(discharge.peakCurrent / 31280.4767).toBeCloseTo(1, 8);
    expect(discharge.reversal).toBeCloseTo(0.350919807, 8);
    expect(discharge.action).toBeCloseTo(56250, 6);
    expect(discharge.energy.load).toBeCloseTo(1687.5, 9);
  });

  test("bank ESR and ESL are n/p of a unit's; L = 0 and R = 0 are named limits without NaN", () => {
    const { bank } = shot({}, { shape: { series: 2, parallel: 4, ties: "cross-tied" } });
    expect(bank.esr).toBeCloseTo(0.05, 12);
    const bare = { ...FILM, esr: undefined, esl: undefined } as unknown as typeof FILM;
    const noL = shot({ load: { resistance: 1, inductance: 0 } }, { unit: bare });
    expect(noL.discharge.peakCurrent).toBeCloseTo(2000, 9);
    expect(noL.discharge.notes.join()).toMatch(/no inductance in the loop/);
    const noR = shot({ load: { resistance: 0, inductance: 25e-6 } }, { unit: bare });
    expect(noR.discharge.peakCurrent).toBeCloseTo(4000, 6);
    expect(noR.discharge).toMatchObject({ action: null, reversal: 1 });
    expect(noR.discharge.notes.join()).toMatch(/lossless bound/);
    expect(JSON.stringify([noL, noR])).not.toMatch(/NaN|Infinity/);
  });

  test("unknown ESR and ESL are left out and called bounds; an unknown bus too, but not under a load told whole", () => {
    const bare = { ...FILM, esr: undefined, esl: undefined } as unknown as typeof FILM;
    expect(shot({}, { unit: bare }).discharge.bounds.peakCurrent).toBe("upper bound");
    expect(shot({}, { unit: bare }).discharge.energy.bank).toBeNull();
    expect(shot().discharge.bounds.peakCurrent).toBe("value");
    const alone = shot({ load: { resistance: 1 } });
    expect(alone.bus.path).toBeNull();
    expect(alone.discharge.bounds.peakCurrent).toBe("upper bound");
  });

  test("ratings are judged at the worst end of the tolerance; a missing one is not assessed", () => {
    const report = shot();
    expect(finding(report, "pulse.unit.current")).toMatchObject({ verdict: "pass", limit: 2000 });
    expect(finding(report, "pulse.unit.current")?.value).toBeCloseTo(report.envelope.peakCurrent.high as number, 9);
    const bare = { ...FILM, peakCurrent: undefined } as unknown as typeof FILM;
    expect(finding(shot({}, { unit: bare }), "pulse.unit.current")?.verdict).toBe("not assessed");
    expect(finding(shot({}, { unit: { ...FILM, peakCurrent: 1480 } }), "pulse.unit.current")?.verdict).toBe("fail");
  });

  test("ringing into polarised units fails without a clamp, and is mended by one", () => {
    const unit = { ...FILM, polarised: true, reversal: undefined } as unknown as typeof FILM;
    const load = { resistance: "10 mohm", inductance: "25 uH" };
    expect(finding(shot({ load }, { unit }), "pulse.polarity")?.verdict).toBe("fail");
    expect(finding(shot({ load, clamp: { drop: 0 } }, { unit }), "pulse.polarity")?.verdict).not.toBe("fail");
  });

  test("Source: methods A13: rms and heat at a rate, charger included; rate over the charger's highest fails", () => {
    const unit = { ...FILM, capacitance: 5e-4, voltage: 4000, esr: 0.005, esl: 1e-15, tolerance: { low: 0, high: 0 } };
    const more = {
      voltage: "3 kV",
      load: { resistance: "35 mohm", inductance: "2 uH" },
      charger: { current: "0.2 A" },
      rate: "0.1 Hz",
    };
    const { heating, charge, findings } = shot(more, { unit });
    expect(charge?.seconds).toBeCloseTo(7.5, 9);
    expect(heating?.rms).toBeCloseTo(75.0002, 3);
    expect(heating?.power).toBeCloseTo(28.12515, 4);
    expect(heating?.unitRise).toBeCloseTo(2 * 28.12515, 3);
    expect(findings.find(({ id }) => id === "pulse.rate")?.verdict).toBe("pass");
    const fast = shot({ ...more, rate: "1 Hz" }, { unit });
    expect(finding(fast, "pulse.rate")?.verdict).toBe("fail");
    expect(finding(shot({ rate: "1 Hz" }), "pulse.rate")?.verdict).toBe("not assessed");
  });

  test("isolating resistors add n/p of one to the loop and have their own line in the energies, which add up", () => {
    const report = shot({ isolating: "0.2 ohm" }, { shape: { series: 1, parallel: 4, ties: "strings" } });
    const { energy } = report.discharge;
    expect(energy.isolating / (energy.bank as number)).toBeCloseTo(2, 9);
    expect(energy.load + (energy.bank as number) + energy.isolating + energy.left).toBeCloseTo(energy.stored, 6);
    const short = report.faults.find(({ id }) => id === "unit-short");
    // methods A15's law at these values: V (m - 1)/(m R_i) with the neighbours' own ESR in the loop
    expect(short?.peakCurrent).toBeLessThanOrEqual((2000 * 3) / (4 * 0.2));
  });

  test("a lamp: circuit of methods A11, reported against what is built", () => {
    const unit = { ...FILM, capacitance: 4.11035346e-4, tolerance: { low: 0, high: 0 } };
    const lamp = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
    const { lamp: report, discharge } = shot(
      { energy: "200 J", voltage: undefined, ripple: undefined, load: { lamp, width: "500 us" } },
      { unit },
    );
    expect(report?.ideal.capacitance).toBeCloseTo(4.11035346e-4, 12);
    expect(report?.ideal.inductance).toBeCloseTo(6.75800222e-5, 13);
    expect(report?.ideal.voltage).toBeCloseTo(986.48483, 5);
    expect(report?.fit.peakCurrent).toBeCloseTo(1205.70258, 2);
    expect(report?.fit.halfWidth).toBeCloseTo(3.54755833e-4, 9);
    expect(report?.explosion.form90).toBeCloseTo(2004.39718, 4);
    expect(discharge.lampAlpha).toBeCloseTo(0.8, 6);
    expect(discharge.energy.bank).toBeGreaterThan(0);
  });

  test("no load is refused; a steady current that empties the bank too", () => {
    const brief = shotBrief({ load: undefined });
    expect(shotOf({ layout: shotLayout(brief), unit: FILM, brief }).ok).toBe(false);
    const drained = shotBrief({ load: { current: "100 A", time: "1 s" } });
    const read = shotOf({ layout: shotLayout(drained), unit: FILM, brief: drained });
    expect(read.ok ? [] : read.refusals.map(({ code }) => code)).toEqual(["pulse.steady.droop"]);
  });

  test("drift of a wait and ripple between recharges", () => {
    const report = shot({ hold: "100 s", steady: { current: "1 A", frequency: "100 Hz" } });
    expect(report.drift?.voltage).toBeCloseTo(2000 - (1e-6 * 100) / 1e-4, 6);
    expect(report.ripple).toBeCloseTo(100, 9);
  });
});
