import { describe, expect, test } from "vitest";
import { LIMIT_KEYS } from "../../src/search/limitKeys.ts";
import { hasLimits, LIMIT_NAMES, limitClaims, limitFindings, limitJudge } from "../../src/search/limits.ts";
import { shotOf } from "../../src/search/shot.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

const CASE = { unit: FILM, series: 1, parallel: 1, ties: "strings", worst: 2000 } as const;
const judge = (more: Record<string, unknown>, given: Record<string, unknown> = {}) =>
  limitJudge(shotBrief(more))?.({ ...CASE, ...given }) ?? null;
/** ESR unknown, so that the current is an upper bound. */
const BLIND = { ...FILM, esr: undefined } as unknown as typeof FILM;

describe("limitJudge(brief)", () => {
  test("null without limits", () => {
    expect(limitJudge(shotBrief())).toBeNull();
    expect(hasLimits(shotBrief())).toBe(false);
    expect(hasLimits(shotBrief({ maxReversal: "5 %" }))).toBe(true);
  });

  test("the place on the bus counts: the limit is judged by the figure that the shot's own finding has", () => {
    const unit = { ...FILM, esr: 0.02, esl: 4e-8 };
    const load = { resistance: "20 mohm", inductance: "1 uH" };
    const bus = { resistance: 0, inductance: 0, feed: "end", stepResistance: "1 mohm", stepInductance: "50 nH" };
    const shape = { series: 1, parallel: 6, ties: "strings" } as const;
    const given = { unit, worst: 2000, ...shape };
    const [placed] = limitClaims(shotBrief({ load, bus, maxPeakCurrent: "1 A" }), given) ?? [];
    const [even] =
      limitClaims(
        shotBrief({
          load,
          bus: { ...bus, feed: undefined, stepResistance: undefined, stepInductance: undefined },
          maxPeakCurrent: "1 A",
        }),
        given,
      ) ?? [];
    expect(placed?.value).toBeGreaterThan(1.02 * (even?.value as number));
    const brief = shotBrief({ load, bus });
    const shot = shotOf({ layout: shotLayout(brief, shape, unit), unit, brief });
    const finding = shot.ok ? shot.value.findings.find(({ id }) => id === "pulse.unit.current") : undefined;
    expect((placed?.value as number) / (finding?.value as number)).toBeCloseTo(1, 2);
  });

  test("over the limit: reason, value and limit; within it: null", () => {
    expect(judge({ maxPeakCurrent: "1600 A" })).toBeNull();
    expect(judge({ maxPeakCurrent: "1400 A" })).toMatchObject({ reason: "peak-current-limit", limit: 1400 });
    expect(judge({ maxPeakCurrent: "80 %" })).toBeNull();
    expect(judge({ maxPeakCurrent: "70 %" })).toMatchObject({ reason: "peak-current-limit", limit: 1400 });
    expect(judge({ maxSlew: "1 V/us" })).toMatchObject({ reason: "slew-limit", limit: 1e6 });
    expect(judge({ maxReversal: 0.5 })).toBeNull();
  });

  test("an unknown rating is refused as unknown, never passed", () => {
    const unit = { ...FILM, peakCurrent: undefined, slew: undefined } as unknown as typeof FILM;
    expect(judge({ maxPeakCurrent: "80 %" }, { unit })?.reason).toBe("peak-current-unknown");
    expect(judge({ maxSlew: "80 %" }, { unit })?.reason).toBe("slew-unknown");
    expect(judge({ maxPeakCurrent: "1600 A" }, { unit })).toBeNull();
  });

  test("an upper bound within the limit holds; over it nothing is proven", () => {
    expect(judge({ maxPeakCurrent: "3 kA" }, { unit: BLIND })).toBeNull();
    expect(judge({ maxPeakCurrent: "1 kA" }, { unit: BLIND })?.reason).toBe("peak-current-unproven");
    const noEsl = { ...FILM, esl: undefined } as unknown as typeof FILM;
    // a loop without its ESL rings less than it may: within the limit proves nothing
    expect(judge({ maxReversal: 0.5 }, { unit: noEsl })?.reason).toBe("reversal-unproven");
  });

  test("an unknown tolerance hides the worst unit of several, not of one", () => {
    const unit = { ...FILM, tolerance: undefined } as unknown as typeof FILM;
    expect(judge({ maxPeakCurrent: "3 kA" }, { unit, parallel: 2 })?.reason).toBe("peak-current-unknown");
    expect(judge({ maxPeakCurrent: "3 kA", basis: "nominal" }, { unit })).toBeNull();
  });

  test("fault energy: (p - 1) C V^2/2 of the neighbours, 0 alone, unknown where the worst voltage is", () => {
    const claim = limitClaims(shotBrief({ maxFaultEnergy: "1 kJ" }), { ...CASE, parallel: 4, ties: "cross-tied" });
    expect(claim?.[0]?.value).toBeCloseTo((3 * 1e-4 * 2000 ** 2) / 2, 9);
    expect(judge({ maxFaultEnergy: 0 })).toBeNull();
    expect(judge({ maxFaultEnergy: "599 J" }, { parallel: 4 })).toMatchObject({
      reason: "fault-energy-limit",
      stuck: true,
    });
    expect(judge({ maxFaultEnergy: "1 kJ" }, { worst: Number.POSITIVE_INFINITY })?.reason).toBe("fault-energy-unknown");
  });

  test("heat at the rate: rms and rise; life against the ratings", () => {
    const firing = { rate: "0.1 Hz", charger: { current: "50 mA" } };
    expect(judge({ ...firing, maxRms: "5 A" })).toBeNull();
    expect(judge({ ...firing, maxRms: "1 A" })?.reason).toBe("rms-limit");
    expect(judge({ ...firing, maxTemperatureRise: 5 })).toBeNull();
    expect(judge({ ...firing, maxTemperatureRise: 1 })?.reason).toBe("temperature-rise-limit");
    expect(judge({ minLife: 3.8 })).toBeNull();
    expect(judge({ minLife: 4 })?.reason).toBe("life-limit");
    const unit = { ...FILM, lifeExponent: undefined } as unknown as typeof FILM;
    expect(judge({ minLife: 0.1 }, { unit })?.reason).toBe("life-unknown");
  });

  test("a shot that cannot be is refused, and more in parallel may mend it", () => {
    const load = { current: "100 A", time: "1 s" };
    expect(judge({ load, maxPeakCurrent: "1 kA" })).toMatchObject({ reason: "no-shot", stuck: false });
  });
});

describe("limitFindings(brief, case)", () => {
  test("each claim once, with the judge's own verdict", () => {
    const brief = shotBrief({ maxPeakCurrent: "1400 A", maxReversal: 0.5, minLife: 4 });
    const verdicts = limitFindings(brief, CASE).map(({ id, verdict }) => [id, verdict]);
    expect(verdicts).toEqual([
      ["limit-peak-current", "fail"],
      ["limit-reversal", "pass"],
      ["limit-life", "fail"],
    ]);
    expect(limitFindings(shotBrief({ maxPeakCurrent: "1 kA" }), { ...CASE, unit: BLIND })[0]?.verdict).toBe(
      "not assessed",
    );
  });

  test("every limit has a name", () => {
    expect(Object.keys(LIMIT_NAMES).sort()).toEqual([...LIMIT_KEYS].sort());
  });
});
