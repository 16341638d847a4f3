import { describe, expect, test } from "vitest";
import { dischargeOf } from "../../src/pulse/index.ts";
import { circuitOf, pulseBankFor } from "../../src/search/circuit.ts";
import { shotEnvelope } from "../../src/search/envelope.ts";
import { type Rated, unitRatingFindings } from "../../src/search/unitRatings.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const NOT_PLACED = { reversal: 0, bound: "value" } as const;

function ratings(unit = FILM, parallel = 2, more: Record<string, unknown> = {}, placed: Rated["placed"] = NOT_PLACED) {
  const brief = shotBrief(more);
  const shape = { series: 1, parallel, ties: "strings" } as const;
  const bank = pulseBankFor(unit, shape);
  const found = circuitOf(brief, bank);
  if (!found.ok) throw new Error("the circuit must read");
  const { circuit } = found.value;
  const shot = dischargeOf(bank, circuit, brief.voltage);
  const ends = shotEnvelope({ brief, unit, shape, circuit, bank });
  if (!shot.ok || !ends.ok) throw new Error("the shot must be");
  return {
    shot: shot.value,
    findings: unitRatingFindings(shot.value, {
      unit,
      envelope: ends.value,
      series: 1,
      parallel,
      clampDrop: brief.clamp?.drop ?? null,
      placed,
    }),
  };
}

describe("unitRatingFindings(discharge, { unit, envelope, parallel })", () => {
  test("values stand at the high end; the action too, and not assessed where the catalogue has no rating of it", () => {
    const { shot, findings } = ratings();
    const current = findings.find(({ id }) => id === "pulse.unit.current");
    expect(current?.value).toBeGreaterThan(shot.unitPeakCurrent);
    const action = findings.find(({ id }) => id === "pulse.unit.action");
    expect(action).toMatchObject({ verdict: "not assessed", limit: null });
    expect(action?.value).toBeGreaterThan(shot.unit.action as number);
    const rated = ratings({ ...FILM, action: 1 }).findings.find(({ id }) => id === "pulse.unit.action");
    expect(rated).toMatchObject({ verdict: "fail", limit: 1 });
  });

  test("rated for no reversal: fails unclamped, warns with the volts when only the clamp's own drop is left", () => {
    const unit = { ...FILM, polarised: true, reversal: 0 };
    const load = { resistance: "20 mohm", inductance: "25 uH" };
    const of = (more: Record<string, unknown>) =>
      ratings(unit, 1, { load, ...more }).findings.find(({ id }) => id === "pulse.unit.reversal");
    expect(of({})?.verdict).toBe("fail");
    const clamped = of({ clamp: { drop: "1.2 V" } });
    expect(clamped?.verdict).toBe("warn");
    expect(clamped?.note).toMatch(/1\.2 V on a unit/);
    // a clamp with a resistance of its own leaves far more than its drop
    expect(of({ clamp: { drop: "1.2 V", resistance: "50 mohm" } })?.verdict).toBe("fail");
  });

  test("a unit whose place reverses it more than the bank's worst end is judged by that; a lower bound never passes", () => {
    const unit = { ...FILM, reversal: 0.9 };
    const load = { resistance: "20 mohm", inductance: "25 uH" };
    const of = (placed: Rated["placed"]) =>
      ratings(unit, 2, { load }, placed).findings.find(({ id }) => id === "pulse.unit.reversal");
    const plain = of(NOT_PLACED)?.value as number;
    expect(of({ reversal: plain / 2, bound: "value" })?.value).toBe(plain);
    expect(of({ reversal: 0.89, bound: "value" })).toMatchObject({ value: 0.89, verdict: "pass" });
    expect(of({ reversal: 0.89, bound: "lower bound" })?.verdict).toBe("not assessed");
    expect(of({ reversal: 0.96, bound: "lower bound" })?.verdict).toBe("fail");
  });

  test("an unknown tolerance takes the pass away from what rests on sharing, when there are several", () => {
    const unit = { ...FILM, tolerance: undefined } as unknown as typeof FILM;
    const verdict = (parallel: number) =>
      ratings(unit, parallel).findings.find(({ id }) => id === "pulse.unit.current")?.verdict;
    expect(verdict(2)).toBe("not assessed");
    expect(verdict(1)).toBe("pass");
  });
});
