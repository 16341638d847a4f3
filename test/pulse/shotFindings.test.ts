// shotFindings: reversal into polarised units, and that what is unknown is said.
import { describe, expect, test } from "vitest";
import { dischargeOf } from "../../src/pulse/pulse.ts";
import { bank, coil } from "./banks.ts";
import { got } from "./near.ts";

const verdictOf = (id: string, shot: { findings: readonly { id: string; verdict: string }[] }) =>
  shot.findings.find((one) => one.id === id)?.verdict;
const ringing = { ...coil, load: { kind: "coil", inductance: 40e-6, resistance: 0.01 } } as const;

describe("shotFindings(facts)", () => {
  test("a ring into polarised units without a clamp fails", () => {
    expect(verdictOf("pulse.polarity", got(dischargeOf(bank, ringing, 1600)))).toBe("fail");
  });

  test("with a clamp only its drop is left: a warning", () => {
    const shot = got(dischargeOf(bank, { ...ringing, clamp: { drop: 1.2, resistance: 1e-4 } }, 1600));
    expect(shot.reversal).toBeLessThan(0.05);
    expect(verdictOf("pulse.polarity", shot)).toBe("warn");
  });

  test("no reversal passes; not polarised says nothing; a reversal rating of its own takes over", () => {
    const damped = { ...coil, load: { kind: "coil", inductance: 40e-6, resistance: 0.5 } } as const;
    expect(verdictOf("pulse.polarity", got(dischargeOf(bank, damped, 1600)))).toBe("pass");
    const film = { ...bank, unit: { ...bank.unit, polarised: false } };
    expect(verdictOf("pulse.polarity", got(dischargeOf(film, ringing, 1600)))).toBeUndefined();
    const rated = { ...bank, unit: { ...bank.unit, ratings: { ...bank.unit.ratings, reversal: 0.9 } } };
    expect(verdictOf("pulse.polarity", got(dischargeOf(rated, ringing, 1600)))).toBeUndefined();
    expect(verdictOf("pulse.unit.reversal", got(dischargeOf(rated, ringing, 1600)))).toBe("pass");
  });

  test("an unknown ESL hides reversal: none found proves nothing", () => {
    const damped = { ...coil, load: { kind: "coil", inductance: 40e-6, resistance: 0.5 } } as const;
    const shot = got(dischargeOf({ ...bank, esl: null }, damped, 1600));
    expect(verdictOf("pulse.polarity", shot)).toBe("not assessed");
    expect(verdictOf("pulse.bound.unknown", shot)).toBe("not assessed");
  });
});
